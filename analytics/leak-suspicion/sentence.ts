import { formatNumber, formatPercent, plural } from '@/lib/format';
import { LEAST_SHORT_VISITS, LEAST_VISITS, SUSPECTED_FROM, VISIT_MONTHS } from './limits';

/** What is known of one appliance's visits. */
export type ToldSuspicion = {
  visits: number;
  shortVisits: number;
  expectedShort: number;
  leakSuspicion: number | null;
};

/** A probability in words that do not promise more than it is good for. */
export const chanceText = (chance: number): string => {
  if (chance >= 0.99) return 'over 99%';
  return chance < 0.01 ? 'under 1%' : formatPercent(chance);
};

const ofVisits = ({ visits, shortVisits }: ToldSuspicion): string =>
  `${shortVisits} of ${plural(visits, 'visit', 'visits')}`;

/** Whether an appliance leaks, in a sentence: `It came short at 5 of 6 visits, where jobs like these find 1.2: …`. */
export const suspicionSentence = (told: ToldSuspicion): string => {
  const { visits, shortVisits, expectedShort, leakSuspicion } = told;
  if (visits < LEAST_VISITS)
    return `Nothing can be said of a leak: ${visits === 0 ? 'no visit' : plural(visits, 'visit', 'visits')} of the last ${VISIT_MONTHS} months ${visits > 1 ? 'tell' : 'tells'} what charge was there, and it takes ${plural(LEAST_VISITS, 'visit', 'visits')}.`;
  if (leakSuspicion === null)
    return 'Nothing can be said of a leak: the company has too few appliances to compare with.';
  if (shortVisits === 0) return `No leak is suspected: it came with its charge at all ${visits} visits.`;
  if (shortVisits < LEAST_SHORT_VISITS)
    return `No leak is suspected: it came short of charge at ${ofVisits(told)}, and once is no pattern.`;
  const found = `It came short of charge at ${ofVisits(told)}, where jobs like these find ${formatNumber(expectedShort, 1)} short`;
  const chance = chanceText(leakSuspicion);
  if (leakSuspicion >= SUSPECTED_FROM) return `${found}: it leaks with a probability of ${chance}.`;
  return `${found}: a leak is ${leakSuspicion >= 0.2 ? 'possible' : 'unlikely'}, with a probability of ${chance}.`;
};

/** What is suspected at a site against what others have. */
export const siteSuspicionSentence = (
  excess: { judged: number; suspected: number; expected: number; look: boolean } | null,
): string => {
  if (!excess)
    return `Nothing can be said of leaks here: no unit was visited ${LEAST_VISITS} times in the last ${VISIT_MONTHS} months.`;
  const { judged, suspected, expected, look } = excess;
  const units = plural(judged, 'unit', 'units');
  if (suspected === 0) return `None of the ${units} that can be judged here is suspected to leak.`;
  const found = `${formatNumber(suspected)} of ${units} that can be judged here ${suspected === 1 ? 'is' : 'are'} suspected to leak; other sites would have ${formatNumber(expected, 1)}`;
  return look
    ? `${found}. That is more than chance explains over all sites.`
    : `${found}. Chance alone may explain that.`;
};
