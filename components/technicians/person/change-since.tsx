import type { TechnicianPerson } from '@/analytics/technician-person/contract';
import { formatPoints, plural } from '@/lib/format';

type Course = NonNullable<TechnicianPerson['course']>;

const FOUND = {
  better: 'That is better, beyond luck.',
  worse: 'That is worse, beyond luck.',
  'no clear change': 'No clear change: luck may do as much.',
} as const;

/** What became of the jobs since a coaching began, in words; says how many jobs it still takes where it is too early. */
export const ChangeSince = ({ course, startedOn }: { course: Course | null; startedOn: string }) => {
  const change = course?.coaching.find((one) => one.startedOn === startedOn)?.change;
  if (!change) return 'Too early to say what changed: it takes ten jobs before and ten after.';
  const { difference, low, high, jobsBefore, jobsAfter, found } = change;
  return `Since then ${formatPoints(100 * difference)} points (likely range ${formatPoints(100 * low)} to ${formatPoints(100 * high)}), by ${plural(jobsBefore, 'job', 'jobs')} before and ${jobsAfter} after. ${FOUND[found]}`;
};
