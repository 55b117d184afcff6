import { monthInScope } from '@/analytics/figures/figure';
import type { MonthlyPattern } from '@/analytics/monthly-pattern/contract';
import { unusualNote } from '@/analytics/monthly-pattern/sentence';
import type { MonthlyTrends } from '@/analytics/monthly-trends/contract';
import { trendAnswer, trendNotes } from '@/analytics/monthly-trends/sentence';
import type { Stacks } from '@/analytics/monthly-trends/series';
import type { Note } from '@/analytics/notes/contract';
import type { ScopeSelection } from '@/analytics/scope-address';
import type { Comparison } from '@/analytics/trends-comparison/contract';
import { certaintyWords, comparisonAnswer, comparisonNote, moverNote } from '@/analytics/trends-comparison/sentence';
import { FigureLink } from '@/components/figures/figure-link';
import { choiceName } from '@/components/scope/wording';
import { PageHead } from '@/components/ui/page-head';

type TrendsHeadProps = {
  trends: MonthlyTrends;
  stacks: Stacks;
  scope: ScopeSelection;
  comparison: Comparison | null;
  /** Whether somebody chose with what to compare: then the answer is about that. */
  chosen: boolean;
  pattern: MonthlyPattern['pattern'];
  notes: readonly Note[];
  className?: string;
};

/** Whether the longer view is of no more than the month that the answer is about. */
const isOfMonth = ({ now }: Comparison, month: string | null): boolean =>
  month !== null && now.from.startsWith(month) && now.to.startsWith(month);

/** What came in, against what, what explains it, how sure that is, and what was unusual: in plain words. */
export const TrendsHead = (props: TrendsHeadProps) => {
  const { trends, stacks, scope, comparison, chosen, pattern, notes, className } = props;
  const about = chosen ? comparison : null;
  const answer = about ? comparisonAnswer(about, scope.unit) : trendAnswer(stacks, scope.unit);
  const days = about ? { from: about.now.from, to: about.now.to } : {};
  const nameOf = (key: string) => choiceName(trends.by, key);
  // Only months that the chart shows are spoken of.
  const first = stacks.months[0]?.month ?? '';
  const unusual = pattern
    ? unusualNote(
        pattern.months.filter(({ month }) => month >= first),
        notes,
        scope.unit,
      )
    : null;
  const sub = [
    about ? moverNote(about, trends.by, scope.unit, nameOf) : null,
    ...(about ? [] : trendNotes(stacks, trends, scope.unit, nameOf)),
    comparison && (about || isOfMonth(comparison, answer.month))
      ? certaintyWords(comparison)
      : comparison && comparisonNote(comparison, scope.unit),
    unusual,
  ];
  return (
    <PageHead
      title={
        <>
          {answer.before}
          {answer.figure ? (
            <FigureLink
              measure="recoveredMass"
              scope={answer.month ? monthInScope(scope, answer.month) : { ...scope, ...days }}
            >
              {answer.figure}
            </FigureLink>
          ) : null}
          {answer.after}
        </>
      }
      sub={sub.filter(Boolean).join(' ')}
      {...(className ? { className } : {})}
    />
  );
};
