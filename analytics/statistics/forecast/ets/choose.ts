import { type Estimate, enough, tooFew } from '../../estimate';
import type { SimplexOptions } from '../../nelder-mead';
import { type EtsFit, fitEts } from './fit';
import type { EtsModel } from './model';

const TRENDS = [
  { trend: 'N', damped: false },
  { trend: 'A', damped: false },
  { trend: 'A', damped: true },
] as const;

/**
 * The models worth trying: no multiplying trend, no multiplying season under an adding error (its variance is not
 * finite), and nothing that multiplies where a value is not above 0.
 */
const candidates = (values: readonly number[], period: number): EtsModel[] => {
  const positive = values.every((value) => value > 0);
  const errors = positive ? (['A', 'M'] as const) : (['A'] as const);
  return errors.flatMap((error) => {
    const seasons = period < 2 ? (['N'] as const) : error === 'M' ? (['N', 'A', 'M'] as const) : (['N', 'A'] as const);
    return seasons.flatMap((season) =>
      TRENDS.map((trend) => ({ error, ...trend, season, period: season === 'N' ? 1 : period })),
    );
  });
};

/**
 * The model with the least corrected Akaike criterion, each fitted by maximum likelihood. Hyndman et al. (2002), section
 * 5; Hurvich & Tsai (1989), Biometrika 76, 297-307.
 */
export const chooseEts = (values: readonly number[], period: number, search: SimplexOptions = {}): Estimate<EtsFit> => {
  const fits = candidates(values, period).flatMap((model) => {
    const fit = fitEts(values, model, search);
    return fit.enough ? [fit.value] : [];
  });
  const best = fits.reduce<EtsFit | null>(
    (lead, fit) => (lead === null || fit.akaike.corrected < lead.akaike.corrected ? fit : lead),
    null,
  );
  return best === null ? tooFew(7, values.length, 'values') : enough(best);
};
