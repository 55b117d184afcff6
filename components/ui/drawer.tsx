'use client';

import { clsx } from 'clsx';
import { Dialog as Radix } from 'radix-ui';
import { type ReactNode, useRef } from 'react';

type DrawerProps = {
  open: boolean;
  onClose: () => void;
  title: ReactNode;
  /** Said under the title, and read out with it. */
  description: ReactNode;
  children: ReactNode;
};

/**
 * More about something on the screen: comes in from the right and leaves the screen in sight; a phone it fills. Esc, the
 * ground and the cross close it, and the keyboard is back where it was.
 */
export const Drawer = ({ open, onClose, title, description, children }: DrawerProps) => {
  // Nothing of this component's own opens it, so it has to remember itself where the keyboard was.
  const openedFrom = useRef<Element | null>(null);
  return (
    <Radix.Root open={open} onOpenChange={(next) => (next ? undefined : onClose())}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-[#0b0e0f]/55 print:hidden" />
        <Radix.Content
          onOpenAutoFocus={() => {
            openedFrom.current = document.activeElement;
          }}
          onCloseAutoFocus={(event) => {
            event.preventDefault();
            if (openedFrom.current instanceof HTMLElement) openedFrom.current.focus({ preventScroll: true });
          }}
          className={clsx(
            'fixed inset-y-0 right-0 z-50 flex w-full flex-col bg-sheet text-ink sm:w-[min(63rem,92vw)] sm:border-l-6 sm:border-shoulder',
            'pb-[env(safe-area-inset-bottom)] motion-safe:animate-[drawer_160ms_ease-out]',
          )}
        >
          <div className="flex items-start justify-between gap-4 border-b border-rule px-4 pt-3 pb-3 sm:px-7 sm:pt-5">
            <div className="min-w-0">
              <Radix.Title asChild>
                <h2 className="text-2xl leading-tight font-semibold tracking-tight">{title}</h2>
              </Radix.Title>
              <Radix.Description className="mt-1 text-ink-2">{description}</Radix.Description>
            </div>
            <Radix.Close className="-mt-1 -mr-2 flex size-11 shrink-0 items-center justify-center text-ink-2 hover:text-ink">
              <svg width="16" height="16" viewBox="0 0 16 16" role="img" aria-label="Close">
                <path d="M2 2l12 12M14 2L2 14" stroke="currentColor" strokeWidth="2" fill="none" />
              </svg>
            </Radix.Close>
          </div>
          <div className="min-h-0 grow overflow-y-auto overscroll-contain px-4 pt-4 pb-6 sm:px-7">{children}</div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
};
