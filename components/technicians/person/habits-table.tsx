import { HABITS } from '@/analytics/technician-comparison/habits';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { formatCount, formatPercent, formatPoints } from '@/lib/format';
import { HABIT_LABELS } from '../wording';

type HabitsTableProps = Pick<TechnicianRow, 'habits' | 'habitBehind'>;

const share = (value: number | null): string => (value === null ? '—' : formatPercent(value));

/** How often each habit is kept, beside colleagues, and what the difference makes of the yield where that is clear. */
export const HabitsTable = ({ habits, habitBehind }: HabitsTableProps) => (
  <div className="overflow-x-auto">
    <table className="w-full min-w-[26rem] tabular-nums">
      <thead>
        <tr className="border-b-2 border-ink text-left text-sm">
          <th scope="col" className="py-1.5 pr-4 font-semibold">
            Habit
          </th>
          <th scope="col" className="py-1.5 pr-4 text-right font-semibold">
            Here
          </th>
          <th scope="col" className="py-1.5 pr-4 text-right font-semibold">
            Colleagues
          </th>
          <th scope="col" className="py-1.5 text-right font-semibold">
            Points it makes
          </th>
        </tr>
      </thead>
      <tbody>
        {HABITS.map((name) => {
          const { known, share: own, others, costs } = habits[name];
          return (
            <tr key={name} className="border-b border-rule-2">
              <th scope="row" className="py-2 pr-4 text-left font-medium">
                {HABIT_LABELS[name]}
                {name === habitBehind ? <span className="block text-sm text-ink-2">goes with the gap</span> : null}
              </th>
              <td className="py-2 pr-4 text-right">
                {share(own)}
                <span className="block text-sm text-ink-2">{known ? `of ${formatCount(known)}` : 'not recorded'}</span>
              </td>
              <td className="py-2 pr-4 text-right align-top">{share(others)}</td>
              <td className="py-2 text-right align-top">{costs === null ? 'not clear' : formatPoints(costs)}</td>
            </tr>
          );
        })}
      </tbody>
    </table>
  </div>
);
