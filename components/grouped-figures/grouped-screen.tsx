'use client';

import type { ReactNode } from 'react';
import { type GroupWords, groupAnswer } from '@/analytics/group-sentence';
import type { GroupFigures } from '@/analytics/grouped-figures/contract';
import type { ScopeSelection } from '@/analytics/scope-address';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { FileButtons } from '@/components/files/file-buttons';
import { ScopedReport } from '@/components/scope/scoped-report';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import type { GroupedColumn } from './column';
import { groupedFile } from './grouped-file';
import { GroupedTable } from './grouped-table';

/** What sets one screen of groups apart from the others. */
export type GroupedKind<Row> = {
  screen: string;
  words: GroupWords;
  /** Name of the table and of its file. */
  label: string;
  title: string;
  /** In which order the rows stand. */
  order: string;
  columns: readonly GroupedColumn<Row>[];
  rowId: (row: Row) => string;
  ownScope: (scope: ScopeSelection, row: Row) => ScopeSelection;
  /** The answer, where what the groups come to is not what is asked. */
  answer?: (items: readonly Row[]) => ReactNode;
  /** Said under the answer. */
  sub: (items: readonly Row[]) => ReactNode;
  /** What the columns mean. */
  note: ReactNode;
};

type GroupedScreenProps<Row> = {
  kind: GroupedKind<Row>;
  scope: ScopeSelection;
  answer: {
    data: { items: Row[] } | undefined;
    error: Error | null;
    isPlaceholderData: boolean;
    refetch: () => unknown;
  };
  /** A picture of the groups, over their table. */
  picture?: ReactNode;
};

/** A screen of groups under the scope: what they come to in a sentence, then each of them. */
export const GroupedScreen = <Row extends GroupFigures>({ kind, scope, answer, picture }: GroupedScreenProps<Row>) => (
  <ScopedReport
    screen={kind.screen}
    data={answer.data}
    error={answer.error}
    stale={answer.isPlaceholderData}
    retry={() => answer.refetch()}
    isEmpty={({ items }) => items.length === 0}
  >
    {({ items }) => (
      <>
        <PageHead
          title={
            kind.answer?.(items) ?? <FigureSentence pieces={groupAnswer(items, kind.words, scope.unit)} scope={scope} />
          }
          sub={kind.sub(items)}
        />
        {picture}
        <Sheet
          title={kind.title}
          aside={
            <>
              {kind.order}
              <span className="print:hidden">
                ; a heading puts them in another order, every figure opens its records
              </span>
            </>
          }
          tools={<FileButtons makeTable={() => groupedFile(kind.label, kind.columns, items, scope)} />}
        >
          <GroupedTable {...kind} items={items} scope={scope} />
        </Sheet>
        <p className="max-w-prose text-sm text-ink-2">{kind.note}</p>
      </>
    )}
  </ScopedReport>
);
