import { clsx } from 'clsx';
import type { ReactNode } from 'react';

type PageHeadProps = {
  /** The answering sentence: what the screen says, in plain words. */
  title: ReactNode;
  sub?: ReactNode;
  /** The one or two verbs of the screen. */
  actions?: ReactNode;
  className?: string;
};

/** The head of a screen: the answer first, then what explains it. */
export const PageHead = ({ title, sub, actions, className }: PageHeadProps) => (
  <div className={clsx('flex flex-wrap items-end justify-between gap-x-8 gap-y-4', className)}>
    <div className="min-w-0">
      <h1 className="max-w-[26em] text-[1.625rem] leading-[1.2] font-semibold tracking-tight text-balance sm:text-2xl">
        {title}
      </h1>
      {sub ? <p className="mt-2 max-w-[46em] text-ink-2">{sub}</p> : null}
    </div>
    {actions ? <div className="flex flex-wrap gap-3 print:hidden">{actions}</div> : null}
  </div>
);
