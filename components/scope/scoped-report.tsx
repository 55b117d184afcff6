'use client';

import { clsx } from 'clsx';
import type { ReactNode } from 'react';
import { FigurePage } from '@/components/figures/figure-page';
import { Failed, Loading } from '@/components/ui/states';
import { NothingInScope } from './nothing-in-scope';
import { ScopeSentence } from './scope-sentence';

type ScopedReportProps<Answer> = {
  /** Name of the screen, for who cannot see it while there is no answer to head it. */
  screen: string;
  data: Answer | undefined;
  error: Error | null;
  /** Whether newer figures are on their way. */
  stale: boolean;
  retry: () => void;
  isEmpty: (data: Answer) => boolean;
  children: (data: Answer) => ReactNode;
};

/** A screen of one answer under its scope: being read, failed, nothing there, or the answer itself. */
export const ScopedReport = <Answer,>({
  screen,
  data,
  error,
  stale,
  retry,
  isEmpty,
  children,
}: ScopedReportProps<Answer>) => (
  <FigurePage>
    <ScopeSentence />
    {data ? null : <h1 className="sr-only">{screen}</h1>}
    {data ? (
      <div
        key="answer"
        aria-busy={stale}
        className={clsx('flex flex-col gap-6 transition-opacity', stale && 'opacity-50')}
      >
        {isEmpty(data) ? <NothingInScope /> : children(data)}
      </div>
    ) : error ? (
      <Failed error={error} onRetry={retry} />
    ) : (
      // Another element than the answer, and as tall as the window: neither the sheet nor the foot of the page moves.
      <div key="reading" className="mt-20 min-h-dvh bg-sheet px-6 py-5">
        <Loading minHeight={480} />
      </div>
    )}
  </FigurePage>
);
