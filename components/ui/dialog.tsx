'use client';

import { clsx } from 'clsx';
import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

type DialogProps = {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: ReactNode;
  description?: ReactNode;
  /** On phones the sheet rises from the bottom, where a thumb reaches it. */
  className?: string;
  children: ReactNode;
};

/** A question or a small form that must be answered before going on. Esc and the ground close it. */
export const Dialog = ({ open, onOpenChange, title, description, className, children }: DialogProps) => (
  <Radix.Root open={open} onOpenChange={onOpenChange}>
    <Radix.Portal>
      <Radix.Overlay className="fixed inset-0 z-40 bg-[#0b0e0f]/55" />
      <Radix.Content
        {...(description ? {} : { 'aria-describedby': undefined })}
        className={clsx(
          'fixed z-50 flex max-h-[85dvh] flex-col border-t-6 border-shoulder bg-sheet text-ink',
          'inset-x-0 bottom-0 pb-[env(safe-area-inset-bottom)]',
          'sm:inset-x-auto sm:top-1/2 sm:bottom-auto sm:left-1/2 sm:w-[min(34rem,92vw)] sm:-translate-x-1/2 sm:-translate-y-1/2',
          className,
        )}
      >
        <div className="flex items-start justify-between gap-4 px-5 pt-3">
          <Radix.Title className="pt-2 text-lg font-semibold">{title}</Radix.Title>
          <Radix.Close className="-mr-2 flex size-11 shrink-0 items-center justify-center text-ink-2 hover:text-ink">
            <svg width="16" height="16" viewBox="0 0 16 16" role="img" aria-label="Close">
              <path d="M2 2l12 12M14 2L2 14" stroke="currentColor" strokeWidth="2" fill="none" />
            </svg>
          </Radix.Close>
        </div>
        {description ? <Radix.Description className="px-5 pt-1 text-ink-2">{description}</Radix.Description> : null}
        <div className="min-h-0 overflow-y-auto px-5 pt-3 pb-5">{children}</div>
      </Radix.Content>
    </Radix.Portal>
  </Radix.Root>
);
