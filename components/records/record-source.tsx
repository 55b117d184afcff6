'use client';

import Link from 'next/link';
import type { RecordDetail } from '@/analytics/records/contract';
import { useMay } from '@/components/viewer-context';

/** Where the record came from: a line of a file, or somebody's hand. */
export const RecordSource = ({ source }: { source: RecordDetail['source'] }) => {
  const mayOpen = useMay('imports:manage');
  if (!source) return <p className="mt-3 text-sm text-ink-2">Written by hand, not from a file.</p>;
  const file = `“${source.fileName}”`;
  return (
    <p className="mt-3 text-sm text-ink-2">
      From {source.line === null ? '' : `line ${source.line} of `}
      {mayOpen ? (
        <Link href={`/imports/${source.importId}`} className="link">
          {file}
        </Link>
      ) : (
        file
      )}
      .
    </p>
  );
};
