'use client';

import { useEffect, useRef } from 'react';
import { FileButtons } from '@/components/files/file-buttons';
import type { ChartModel } from './model';
import { modelFile } from './model-file';
import { ModelTable } from './model-table';

/** A chart's figures, opened by who wants them, and its files. On paper they stand under the chart. */
export const FoldedTable = ({ model }: { model: ChartModel }) => {
  const folded = useRef<HTMLDetailsElement>(null);
  useEffect(() => {
    const unfold = () => folded.current?.setAttribute('open', '');
    window.addEventListener('beforeprint', unfold);
    return () => window.removeEventListener('beforeprint', unfold);
  }, []);
  return (
    <div className="border-t border-rule-2 pt-2.5 pb-1">
      <details ref={folded}>
        <summary className="link text-sm print:hidden">The same in figures</summary>
        <div className="mt-3">
          <ModelTable model={model} label={model.title} />
        </div>
      </details>
      <div className="mt-2.5 flex flex-wrap gap-x-5 gap-y-1 text-sm print:hidden">
        <FileButtons makeTable={() => modelFile(model)} />
      </div>
    </div>
  );
};
