import { formatCount } from '@/lib/format';
import type { ImportView } from '@/lib/imports/contract';

/** The four counts over the whole file; what is not refused is new, changed or unchanged. */
export const OutcomeCounts = ({ view }: { view: ImportView }) => {
  const counts = [
    ['New', view.added],
    ['Changed', view.updated],
    ['Unchanged', view.unchanged],
    ['Refused', view.rejected],
  ] as const;
  return (
    <dl className="grid grid-cols-2 gap-px bg-rule sm:grid-cols-4">
      {counts.map(([label, count]) => (
        <div key={label} className="flex flex-col-reverse bg-sheet px-4 py-3 sm:px-6">
          <dt className="text-sm text-ink-2">{label}</dt>
          <dd className="text-xl font-semibold tabular-nums">{formatCount(count)}</dd>
        </div>
      ))}
    </dl>
  );
};
