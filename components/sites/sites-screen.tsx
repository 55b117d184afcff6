'use client';

import { useMemo } from 'react';
import { groupAnswer, spreadNote } from '@/analytics/group-sentence';
import { scopeQuery } from '@/analytics/scope-address';
import { useSiteRecoveries } from '@/analytics/sites/hook';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { FileButtons } from '@/components/files/file-buttons';
import { ScopedReport } from '@/components/scope/scoped-report';
import { useScope } from '@/components/scope/use-scope';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { sitesFile } from './sites-file';
import { SitesTable } from './sites-table';

const WORDS = { one: 'site', many: 'sites', verb: 'gave' };

/** Where refrigerant was recovered, and how much of what the equipment held. */
export const SitesScreen = () => {
  const { scope } = useScope();
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const { data, error, isPlaceholderData, refetch } = useSiteRecoveries(query);
  return (
    <ScopedReport
      screen="Sites"
      data={data}
      error={error}
      stale={isPlaceholderData}
      retry={() => refetch()}
      isEmpty={({ items }) => items.length === 0}
    >
      {({ items }) => (
        <>
          <PageHead
            title={<FigureSentence pieces={groupAnswer(items, WORDS, scope.unit)} scope={scope} />}
            sub={`${spreadNote(items, WORDS.many)} A low yield at a site may mean that its equipment leaks; its records show which unit.`.trim()}
          />
          <Sheet
            title="The sites"
            aside="by name; choose a heading to put them in another order"
            tools={<FileButtons makeTable={() => sitesFile(items, scope)} />}
          >
            <SitesTable items={items} scope={scope} />
          </Sheet>
          <p className="max-w-prose text-sm text-ink-2">
            Appliances are those with a recovery in this scope. Total yield is all recovered mass over all full charges;
            median yield is the middle one of the recoveries. Entry errors are left out.
          </p>
        </>
      )}
    </ScopedReport>
  );
};
