import { requireFinite, requireNotNegative, requireSameLength } from '../checked';

/** Mean and standard deviation. */
export type Moments = { mean: number; standardDeviation: number };

/** Mean and second moment of a positive quantity whose logarithm is normal: exp(kμ + k²σ²/2). */
const logNormalPower = (meanLog: number, sdLog: number, power: number): number =>
  Math.exp(power * meanLog + (power * sdLog) ** 2 / 2);

const fromPowers = (mean: number, square: number): Moments => ({
  mean,
  // Rounding must not make a variance of nothing negative.
  standardDeviation: Math.sqrt(Math.max(0, square - mean * mean)),
});

/** A quantity by the mean and standard deviation of its logarithm. */
export type LogNormal = { meanLog: number; sdLog: number };

/** The product of two log-normal quantities whose logarithms correlate: log-normal again. */
export const logNormalProduct = (a: LogNormal, b: LogNormal, correlation = 0): LogNormal => ({
  meanLog: a.meanLog + b.meanLog,
  sdLog: Math.sqrt(a.sdLog ** 2 + b.sdLog ** 2 + 2 * correlation * a.sdLog * b.sdLog),
});

/** Moments of a log-normal quantity. Johnson, Kotz & Balakrishnan (1994), Continuous Univariate Distributions, ch. 14. */
export const logNormalMoments = ({ meanLog, sdLog }: LogNormal): Moments =>
  fromPowers(logNormalPower(meanLog, sdLog, 1), logNormalPower(meanLog, sdLog, 2));

/** Moments of the product of independent quantities from theirs: means multiply, and so do second moments. */
export const productMoments = (factors: readonly Moments[]): Moments => {
  requireFinite(
    factors.flatMap(({ mean, standardDeviation }) => [mean, standardDeviation]),
    'Moments',
  );
  return fromPowers(
    factors.reduce((product, { mean }) => product * mean, 1),
    factors.reduce((product, { mean, standardDeviation }) => product * (mean ** 2 + standardDeviation ** 2), 1),
  );
};

/** Moments of a share with a beta distribution. */
export const betaMoments = (a: number, b: number): Moments => {
  const mean = a / (a + b);
  return { mean, standardDeviation: Math.sqrt((mean * (1 - mean)) / (a + b + 1)) };
};

/** A refrigerant's mass and mean price with the price's coefficient of variation. */
export type Holding = { mass: Moments; price: number; priceVariation: number };

/**
 * Exact moments of Σ mass × price: masses independent, prices log-normal with equal correlation of their logarithms.
 * E[PᵢPⱼ] = E[Pᵢ]E[Pⱼ] exp(ρσᵢσⱼ).
 */
export const portfolioMoments = (holdings: readonly Holding[], priceCorrelation: number): Moments => {
  const sdLogs = holdings.map(({ priceVariation }) => {
    requireNotNegative(priceVariation, 'A coefficient of variation');
    return Math.sqrt(Math.log1p(priceVariation ** 2));
  });
  requireSameLength(holdings, sdLogs, 'Holdings');
  const mean = holdings.reduce((total, { mass, price }) => total + mass.mean * price, 0);
  let square = 0;
  holdings.forEach((one, i) => {
    holdings.forEach((other, j) => {
      const correlation = i === j ? 1 : priceCorrelation;
      const prices = one.price * other.price * Math.exp(correlation * (sdLogs[i] ?? 0) * (sdLogs[j] ?? 0));
      const masses = one.mass.mean * other.mass.mean + (i === j ? one.mass.standardDeviation ** 2 : 0);
      square += prices * masses;
    });
  });
  return fromPowers(mean, square);
};
