'use client';

import { Command } from 'cmdk';
import { useEffect, useId, useRef, useState } from 'react';
import type { ScopePart } from '@/analytics/dimensions';
import { Button } from '@/components/ui/button';
import { formatCount } from '@/lib/format';
import { ChoiceItem } from './choice-item';
import { choiceName, DIMENSION_WORDS } from './wording';

/** As many as can be drawn at once without making anybody wait; searching finds the rest. */
const MOST_SHOWN = 120;
/** Fewer than this are seen at a glance: no search. */
const LEAST_SEARCHED = 8;

type ChoiceEditorProps = {
  dimension: ScopePart;
  /** `recoveries` is null where they were not counted. */
  choices: readonly { value: string; recoveries: number | null }[];
  selected: readonly string[];
  onApply: (values: string[]) => void;
  close: () => void;
};

// "r22" finds R-22: nobody types the hyphen.
const folded = (text: string) => text.toLowerCase().replace(/[\s\u2011-]/g, '');

/** Values to tick, with the number of their records; nothing changes before "Show". */
export const ChoiceEditor = ({ dimension, choices, selected, onApply, close }: ChoiceEditorProps) => {
  const [draft, setDraft] = useState<readonly string[]>(selected);
  const [typed, setTyped] = useState('');
  const labelId = useId();
  // The opened part has taken the focus before this was loaded.
  const input = useRef<HTMLInputElement>(null);
  useEffect(() => input.current?.focus(), []);
  const words = DIMENSION_WORDS[dimension];

  // What the address names and no record has stands first, to be taken out.
  const known = new Set(choices.map((choice) => choice.value));
  const unknown = selected.filter((value) => !known.has(value)).map((value) => ({ value, recoveries: 0 }));
  const found = [...unknown, ...choices].filter(({ value }) =>
    folded(choiceName(dimension, value)).includes(folded(typed)),
  );
  const shown = found.slice(0, MOST_SHOWN);

  const noteOf = ({ value, recoveries }: (typeof choices)[number]) => {
    if (!known.has(value)) return 'not known here';
    return recoveries === null ? '' : formatCount(recoveries);
  };
  const toggle = (value: string) =>
    setDraft((before) => (before.includes(value) ? before.filter((one) => one !== value) : [...before, value]));
  const apply = (values: readonly string[]) => {
    onApply([...values]);
    close();
  };

  return (
    // The buttons stand outside of the list: inside it Enter ticks a value, wherever the focus is.
    <div className="flex min-h-0 flex-col">
      <Command shouldFilter={false} label={words.many} className="flex min-h-0 flex-col" loop>
        <p id={labelId} className="sr-only">
          {words.many}
        </p>
        <Command.Input
          ref={input}
          value={typed}
          onValueChange={setTyped}
          placeholder={`Find a ${words.one}`}
          className={
            choices.length < LEAST_SEARCHED
              ? 'sr-only'
              : 'mb-2 h-11 w-full shrink-0 border border-edge bg-sheet px-3 text-base'
          }
        />
        <Command.List aria-labelledby={labelId} className="max-h-72 min-h-0 overflow-y-auto sm:max-h-80">
          {shown.map((choice) => (
            <ChoiceItem
              key={choice.value}
              value={choice.value}
              name={choiceName(dimension, choice.value)}
              small={noteOf(choice)}
              checked={draft.includes(choice.value)}
              onToggle={() => toggle(choice.value)}
            />
          ))}
        </Command.List>
        {found.length === 0 ? <p className="py-3 text-sm text-ink-2">Nothing here has that name.</p> : null}
        {found.length > MOST_SHOWN ? (
          <p className="pt-2 text-sm text-ink-2">
            {formatCount(found.length - MOST_SHOWN)} more: type a part of the name.
          </p>
        ) : null}
      </Command>
      <div className="mt-3 flex gap-3 border-t border-rule pt-3">
        <Button tone="primary" className="flex-1" onClick={() => apply(draft)}>
          Show
        </Button>
        <Button className="flex-1" onClick={() => apply([])}>
          All
        </Button>
      </div>
    </div>
  );
};
