'use client';

import { useScopeOptions } from '@/analytics/scope-options/hook';
import { Button, LinkButton } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { useMay } from '@/components/viewer-context';
import { formatMonth } from '@/lib/format';
import { useScope } from './use-scope';

/** Why a screen has nothing to show and what to do next: bring records in, or look where they are. */
export const NothingInScope = () => {
  const mayImport = useMay('imports:manage');
  const { setScope, clear, narrowed } = useScope();
  const { data } = useScopeOptions();
  if (data?.recoveries === 0)
    return (
      <>
        <PageHead
          title="No records yet."
          sub={`Tarebook computes everything here from recovery records. ${mayImport ? 'Last year’s spreadsheet is a good beginning.' : 'Somebody of the office can bring them in.'}`}
        />
        {mayImport ? (
          <LinkButton tone="primary" href="/imports" className="mt-5">
            Bring in a file
          </LinkButton>
        ) : null}
      </>
    );
  const { firstMonth, lastMonth } = data ?? {};
  const reach =
    firstMonth && lastMonth ? `The records run from ${formatMonth(firstMonth)} to ${formatMonth(lastMonth)}. ` : '';
  return (
    <>
      <PageHead
        title="No recoveries in this scope."
        sub={`${reach}None of the records is of the period and the conditions above.`}
      />
      <div className="mt-5 flex flex-wrap gap-3">
        {firstMonth && lastMonth ? (
          <Button onClick={() => setScope({ from: firstMonth, to: lastMonth })}>Show the whole time</Button>
        ) : null}
        {narrowed ? <Button onClick={() => clear()}>Clear the scope</Button> : null}
      </div>
    </>
  );
};
