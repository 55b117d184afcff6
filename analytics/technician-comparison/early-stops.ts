import { logBeta, logGamma } from '../statistics/distributions/log-gamma';

/** Pulls that look stopped early, among those on units that did not come short. */
export type EarlyStops = { early: number; of: number };

/** Share of the crew, those with the most early stops, who do not set what is usual. */
const LEFT_OUT = 0.25;
/** Jobs' worth by which a sound technician's own share is tied to the usual one: sound people differ too. */
const TIE = 100;
/** No crew is so good that a single early stop is remarkable. */
const LEAST_SHARE = 0.01;

/** The usual share of early stops: that of colleagues, those with the most of them left out. */
export const usualShare = (colleagues: readonly EarlyStops[]): number => {
  const byShare = colleagues.filter(({ of }) => of > 0).sort((a, b) => a.early / a.of - b.early / b.of);
  const usual = byShare.slice(0, Math.max(1, Math.ceil(byShare.length * (1 - LEFT_OUT))));
  const [early, of] = usual.reduce(([sum, all], own) => [sum + own.early, all + own.of], [0, 0]);
  return Math.max(LEAST_SHARE, of > 0 ? early / of : 0);
};

/**
 * Chance of at least so many early stops in one who is like his colleagues: beta-binomial, so that sound technicians may
 * differ beyond the luck of their jobs. Skellam (1948), JRSS B 10, 257-261.
 */
export const chanceOfSoMany = ({ early, of }: EarlyStops, share: number): number => {
  const [trials, hits] = [Math.round(of), Math.round(early)];
  if (hits <= 0) return 1;
  const [a, b] = [share * TIE, (1 - share) * TIE];
  const logAt = (x: number): number =>
    logGamma(trials + 1) - logGamma(x + 1) - logGamma(trials - x + 1) + logBeta(a + x, b + trials - x) - logBeta(a, b);
  let term = Math.exp(logAt(hits));
  let tail = 0;
  for (let x = hits; x <= trials && term > 1e-18; x++) {
    tail += term;
    term *= ((trials - x) / (x + 1)) * ((a + x) / (b + trials - x - 1));
  }
  return Math.min(1, tail);
};
