import type { Estimate } from '../estimate';
import { type EtsFit, fitEts } from './ets/fit';
import type { EtsModel } from './ets/model';

const LEVEL_ONLY: EtsModel = { error: 'A', trend: 'N', damped: false, season: 'N', period: 1 };

/**
 * Simple exponential smoothing, the level that follows what comes: ETS(A,N,N) by maximum likelihood. Brown (1959),
 * Statistical Forecasting for Inventory Control; as a state space in Hyndman et al. (2002).
 */
export const simpleSmoothing = (values: readonly number[]): Estimate<EtsFit> => fitEts(values, LEVEL_ONLY);
