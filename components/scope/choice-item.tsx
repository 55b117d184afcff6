'use client';

import { Command } from 'cmdk';

type ChoiceItemProps = {
  value: string;
  name: string;
  /** How many records have this value, or that none is known to. */
  small: string;
  checked: boolean;
  onToggle: () => void;
};

/** One value to tick. Arrow keys move over the list, Enter or a touch ticks. */
export const ChoiceItem = ({ value, name, small, checked, onToggle }: ChoiceItemProps) => (
  <Command.Item
    value={value}
    onSelect={onToggle}
    aria-checked={checked}
    className="flex min-h-11 cursor-pointer items-center gap-3 px-2 data-[selected=true]:bg-act-weak pointer-fine:min-h-9"
  >
    <span
      aria-hidden="true"
      className="flex size-5 shrink-0 items-center justify-center border border-edge bg-sheet text-act-ink group-aria-checked:bg-act"
      style={checked ? { background: 'var(--act)', borderColor: 'var(--act)' } : undefined}
    >
      {checked ? (
        <svg width="12" height="10" viewBox="0 0 12 10" aria-hidden="true">
          <path d="M1 5l3.5 3.5L11 1.5" fill="none" stroke="currentColor" strokeWidth="2" />
        </svg>
      ) : null}
    </span>
    <span className="min-w-0 flex-1 break-words">{name}</span>
    <span className="shrink-0 font-mono text-sm text-ink-2">{small}</span>
  </Command.Item>
);
