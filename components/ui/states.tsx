import { clsx } from 'clsx';
import type { ReactNode } from 'react';
import { Button } from './button';

type LoadingProps = { label?: string; minHeight?: number; className?: string };

/** Holds the place of what is still being read, so that nothing jumps when it comes. `minHeight` in pixels. */
export const Loading = ({ label = 'Reading the records', minHeight = 160, className }: LoadingProps) => (
  <div role="status" style={{ minHeight }} className={clsx('flex flex-col justify-center gap-3', className)}>
    <p className="text-center text-sm text-ink-2">{label}</p>
    <div aria-hidden="true" className="mx-auto h-0.5 w-40 overflow-hidden bg-rule">
      <div className="h-full w-1/4 motion-safe:animate-[sweep_1.6s_ease-in-out_infinite] bg-ink-2" />
    </div>
  </div>
);

type EmptyProps = { title: ReactNode; children?: ReactNode; action?: ReactNode; className?: string };

/** Says that there is nothing, why that may be, and what to do next. */
export const Empty = ({ title, children, action, className }: EmptyProps) => (
  <div className={clsx('py-8', className)}>
    <p className="text-lg font-semibold">{title}</p>
    {children ? <div className="mt-1 max-w-prose text-ink-2">{children}</div> : null}
    {action ? <div className="mt-4 flex flex-wrap gap-3">{action}</div> : null}
  </div>
);

type FailedProps = { error?: Error | null; title?: string; onRetry?: () => void; className?: string };

/** Says what could not be done and offers to try again. */
export const Failed = ({ error, title = 'This could not be read.', onRetry, className }: FailedProps) => (
  <div role="alert" className={clsx('py-8', className)}>
    <p className="text-lg font-semibold">{title}</p>
    {error?.message ? <p className="mt-1 max-w-prose text-ink-2">{error.message}</p> : null}
    {onRetry ? (
      <Button className="mt-4" onClick={onRetry}>
        Try again
      </Button>
    ) : null}
  </div>
);
