import { READING_TOLERANCE_KPA } from '@/lib/trade/evacuation-level';
import { normalCdf } from '../../statistics/distributions/normal';
import { aboveLevelKpa, levelKey } from '../baselines/habits';
import type { Rule } from './rule';

/** Uncertainty of a field gauge, about half an inch of mercury: common practice. */
const GAUGE_KPA = 1.7;
/** A leak or a minor repair may end above the level, 40 CFR 82.156(a)(1), (2); the ticket rarely says so. */
const NO_EXCEPTION = 0.8;

/**
 * The required level was missed where like pulls usually reach it. Where they usually don't, single records say
 * nothing: that is a finding about the company's practice, not a doubt about a record.
 */
export const levelNotReached: Rule = ({ record, baselines, settings }) => {
  const above = aboveLevelKpa(record);
  const { finalVacuumKpaAbs, requiredLevelKpaAbs } = record;
  const reachedShare = baselines.habits.levelReached[levelKey(record, settings)] ?? 0;
  if (above === null || finalVacuumKpaAbs === null || requiredLevelKpaAbs === null) return null;
  if (above <= READING_TOLERANCE_KPA || reachedShare < settings.habitFrom) return null;
  return {
    rule: 'level_not_reached',
    certainty: NO_EXCEPTION * normalCdf(above / GAUGE_KPA),
    expectedMassKg: null,
    evidence: { finalVacuumKpaAbs, requiredLevelKpaAbs, reachedShare },
  };
};
