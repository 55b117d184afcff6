import { formatDay, formatList, formatMassWithUnit, formatPercent } from '@/lib/format';
import type { DisplayUnit, LeakRateMethod } from '@/lib/vocabulary';
import { LEAK_RATE_METHOD_NAMES } from '@/lib/wording';
import type { ApplianceLeaks, ShownLeakRate, ShownRule } from './contract';

/** `25.0% (23.4% to 26.6%)`. */
export const rateText = ({ percent, low, high }: Pick<ShownLeakRate, 'percent' | 'low' | 'high'>): string =>
  `${formatPercent(percent / 100, 1)} (${formatPercent(low / 100, 1)} to ${formatPercent(high / 100, 1)})`;

/** Where a rate stands against the trigger of the rules that held; '' where none did. */
export const triggerText = ({ above, close, trigger, paragraphs }: ShownLeakRate): string => {
  if (above === null || trigger === null) return '';
  const of = `the ${formatPercent(trigger / 100)} of ${formatList(paragraphs)}`;
  if (close) return `${above ? 'above' : 'not above'} ${of}, but close to it`;
  return above ? `above ${of}` : `not above ${of}`;
};

/** The last leak rate of an appliance, in a sentence. */
export const lastRateSentence = (
  {
    events,
    fullCharge,
    methodUsed,
    additions,
  }: Pick<ApplianceLeaks, 'events' | 'fullCharge' | 'methodUsed' | 'additions'>,
  unit: DisplayUnit,
): string => {
  if (additions.length === 0) return 'No addition of refrigerant is written down, so there is no leak rate.';
  if (fullCharge === null) return 'No record states the full charge of this unit, so there is no leak rate.';
  const last = events.findLast(({ rate }) => rate !== null);
  if (!last?.rate) return 'Nothing that was added counts as leaked, so there is no leak rate.';
  const { rate } = last;
  const first = rate.after === null && methodUsed === 'annualizing';
  const against = triggerText(rate);
  return [
    `${formatMassWithUnit(last.counted, unit)} on ${formatDay(last.addedOn)} make a leak rate of ${first ? 'at least ' : ''}${rateText(rate)} of the full charge${methodUsed === 'annualizing' ? ' a year' : ''} by the ${LEAK_RATE_METHOD_NAMES[methodUsed]}`,
    against ? `, ${against}` : '',
    '.',
    first ? ' No earlier addition is known, so the whole 365 days are taken.' : '',
  ].join('');
};

const SUBJECT: Record<ShownRule['rule'], string> = {
  ozone: 'ozone-depleting refrigerant',
  hfc: 'an HFC or a substitute with a GWP above 53',
};

const PREDICATE: Record<ShownRule['rule'], string> = { ...SUBJECT, ozone: 'ozone-depleting' };

/** Whether a rule holds for the unit and why. */
export const ruleSentence = (
  { rule, paragraph, since, leastCharge, holds, why }: ShownRule,
  unit: DisplayUnit,
): string => {
  const scope = `${formatMassWithUnit(leastCharge, unit, 0)} of ${SUBJECT[rule]}`;
  const from = formatDay(since);
  if (holds === 'yes') return `${paragraph} holds from ${from} on: the unit has at least ${scope}.`;
  if (why === 'refrigerant') return `${paragraph} does not hold: the refrigerant is not ${PREDICATE[rule]}.`;
  if (why === 'charge') return `${paragraph} does not hold: it begins at ${scope}.`;
  if (why === 'light_commercial')
    return `${paragraph} does not hold: it leaves out residential and light commercial air conditioning and heat pumps, and the unit is said to be one.`;
  return `${paragraph} holds from ${from} on unless the unit is residential or light commercial air conditioning or a heat pump. Somebody must say which.`;
};

/** What each method does, in a sentence. */
export const METHOD_MEANINGS: Record<LeakRateMethod, string> = {
  annualizing:
    'What was added ÷ full charge × 365 ÷ the days since refrigerant was last added, 365 days at most: one addition as if it went on for a year.',
  rolling_average:
    'All that was added in the last 365 days, or since a follow-up test showed the leaks repaired, ÷ full charge.',
};
