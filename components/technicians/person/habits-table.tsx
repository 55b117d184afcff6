import { HABITS } from '@/analytics/technician-comparison/habits';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { Table, Td, Th } from '@/components/ui/table';
import { formatCount, formatPercent, formatPoints } from '@/lib/format';
import { HABIT_LABELS } from '../wording';

type HabitsTableProps = Pick<TechnicianRow, 'habits' | 'habitBehind'>;

const share = (value: number | null): string => (value === null ? '—' : formatPercent(value));

/** How often each habit is kept, beside colleagues, and what the difference makes of the yield where that is clear. */
export const HabitsTable = ({ habits, habitBehind }: HabitsTableProps) => (
  <Table label="Habits beside colleagues" className="tabular-nums">
    <thead>
      <tr>
        <Th>Habit</Th>
        <Th numeric>Here</Th>
        <Th numeric>Colleagues</Th>
        <Th numeric>Points it makes</Th>
      </tr>
    </thead>
    <tbody>
      {HABITS.map((name) => {
        const { known, share: own, others, costs } = habits[name];
        return (
          <tr key={name} className="align-top">
            <Th scope="row">
              {HABIT_LABELS[name]}
              {name === habitBehind ? <span className="block text-sm text-ink-2">goes with the gap</span> : null}
            </Th>
            <Td numeric>
              {share(own)}
              <span className="block text-sm text-ink-2">{known ? `of ${formatCount(known)}` : 'not recorded'}</span>
            </Td>
            <Td numeric>{share(others)}</Td>
            <Td numeric>{costs === null ? 'not clear' : formatPoints(costs)}</Td>
          </tr>
        );
      })}
    </tbody>
  </Table>
);
