import { isDay } from '@/lib/calendar';

/** A period as it stands in the address: months or days, both ends included. The browser reads this file too. */
export type ChosenPeriod = { from: string; to: string };

const MONTH = /^(19|20|21)\d{2}-(0[1-9]|1[0-2])$/;
const isMoment = (text: string): boolean => MONTH.test(text) || (/^(19|20|21)/.test(text) && isDay(text));
/** Months end at their last day, which every month has at or before its 31st. */
const lastOf = (moment: string): string => (MONTH.test(moment) ? `${moment}-31` : moment);
const firstOf = (moment: string): string => (MONTH.test(moment) ? `${moment}-01` : moment);

/** Reads `2024-01..2024-12`, or one month or day alone; null for what is no period or ends before it begins. */
export const parseVersus = (text: string): ChosenPeriod | null => {
  const [from = '', to = from, ...rest] = text.split('..');
  if (rest.length || !isMoment(from) || !isMoment(to) || firstOf(from) > lastOf(to)) return null;
  return { from, to };
};

/** The period as the address keeps it. */
export const versusText = ({ from, to }: ChosenPeriod): string => (from === to ? from : `${from}..${to}`);
