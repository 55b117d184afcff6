import { groupBy } from '../../statistics/group-by';
import { leaves, meetsShort, stopsEarly } from './crew';
import { type Stories, storiesOf, totalOf } from './likelihood';
import { type ArrivalMixture, type ArrivalShares, personOf } from './mixture';
import { PRIOR, type SeenPull } from './prior';
import { partShape, soundShape, TOP_YIELD } from './shapes';
import { stopsEarlyOf } from './stops-early';
import { vacuumOfStops } from './vacuum-of-stops';

const ROUNDS = 16;
const ALL_ROUNDS = 2;
/** Shapes are known well enough from so many pulls. */
const ENOUGH_PULLS = 5_000;

type Moments = { mean: number; variance: number; pulls: number };

/** Weighted mean and variance, with a prior that counts as some pulls. */
const moments = (pulls: readonly SeenPull[], weights: readonly number[], prior: Moments): Moments => {
  let [sum, weight] = [prior.mean * prior.pulls, prior.pulls];
  pulls.forEach(({ recoveryYield }, i) => {
    sum += recoveryYield * (weights[i] ?? 0);
    weight += weights[i] ?? 0;
  });
  const mean = sum / weight;
  let squares = (prior.variance + (prior.mean - mean) ** 2) * prior.pulls;
  pulls.forEach(({ recoveryYield }, i) => {
    squares += (weights[i] ?? 0) * (recoveryYield - mean) ** 2;
  });
  return { mean, variance: squares / weight, pulls: weight };
};

const start = (): ArrivalMixture => {
  const { sound, leaked, empty, shares } = PRIOR;
  return {
    sound: { all: soundShape(sound.mean, sound.variance) },
    soundMean: { all: sound.mean },
    leaked: partShape(leaked.mean, leaked.variance),
    empty: partShape(empty.mean, empty.variance),
    shares: { all: { sound: shares.sound, leaked: shares.leaked, empty: shares.empty } },
    stopsEarly: PRIOR.stopsEarly.share,
    stopsEarlyOf: {},
    leavesOf: {},
    meetsShortOf: {},
    vacuumLoss: PRIOR.vacuumLoss.value,
    stoppedSpread: PRIOR.stoppedSpread.value,
  };
};

const NOBODY = { stopsEarly: PRIOR.stopsEarly.share, leaves: 1, meetsShort: 1 };

/** Probabilities of the stories of every pull, by the mixture as it stands. */
const weigh = (mixture: ArrivalMixture, pulls: readonly SeenPull[]): Stories[] => {
  const people = new Map(
    [...new Set(pulls.map(({ technicianId }) => technicianId))].map((id) => [
      id,
      { ...personOf(mixture, id), stopsEarly: stopsEarlyOf(mixture, id) },
    ]),
  );
  return pulls.map((pull) => {
    const stories = storiesOf(mixture, { ...pull, ...(people.get(pull.technicianId) ?? NOBODY) });
    const total = totalOf(stories) || 1;
    return {
      sound: stories.sound / total,
      short: stories.short / total,
      empty: stories.empty / total,
      stopped: stories.stopped / total,
      stoppedAt: stories.stopped > 0 ? stories.stoppedAt.map((part) => part / total) : stories.stoppedAt,
    };
  });
};

const sharesOf = (stories: readonly Stories[], prior: ArrivalShares): ArrivalShares => {
  const pulls = PRIOR.shares.pulls;
  let [sound, leaked, empty] = [prior.sound * pulls, prior.leaked * pulls, prior.empty * pulls];
  for (const story of stories) {
    sound += story.sound;
    leaked += story.short;
    empty += story.empty;
  }
  const total = sound + leaked + empty;
  return { sound: sound / total, leaked: leaked / total, empty: empty / total };
};

/** A yield as the crew would have got it in place of this technician. */
const asCrew = (recoveryYield: number, leavesMore: number): number =>
  Math.max(0, TOP_YIELD - (TOP_YIELD - Math.min(recoveryYield, TOP_YIELD - 0.01)) / leavesMore);

const refit = (pulls: readonly SeenPull[], stories: readonly Stories[], before: ArrivalMixture): ArrivalMixture => {
  const weights = (key: 'sound' | 'short' | 'empty') => stories.map((story) => story[key]);
  const sound = weights('sound');
  const capped = pulls.map((pull) => ({
    ...pull,
    recoveryYield: asCrew(pull.recoveryYield, before.leavesOf[pull.technicianId] ?? 1),
  }));
  const all = moments(capped, sound, PRIOR.sound);
  const places = capped.map((pull, i) => ({ pull, sound: sound[i] ?? 0, story: stories[i] }));
  const byKind = [...groupBy(places, ({ pull }) => pull.kind)].map(
    ([kind, group]) =>
      [
        kind,
        moments(
          group.map(({ pull }) => pull),
          group.map((place) => place.sound),
          { ...all, pulls: PRIOR.sound.pulls },
        ),
      ] as const,
  );
  const kinds = [['all', all] as const, ...byKind];
  const soundMean = Object.fromEntries(kinds.map(([kind, { mean }]) => [kind, mean]));
  const leaked = moments(pulls, weights('short'), PRIOR.leaked);
  const empty = moments(pulls, weights('empty'), PRIOR.empty);
  const shares = sharesOf(stories, PRIOR.shares);
  const byJob = [...groupBy(places, ({ pull }) => pull.job)].map(
    ([job, group]) =>
      [
        job,
        sharesOf(
          group.flatMap(({ story }) => (story ? [story] : [])),
          shares,
        ),
      ] as const,
  );
  const byType = Object.fromEntries([['all', shares] as const, ...byJob]);
  return {
    sound: Object.fromEntries(kinds.map(([kind, { mean, variance }]) => [kind, soundShape(mean, variance)])),
    soundMean,
    leavesOf: leaves(pulls, sound, soundMean),
    leaked: partShape(leaked.mean, leaked.variance),
    empty: partShape(empty.mean, empty.variance),
    shares: byType,
    meetsShortOf: meetsShort(pulls, stories, byType),
    ...stopsEarly(pulls, stories),
    ...vacuumOfStops(pulls, stories),
  };
};

/**
 * Fits the mixture by expectation and maximisation (Dempster, Laird & Rubin 1977, Journal of the Royal Statistical
 * Society B 39), moments in place of maximum likelihood for the shapes. Few pulls lean on what is common in the trade.
 */
export const fitArrivals = (pulls: readonly SeenPull[]): ArrivalMixture => {
  const stride = Math.max(1, Math.ceil(pulls.length / ENOUGH_PULLS));
  const some = pulls.filter((_, index) => index % stride === 0);
  let mixture = start();
  for (let round = 0; round < ROUNDS; round++) mixture = refit(some, weigh(mixture, some), mixture);
  if (stride > 1)
    for (let round = 0; round < ALL_ROUNDS; round++)
      mixture = { ...mixture, ...stopsEarly(pulls, weigh(mixture, pulls)) };
  return mixture;
};
