'use client';

import Link from 'next/link';
import { parseAsNativeArrayOf, parseAsStringLiteral, useQueryState } from 'nuqs';
import { useMemo, useState } from 'react';
import { byRecord } from '@/analytics/flags/by-record';
import { type FlagsAsked, fetchAllFlags, useFlags } from '@/analytics/flags/hook';
import { borneOutNote, CERTAINTY_MEANING, flagsAnswer, lessSureNote } from '@/analytics/flags/sentence';
import { FLAG_STATES } from '@/analytics/flags/states';
import { scopeQuery } from '@/analytics/scope-address';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { FileButtons } from '@/components/files/file-buttons';
import { ScopedReport } from '@/components/scope/scoped-report';
import { useScope } from '@/components/scope/use-scope';
import { Button } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { Empty } from '@/components/ui/states';
import { FLAG_RULES } from '@/lib/vocabulary';
import { flagsFile } from './flags-file';
import { FlagsList } from './flags-list';
import { RuleChoice } from './rule-choice';
import { StateChoice } from './state-choice';
import { type JustDecided, UndoNotice } from './undo-notice';

const STATE = parseAsStringLiteral(FLAG_STATES).withDefault('open').withOptions({ history: 'push' });
const RULES = parseAsNativeArrayOf(parseAsStringLiteral(FLAG_RULES)).withOptions({ history: 'push' });

/** Records that need a look, the surest first: why, and what to say about them. */
export const FlagsScreen = () => {
  const { scope } = useScope();
  const [state, setState] = useQueryState('state', STATE);
  const [rules, setRules] = useQueryState('rule', RULES);
  const [decided, setDecided] = useState<JustDecided | null>(null);
  const asked = useMemo<FlagsAsked>(
    () => ({ scope: scopeQuery(scope), state, rules, unit: scope.unit }),
    [scope, state, rules],
  );
  const flags = useFlags(asked);
  return (
    <ScopedReport
      screen="Flags"
      data={flags.data}
      error={flags.error}
      stale={flags.isPlaceholderData}
      retry={() => flags.refetch()}
      isEmpty={() => false}
    >
      {({ pages: [first, ...rest] }) => {
        if (!first) return null;
        const items = [first, ...rest].flatMap((page) => page.items);
        const records = byRecord(items);
        const surest = state === 'open' && rules.length === 0 ? first.items[0] : undefined;
        return (
          <>
            <PageHead
              title={
                <FigureSentence
                  pieces={flagsAnswer(first.open, surest && { flag: surest, unit: scope.unit })}
                  scope={scope}
                />
              }
              sub={
                <>
                  A reason to look, not a finding. {lessSureNote(first.open)} {CERTAINTY_MEANING}{' '}
                  {borneOutNote(first.borneOut)}{' '}
                  <Link href="/how-we-judge" className="link">
                    How we judge
                  </Link>
                </>
              }
            />
            <Sheet
              title="To look at"
              aside={<StateChoice state={state} onChange={setState} />}
              tools={<FileButtons makeTable={async () => flagsFile(await fetchAllFlags(asked), scope)} />}
            >
              {first.renewing ? (
                <p role="status" className="mb-3 text-sm text-ink-2">
                  Records are being judged; the list follows by itself.
                </p>
              ) : null}
              <RuleChoice byRule={first.open.byRule} rules={rules} onChange={setRules} />
              {records.length ? (
                <FlagsList records={records} unit={scope.unit} onDecided={setDecided} />
              ) : (
                <Empty title="Nothing here.">Choose another period, another reason, or look at what was decided.</Empty>
              )}
              {flags.hasNextPage ? (
                <Button
                  className="mt-4 mb-2 print:hidden"
                  disabled={flags.isFetchingNextPage}
                  onClick={() => flags.fetchNextPage()}
                >
                  {flags.isFetchingNextPage ? 'Reading more' : 'Show more'}
                </Button>
              ) : null}
            </Sheet>
            {decided ? <UndoNotice key={decided.flagId} decided={decided} onGone={() => setDecided(null)} /> : null}
          </>
        );
      }}
    </ScopedReport>
  );
};
