import { massToMicrograms } from '@/lib/units';
import { MASS_UNITS } from '@/lib/vocabulary';
import type { RecordTexts } from './fields';

/** Recovered mass and full charge in kilograms, and their ratio, as far as the texts tell them. */
export type LiveYield = { recoveredMassKg: number | null; fullChargeKg: number | null; yield: number | null };

const MICROGRAMS_PER_KG = 1e9;
const toKg = (micrograms: bigint | null): number | null =>
  micrograms === null ? null : Number(micrograms) / MICROGRAMS_PER_KG;

/**
 * What a record that is being typed says so far: recovered mass as stated, else end less start; full charge = nameplate
 * plus added. Null where a text is missing or no mass. The server computes the figures that are kept.
 */
export const liveYield = (texts: RecordTexts): LiveYield => {
  const unit = MASS_UNITS.find((known) => known === texts.massUnit);
  const mass = (text: string): bigint | null => (unit ? massToMicrograms(text, unit) : null);
  const [start, end] = [mass(texts.startWeight), mass(texts.endWeight)];
  const weighed = start !== null && end !== null && end >= start ? end - start : null;
  const recovered = mass(texts.recoveredMass) ?? weighed;
  const nameplate = mass(texts.nameplateCharge);
  const added = texts.addedCharge === '' ? 0n : mass(texts.addedCharge);
  const full = nameplate !== null && added !== null && nameplate > 0n ? nameplate + added : null;
  return {
    recoveredMassKg: toKg(recovered),
    fullChargeKg: toKg(full),
    yield: recovered === null || full === null ? null : Number(recovered) / Number(full),
  };
};
