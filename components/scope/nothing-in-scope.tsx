'use client';

import { useScopeOptions } from '@/analytics/scope-options/hook';
import { Button, LinkButton } from '@/components/ui/button';
import { Empty } from '@/components/ui/states';
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
      <Empty
        title="No records yet"
        action={
          mayImport ? (
            <LinkButton tone="primary" href="/imports">
              Bring in a file
            </LinkButton>
          ) : null
        }
      >
        Tarebook computes everything here from recovery records.{' '}
        {mayImport ? 'Last year’s spreadsheet is a good beginning.' : 'Somebody of the office can bring them in.'}
      </Empty>
    );
  const { firstMonth, lastMonth } = data ?? {};
  return (
    <Empty
      title="No recoveries in this scope"
      action={
        <>
          {firstMonth && lastMonth ? (
            <Button onClick={() => setScope({ from: firstMonth, to: lastMonth })}>Show the whole time</Button>
          ) : null}
          {narrowed ? <Button onClick={() => clear()}>Clear the scope</Button> : null}
        </>
      }
    >
      {firstMonth && lastMonth
        ? `The records run from ${formatMonth(firstMonth)} to ${formatMonth(lastMonth)}. None of them is of the period and the conditions above.`
        : 'None of the records is of the period and the conditions above.'}
    </Empty>
  );
};
