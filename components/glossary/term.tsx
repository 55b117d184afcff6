'use client';

import { clsx } from 'clsx';
import { Popover as Radix } from 'radix-ui';
import { type ReactNode, useRef } from 'react';
import type { TermId } from '@/lib/glossary/terms';
import { TermMeaning } from './term-meaning';
import { useTermOpening } from './use-term-opening';

type TermProps = {
  id: TermId;
  /** The word itself, which then opens; without it a small mark stands beside what somebody else writes. */
  children?: ReactNode;
  className?: string;
};

/**
 * A word whose meaning opens beside it: by pressing it, or by resting the mouse on it. What the mouse opened stays while
 * the mouse is on it and goes with Esc, as WCAG 1.4.13 asks.
 */
export const Term = ({ id, children, className }: TermProps) => {
  const button = useRef<HTMLButtonElement>(null);
  const { open, pressed, wasPressed, close, press, rest, leave, stay } = useTermOpening();
  const marked = children === undefined;
  return (
    <Radix.Root open={open} onOpenChange={(next) => (next ? undefined : close())}>
      <Radix.Anchor asChild>
        <button
          ref={button}
          type="button"
          aria-haspopup="dialog"
          aria-expanded={open}
          aria-label={marked ? `What “${id.replaceAll('-', ' ')}” means` : undefined}
          onClick={press}
          onPointerEnter={rest}
          onPointerLeave={leave}
          className={clsx(
            marked
              ? '-my-1.5 inline-flex size-6 shrink-0 items-center justify-center align-middle text-xs font-normal text-ink-3 hover:text-act pointer-coarse:size-11 print:hidden'
              : 'inline text-left text-inherit underline decoration-ink-3 decoration-dotted decoration-[1.5px] underline-offset-[0.25em] hover:text-act hover:decoration-act hover:decoration-solid print:no-underline',
            className,
          )}
        >
          {marked ? (
            <span
              aria-hidden="true"
              className="flex size-4 items-center justify-center border border-current leading-none"
            >
              ?
            </span>
          ) : (
            children
          )}
        </button>
      </Radix.Anchor>
      <Radix.Portal>
        <Radix.Content
          align="start"
          sideOffset={6}
          collisionPadding={12}
          aria-label="Meaning"
          onPointerEnter={stay}
          onPointerLeave={leave}
          onOpenAutoFocus={(event) => (pressed ? undefined : event.preventDefault())}
          onCloseAutoFocus={(event) => {
            event.preventDefault();
            if (wasPressed()) button.current?.focus();
          }}
          // The word's own press decides, or it would close here and open again there.
          onInteractOutside={(event) => {
            if (event.target instanceof Node && button.current?.contains(event.target)) event.preventDefault();
          }}
          className="z-50 max-h-[min(28rem,var(--radix-popover-content-available-height))] w-88 max-w-[92vw] overflow-y-auto border border-ink bg-sheet p-4 text-left text-base font-normal text-ink"
        >
          <TermMeaning id={id} />
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
};
