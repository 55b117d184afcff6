import type { Piece } from '@/analytics/figures/pieces';
import { formatMass, formatMassWithUnit, formatPercent, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Flag, FlagsList } from './contract';

/** How many records of the scope need a look, and which one is the surest where that is known. */
export const flagsAnswer = (
  { flagged, records }: Pick<FlagsList['open'], 'flagged' | 'records'>,
  surest?: { flag: Flag; unit: DisplayUnit },
): Piece[] => {
  if (flagged === 0)
    return [records === 0 ? 'No record here needs a look.' : 'No record here is more likely wrong than right.'];
  const figure: Piece = { measure: 'flagged', figure: plural(flagged, 'record', 'records') };
  const need = ` ${flagged === 1 ? 'needs' : 'need'} a look`;
  if (!surest) return [figure, `${need}.`];
  const { recordRef, recoveredMass, fullCharge } = surest.flag;
  const masses = `${formatMass(recoveredMass, surest.unit)} of ${formatMassWithUnit(fullCharge, surest.unit)}`;
  return [figure, `${need}. The surest: ${recordRef}, with ${masses}.`];
};

/** A certainty as it is read: nothing is ever quite sure. */
export const formatCertainty = (certainty: number): string =>
  certainty > 0.99 ? 'over 99%' : formatPercent(certainty);

/** About which open records the answer says nothing; empty when about none. */
export const lessSureNote = ({ records, flagged }: FlagsList['open']): string => {
  const others = records - flagged;
  return others === 0
    ? ''
    : `${plural(others, 'other record', 'other records')} may only have come short, or ${others === 1 ? 'is' : 'are'} less sure.`;
};

/** How often decisions bore flags out: `Of the last 50 decided, 31 were borne out (49% to 74%).`; empty before the first. */
export const borneOutNote = ({ decided, confirmed, low, high }: FlagsList['borneOut']): string => {
  if (decided === 0 || low === null || high === null) return '';
  const were = confirmed === 1 ? 'was' : 'were';
  return `Of the last ${plural(decided, 'decided flag', 'decided flags')}, ${confirmed} ${were} borne out (likely range ${formatPercent(low)} to ${formatPercent(high)}).`;
};

/** What a certainty is, in one sentence. */
export const CERTAINTY_MEANING =
  'A certainty of 80% means: of ten flags like this one, about eight turn out to be what the flag says.';
