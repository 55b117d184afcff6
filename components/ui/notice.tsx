import { clsx } from 'clsx';
import type { ReactNode } from 'react';

const TONES = {
  info: { mark: 'i', fill: 'bg-act text-act-ink' },
  warning: { mark: '!', fill: 'bg-shoulder text-shoulder-ink' },
  danger: { mark: '!', fill: 'bg-danger text-sheet' },
  good: { mark: '✓', fill: 'bg-good text-sheet' },
} as const;

type NoticeProps = {
  tone?: keyof typeof TONES;
  title?: ReactNode;
  /** Read out at once when it appears: for what just went wrong or was just done. */
  announce?: boolean;
  className?: string;
  children?: ReactNode;
};

/** A sentence that must not be missed, behind a square mark like the label on a cylinder. */
export const Notice = ({ tone = 'info', title, announce = false, className, children }: NoticeProps) => (
  <div
    {...(announce ? { role: tone === 'danger' ? 'alert' : 'status' } : {})}
    className={clsx('flex bg-sheet outline outline-1 -outline-offset-1 outline-rule', className)}
  >
    <span
      aria-hidden="true"
      className={clsx(
        'flex w-9 shrink-0 items-start justify-center pt-3 font-mono leading-none font-bold',
        TONES[tone].fill,
      )}
    >
      {TONES[tone].mark}
    </span>
    <div className="min-w-0 flex-1 px-3.5 py-2">
      {title ? <p className="font-semibold">{title}</p> : null}
      {children ? <div className={clsx('max-w-prose', title && 'text-ink-2')}>{children}</div> : null}
    </div>
  </div>
);
