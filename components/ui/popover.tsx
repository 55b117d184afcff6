'use client';

import { clsx } from 'clsx';
import { Popover as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

type PopoverProps = {
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  /** The button that opens it. */
  trigger: ReactNode;
  label: string;
  align?: 'start' | 'center' | 'end';
  className?: string;
  children: ReactNode;
};

/** Something small to set beside the word that is set. Esc and a click elsewhere close it. */
export const Popover = ({ open, onOpenChange, trigger, label, align = 'start', className, children }: PopoverProps) => (
  <Radix.Root {...(open === undefined ? {} : { open })} {...(onOpenChange ? { onOpenChange } : {})}>
    <Radix.Trigger asChild>{trigger}</Radix.Trigger>
    <Radix.Portal>
      <Radix.Content
        align={align}
        sideOffset={6}
        collisionPadding={12}
        aria-label={label}
        className={clsx(
          'z-50 flex max-h-[min(32rem,var(--radix-popover-content-available-height))] w-80 max-w-[92vw] flex-col border border-ink bg-sheet text-ink',
          className,
        )}
      >
        {children}
      </Radix.Content>
    </Radix.Portal>
  </Radix.Root>
);
