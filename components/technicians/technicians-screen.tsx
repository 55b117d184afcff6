'use client';

import { useMemo } from 'react';
import { groupAnswer } from '@/analytics/group-sentence';
import { scopeQuery } from '@/analytics/scope-address';
import { useTechnicianRecoveries } from '@/analytics/technicians/hook';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { FileButtons } from '@/components/files/file-buttons';
import { ScopedReport } from '@/components/scope/scoped-report';
import { useScope } from '@/components/scope/use-scope';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { techniciansFile } from './technicians-file';
import { TechniciansTable } from './technicians-table';

const WORDS = { one: 'technician', many: 'technicians', verb: 'brought in' };

/** Who recovered how much, with what yields do and do not say. */
export const TechniciansScreen = () => {
  const { scope } = useScope();
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const { data, error, isPlaceholderData, refetch } = useTechnicianRecoveries(query);
  return (
    <ScopedReport
      screen="Technicians"
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
            sub="A yield alone does not judge a person. A system that had leaked before anyone came gives little to the best technician, and large chillers give more than window units to anyone. Read the records before you speak to somebody."
          />
          <Sheet
            title="The crew"
            aside="by name; choose a heading to put it in another order"
            tools={<FileButtons makeTable={() => techniciansFile(items, scope)} />}
          >
            <TechniciansTable items={items} scope={scope} />
          </Sheet>
          <p className="max-w-prose text-sm text-ink-2">
            Total yield is all recovered mass over all full charges; median yield is the middle one of the recoveries.
            Full charge is the nameplate charge plus what was added for long lines. Entry errors are left out.
          </p>
        </>
      )}
    </ScopedReport>
  );
};
