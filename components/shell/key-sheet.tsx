'use client';

import { createContext, type ReactNode, useCallback, useContext, useState } from 'react';
import { Dialog } from '@/components/ui/dialog';
import { Checkbox } from '@/components/ui/field';
import { KEYS_BY_PLACE } from './keys';
import { useKeysWanted } from './use-keys-wanted';
import { useScreens } from './use-screens';
import { useSingleKeys } from './use-single-keys';

const AskForKeys = createContext<() => void>(() => undefined);

/** Opens the sheet of keys. */
export const useKeySheet = (): (() => void) => useContext(AskForKeys);

const KeyList = ({ title, keys }: { title: string; keys: readonly (readonly [keys: string, does: string])[] }) => (
  <section aria-label={title}>
    <h3 className="mt-4 border-b border-ink pb-1 font-semibold">{title}</h3>
    <dl>
      {keys.map(([key, does]) => (
        <div key={key} className="flex justify-between gap-6 border-b border-rule-2 py-1.5">
          <dt className="shrink-0 font-mono text-sm">
            <kbd className="font-mono">{key}</kbd>
          </dt>
          <dd className="text-right text-ink-2">{does}</dd>
        </div>
      ))}
    </dl>
  </section>
);

/** The keys of every place, one question mark away; and whether single keys shall do anything at all. */
export const KeySheet = ({ children }: { children: ReactNode }) => {
  const [open, setOpen] = useState(false);
  const [wanted, want] = useKeysWanted();
  const ask = useCallback(() => setOpen(true), []);
  useSingleKeys(wanted, ask);
  const screens = useScreens().flatMap(({ goKey, name }) => (goKey ? [[`g ${goKey}`, name] as const] : []));
  return (
    <AskForKeys value={ask}>
      {children}
      <Dialog open={open} onOpenChange={setOpen} title="Keys">
        <KeyList title="Anywhere" keys={[['?', 'this sheet'], ...screens]} />
        {KEYS_BY_PLACE.map(({ place, keys }) => (
          <KeyList key={place} title={place} keys={keys} />
        ))}
        <Checkbox
          className="mt-4"
          label="Single keys (? and g) do something in this browser"
          checked={wanted}
          onChange={(event) => want(event.target.checked)}
        />
      </Dialog>
    </AskForKeys>
  );
};
