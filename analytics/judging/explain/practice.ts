import { formatDay, formatPercent } from '@/lib/format';
import type { EvidenceByRule } from '../judgement';
import { vacuumText } from './figures';

export const explainLevel = (evidence: EvidenceByRule['level_not_reached']): string =>
  `The pull ended at ${vacuumText(evidence.finalVacuumKpaAbs)}; ${vacuumText(evidence.requiredLevelKpaAbs)} is required (40 CFR 82.156), and ${formatPercent(evidence.reachedShare)} of like pulls reached it. A leak or a minor repair can be a reason: then the ticket should say so.`;

export const explainHold = (evidence: EvidenceByRule['hold_missing']): string =>
  evidence.holdMinutes === null
    ? `No hold is written down; ${formatPercent(evidence.statedShare)} of this year’s tickets state one.`
    : `The hold is written down as none; ${formatPercent(evidence.statedShare)} of this year’s tickets state one. Trapped refrigerant shows only while one waits.`;

export const explainDate = ({ recoveredOn, from, to, today }: EvidenceByRule['date_doubtful']): string =>
  from !== null && to !== null
    ? `Dated ${formatDay(recoveredOn)}, but the tickets numbered around it are of ${formatDay(from)} to ${formatDay(to)}.`
    : `Dated ${formatDay(recoveredOn)}, which was after ${formatDay(today)}, when the records were judged.`;
