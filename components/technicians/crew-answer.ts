import type { TechnicianRow } from '@/analytics/technicians/contract';
import { formatList, plural } from '@/lib/format';

const names = (rows: readonly TechnicianRow[]): string => formatList(rows.map(({ technician }) => technician));

/**
 * What the crew's comparison comes to in a sentence or two: who lies clearly below like jobs, whose scale is in doubt,
 * and that nobody does when nobody does. Never an order among people.
 */
export const crewAnswer = (rows: readonly TechnicianRow[]): string => {
  const judged = rows.filter(({ verdict }) => verdict !== 'too few');
  if (!judged.length)
    return `${plural(rows.length, 'technician', 'technicians')}, none with jobs enough to say anything.`;
  const below = judged.filter(({ verdict }) => verdict === 'below');
  const scales = rows.filter(({ scale }) => scale !== null && scale.to === null);
  const crew = plural(judged.length, 'technician', 'technicians');
  const verb = below.length === 1 ? 'recovers' : 'recover';
  const people = below.length
    ? `${names(below)} ${verb} less than like jobs give colleagues, beyond luck.`
    : `Nobody of ${crew} lies below like jobs beyond luck.`;
  const scale = scales.length
    ? ` ${scales.length === 1 ? 'The scale' : 'The scales'} of ${names(scales)} should be checked.`
    : '';
  return people + scale;
};
