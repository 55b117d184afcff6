import Link from 'next/link';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { ColumnsExplained } from './columns-explained';
import { FileDrop } from './file-drop';
import { PastImports } from './past-imports';

/** Where files of records come in. */
export const ImportsScreen = () => (
  <div className="flex flex-col gap-6">
    <PageHead
      title="Bring in records from a file"
      sub="You see what a file would change before it changes anything. Rows that can’t be understood are refused with a reason; the others are taken."
    />
    <Sheet title="A file of recoveries">
      <FileDrop />
      <ColumnsExplained />
    </Sheet>
    <p className="text-ink-2">
      Refrigerant that was put into appliances has{' '}
      <Link href="/charge-additions" className="link">
        a file of its own
      </Link>
      .
    </p>
    <PastImports />
  </div>
);
