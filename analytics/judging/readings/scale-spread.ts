import type { JudgedRecord } from '../record';
import type { JudgingSettings } from '../settings';
import { type ScaleSteps, scaleStep } from './scale-steps';
import { KG_PER_TICKET_UNIT } from './ticket-unit';

/**
 * Standard deviation in kg of one reading on the scale of this record: its step as a rectangle, and its repeatability.
 * GUM (JCGM 100:2008) 4.3.7, F.2.2.1.
 */
export const readingSpreadKg = (
  record: JudgedRecord,
  steps: ScaleSteps,
  grossKg: number,
  settings: JudgingSettings,
): number => {
  const step = scaleStep(steps, record, record.fullChargeKg, settings) ?? 0;
  const stepKg = step * KG_PER_TICKET_UNIT[record.massUnit];
  const reading = Math.max(settings.repeatabilityKg, settings.repeatabilityShare * grossKg);
  return Math.hypot(stepKg / Math.sqrt(12), reading);
};
