'use client';

import Link from 'next/link';
import { useState } from 'react';
import type { ApplianceLeaks } from '@/analytics/leak-rate/contract';
import { Button, TextButton } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import { useMay } from '@/components/viewer-context';
import { formatCount } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { AdditionForm } from './addition-form';
import { AdditionItem } from './addition-item';

const SHOWN = 8;

/** What was written down about refrigerant put into the unit, the newest first, and the form for more. */
export const AdditionsSheet = ({ leaks, unit }: { leaks: ApplianceLeaks; unit: DisplayUnit }) => {
  const mayWrite = useMay('leaks:write');
  const [writing, setWriting] = useState(false);
  const [all, setAll] = useState(false);
  const { additions, applianceId } = leaks;
  return (
    <Sheet
      title="Refrigerant added"
      aside="as it was written down"
      tools={
        <Link href="/charge-additions" className="link">
          Bring in a file of additions
        </Link>
      }
    >
      {additions.length ? (
        <ul>
          {(all ? additions : additions.slice(0, SHOWN)).map((addition) => (
            <AdditionItem key={addition.id} addition={addition} unit={unit} />
          ))}
        </ul>
      ) : (
        <p className="text-ink-2">
          Nothing is written down. With each addition, the leak rate that the rules ask for can be computed.
        </p>
      )}
      {additions.length > SHOWN && !all ? (
        <TextButton className="mt-2 print:hidden" onClick={() => setAll(true)}>
          Show all {formatCount(additions.length)}
        </TextButton>
      ) : null}
      {mayWrite ? (
        <div className="mt-4">
          {writing ? (
            <AdditionForm applianceId={applianceId} addition={null} unit={unit} onDone={() => setWriting(false)} />
          ) : (
            <Button className="print:hidden" onClick={() => setWriting(true)}>
              Write down an addition
            </Button>
          )}
        </div>
      ) : null}
    </Sheet>
  );
};
