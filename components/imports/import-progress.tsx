import { Loading } from '@/components/ui/states';
import type { ImportView } from '@/lib/imports/contract';
import { importSentence } from './import-words';

/** How far the reading has come: a bar to see, and a sentence read out at every tenth. */
export const ImportProgress = ({ view }: { view: ImportView }) => {
  const { rowsRead, rowsTotal, dryRun } = view;
  // Nothing can be measured before the rows are counted.
  if (!rowsTotal)
    return (
      <div className="bg-sheet">
        <Loading label="Looking at the columns" minHeight={104} />
      </div>
    );
  const share = Math.min(1, rowsRead / rowsTotal);
  return (
    <div className="bg-sheet px-4 py-5 sm:px-6">
      <progress
        aria-label={importSentence(view)}
        max={1}
        value={share}
        className="h-4 w-full appearance-none border border-edge bg-sheet-2 [&::-moz-progress-bar]:bg-shoulder [&::-webkit-progress-bar]:bg-sheet-2 [&::-webkit-progress-value]:bg-shoulder"
      />
      <p className="mt-2 text-ink-2">
        {dryRun ? 'No record is changed by this.' : 'You may leave this page; the work goes on.'}
      </p>
      <p role="status" className="sr-only">
        {`${Math.floor(share * 10) * 10}% read`}
      </p>
    </div>
  );
};
