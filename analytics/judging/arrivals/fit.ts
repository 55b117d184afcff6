import { groupBy } from '../../statistics/group-by';
import { STOPS_AT, type Stories, storiesOf, totalOf } from './likelihood';
import { type ArrivalMixture, type ArrivalShares, type Pull, stopsEarlyOf } from './mixture';
import { partShape, soundShape, TOP_YIELD } from './shapes';

/** A pull to learn from. */
export type SeenPull = Omit<Pull, 'stopsEarly' | 'leaves'> & { technicianId: string };

/** What a fit starts from and leans on where records are few: common practice of the trade. */
const PRIOR = {
  sound: { mean: 0.92, variance: 0.0045, pulls: 30 },
  leaked: { mean: 0.54, variance: 0.036, pulls: 60 },
  empty: { mean: 0.07, variance: 0.004, pulls: 60 },
  shares: { sound: 0.72, leaked: 0.22, empty: 0.06, pulls: 20 },
  stopsEarly: { share: 0.012, pulls: 400 },
  leaves: { pulls: 15 },
  vacuumLoss: { value: 0.6, weight: 12 },
  stoppedSpread: { value: 1.15, pulls: 10 },
} as const;

/** Nobody is taken never to stop early. */
const LEAST_SHARE = 0.004;
const ROUNDS = 25;
const ALL_ROUNDS = 3;
/** Shapes are known well enough from so many pulls. */
const ENOUGH_PULLS = 6_000;

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
    vacuumLoss: PRIOR.vacuumLoss.value,
    stoppedSpread: PRIOR.stoppedSpread.value,
  };
};

/** Probabilities of the stories of every pull, by the mixture as it stands. */
const weigh = (mixture: ArrivalMixture, pulls: readonly SeenPull[]): Stories[] =>
  pulls.map((pull) => {
    const stories = storiesOf(mixture, {
      ...pull,
      stopsEarly: stopsEarlyOf(mixture, pull.technicianId),
      leaves: mixture.leavesOf[pull.technicianId] ?? 1,
    });
    const total = totalOf(stories) || 1;
    return {
      sound: stories.sound / total,
      short: stories.short / total,
      empty: stories.empty / total,
      stopped: stories.stopped / total,
      stoppedAt: stories.stoppedAt.map((part) => part / total),
    };
  });

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

/** How much of the vacuum early stops miss, and how widely theirs spread: weighted least squares over where they stopped. */
const vacuumOfStops = (pulls: readonly SeenPull[], stories: readonly Stories[]) => {
  let [cross, square] = [PRIOR.vacuumLoss.value * PRIOR.vacuumLoss.weight, PRIOR.vacuumLoss.weight as number];
  const each = (visit: (weight: number, z: number, reach: number) => void) =>
    pulls.forEach(({ vacuum }, i) => {
      if (vacuum)
        stories[i]?.stoppedAt.forEach((weight, at) => {
          visit(weight, vacuum.z, vacuum.usual * (1 - (STOPS_AT[at] ?? 0)));
        });
    });
  each((weight, z, reach) => {
    cross -= weight * z * reach;
    square += weight * reach * reach;
  });
  const vacuumLoss = Math.min(2.5, Math.max(0.15, cross / square));
  let [squares, weights] = [
    PRIOR.stoppedSpread.value ** 2 * PRIOR.stoppedSpread.pulls,
    PRIOR.stoppedSpread.pulls as number,
  ];
  each((weight, z, reach) => {
    squares += weight * (z + vacuumLoss * reach) ** 2;
    weights += weight;
  });
  return { vacuumLoss, stoppedSpread: Math.max(0.9, Math.sqrt(squares / weights)) };
};

const stopsEarly = (pulls: readonly SeenPull[], stories: readonly Stories[]) => {
  const of: ArrivalMixture['stopsEarlyOf'] = {};
  pulls.forEach(({ technicianId, vacuum }, i) => {
    // Without a vacuum an early stop can't be told from a leak, so it teaches nothing about a person.
    if (!vacuum) return;
    const share = stories[i]?.stopped ?? 0;
    const known = of[technicianId] ?? { pulls: 0, stopped: 0 };
    of[technicianId] = { pulls: known.pulls + 1, stopped: known.stopped + share };
  });
  return { stopsEarlyOf: of, stopsEarly: middling(Object.values(of)) };
};

/** The share of the middling technician, weighted by pulls: one who often stops is no yardstick for the others. */
const middling = (crew: readonly { pulls: number; stopped: number }[]): number => {
  const { share, pulls } = PRIOR.stopsEarly;
  const people = [...crew.map((one) => ({ share: one.stopped / one.pulls, pulls: one.pulls })), { share, pulls }];
  let half = people.reduce((sum, one) => sum + one.pulls, 0) / 2;
  for (const one of people.sort((a, b) => a.share - b.share)) {
    half -= one.pulls;
    if (half <= 0) return Math.max(one.share, LEAST_SHARE);
  }
  return share;
};

/** Thorough pulls of each technician against the crew's of the same kind, drawn towards them. */
const leaves = (pulls: readonly SeenPull[], sound: readonly number[], mean: Record<string, number>) => {
  const { pulls: drawn } = PRIOR.leaves;
  const of = new Map<string, { left: number; weight: number }>();
  pulls.forEach(({ technicianId, kind, recoveryYield }, i) => {
    const known = of.get(technicianId) ?? { left: drawn, weight: drawn };
    const usual = TOP_YIELD - (mean[kind] ?? mean.all ?? PRIOR.sound.mean);
    const weight = sound[i] ?? 0;
    of.set(technicianId, {
      left: known.left + (weight * (TOP_YIELD - recoveryYield)) / usual,
      weight: known.weight + weight,
    });
  });
  return Object.fromEntries([...of].map(([id, { left, weight }]) => [id, left / weight]));
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
  return {
    sound: Object.fromEntries(kinds.map(([kind, { mean, variance }]) => [kind, soundShape(mean, variance)])),
    soundMean,
    leavesOf: leaves(pulls, sound, soundMean),
    leaked: partShape(leaked.mean, leaked.variance),
    empty: partShape(empty.mean, empty.variance),
    shares: Object.fromEntries([['all', shares] as const, ...byJob]),
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
