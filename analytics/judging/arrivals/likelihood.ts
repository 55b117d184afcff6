import type { ArrivalMixture, ArrivalShares, Pull } from './mixture';
import { lookUp, TOP_YIELD } from './shapes';

/** Shares of a full pull at which somebody stopped, all as likely: from a fifth to three quarters. */
export const STOPS_AT = [0.225, 0.275, 0.325, 0.375, 0.425, 0.475, 0.525, 0.575, 0.625, 0.675, 0.725] as const;

/** No yield above this is what somebody left who stopped early. */
const MOST_STOPPED = 0.725 * TOP_YIELD;
const NOT_STOPPED: readonly number[] = STOPS_AT.map(() => 0);

const ROOT = Math.sqrt(2 * Math.PI);
/** One gauge in two hundred shows anything: no single reading convicts. */
const WILD = 0.005;
const WILD_SPREAD = 4;

const bell = (z: number, spread: number): number => Math.exp(-0.5 * (z / spread) ** 2) / (ROOT * spread);
const usualBell = (z: number): number => (1 - WILD) * bell(z, 1) + WILD * bell(z, WILD_SPREAD);

/** Densities of one pull under each story, shares and rates of stories included. */
export type Stories = {
  sound: number;
  short: number;
  empty: number;
  stopped: number;
  /** The parts of `stopped` by where it was stopped, in the order of STOPS_AT. */
  stoppedAt: readonly number[];
};

const MOST_SHORT = 0.97;

/** Shares of arrivals for somebody who is sent to leaks more often, or less, than others on such jobs. */
const sharesFor = (usual: ArrivalShares = { sound: 1, leaked: 0, empty: 0 }, meetsShort: number): ArrivalShares => {
  const short = usual.leaked + usual.empty;
  if (short === 0) return usual;
  const times = Math.min(meetsShort, MOST_SHORT / short);
  return { sound: 1 - times * short, leaked: times * usual.leaked, empty: times * usual.empty };
};

/** How likely what is seen is under each story: sound, leaked, nearly empty, and stopped early on any of them. */
export const storiesOf = (mixture: ArrivalMixture, pull: Pull): Stories => {
  const { recoveryYield: y, vacuum } = pull;
  const sound = mixture.sound[pull.kind] ?? mixture.sound.all ?? [];
  const soundMean = mixture.soundMean[pull.kind] ?? mixture.soundMean.all ?? 0.92;
  const shares = sharesFor(mixture.shares[pull.job] ?? mixture.shares.all, pull.meetsShort);
  const loss = vacuum ? mixture.vacuumLoss * vacuum.usual : 0;
  const full = 1 - pull.stopsEarly;
  // Somebody who always leaves more is no one who stops early: held against his own thorough pulls.
  const { leaves } = pull;
  const ofSound = (part: number) => lookUp(sound, TOP_YIELD - (TOP_YIELD - part) / leaves) / leaves;
  const thorough = Math.min(1.05, (TOP_YIELD - (TOP_YIELD - soundMean) * leaves) / soundMean);
  // A sound system that gave less than usual was pulled less well, and its vacuum shows it.
  const soundLoss = loss * Math.min(0.4, Math.max(0, 1 - y / soundMean));
  const usual = vacuum ? usualBell(vacuum.z + loss * (1 - thorough)) : 1;
  const stoppedAt =
    y > MOST_STOPPED
      ? NOT_STOPPED
      : STOPS_AT.map((part) => {
          const before = y / part;
          const arrived =
            shares.sound * ofSound(before) +
            shares.leaked * lookUp(mixture.leaked, before) +
            shares.empty * lookUp(mixture.empty, before);
          const reading = vacuum ? bell(vacuum.z + loss * (1 - part * thorough), mixture.stoppedSpread) : 1;
          return (pull.stopsEarly * arrived * reading) / part / STOPS_AT.length;
        });
  return {
    sound: full * shares.sound * ofSound(y) * (vacuum ? usualBell(vacuum.z + soundLoss) : 1),
    short: full * shares.leaked * lookUp(mixture.leaked, y) * usual,
    empty: full * shares.empty * lookUp(mixture.empty, y) * usual,
    stopped: stoppedAt.reduce((sum, part) => sum + part, 0),
    stoppedAt,
  };
};

/** Density of what is seen, whatever the story. */
export const totalOf = ({ sound, short, empty, stopped }: Stories): number => sound + short + empty + stopped;
