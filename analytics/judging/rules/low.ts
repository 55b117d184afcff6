import { KPA } from '@/lib/units';
import type { LowEvidence } from '../judgement';
import type { Case } from './rule';

/** A scale that leaves the mass uncertain by more than this share of the charge says nothing about a low yield. */
const LEAST_RESOLUTION = 0.25;

/** Mass that like jobs of others would have given, kg. */
export const expectedMassKg = ({ record, peers }: Case): number | null => peers && peers.median * record.fullChargeKg;

/** The numbers of a low pull. */
export const lowEvidence = ({ record, peers, vacuum }: Case): LowEvidence => ({
  recoveredMassKg: record.recoveredMassKg,
  fullChargeKg: record.fullChargeKg,
  peers,
  vacuum: vacuum && {
    kpaAbs: KPA.atmosphere - vacuum.depthKpa,
    usualKpaAbs: KPA.atmosphere - vacuum.usualKpa,
    spreadKpa: vacuum.spreadKpa,
    z: vacuum.z,
  },
});

/** Whether the yield is below the lower fence of like jobs. */
export const isLow = ({ record, peers }: Case): boolean =>
  peers !== null && record.recoveredMassKg / record.fullChargeKg < peers.lowerFence;

/** Whether the scale is fine enough for this charge: twice its uncertainty below a quarter of it. */
export const isWeighable = ({ record, settings }: Case): boolean =>
  2 * settings.repeatabilityKg * Math.SQRT2 < LEAST_RESOLUTION * record.fullChargeKg;
