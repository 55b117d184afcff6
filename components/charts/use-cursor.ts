'use client';

import { type KeyboardEvent, useEffect, useState } from 'react';

type CursorOptions = {
  /** What is read first when a key is pressed: the newest of a row of months, the least of a row of amounts. */
  begin: 'first' | 'last';
  /** How far PageUp and PageDown go. */
  stride: number;
};

/** Which mark of a chart is being read, and the keys that move it: one tab stop for the whole chart. */
export const useCursor = (keys: readonly string[], onOpen: (key: string) => void, { begin, stride }: CursorOptions) => {
  const [chosen, setChosen] = useState<string | null>(null);
  // A mark that the scope no longer holds is no longer read.
  const active = chosen !== null && keys.includes(chosen) ? chosen : null;
  // What a mouse has brought up must go away by Escape too, wherever the keyboard stands (WCAG 1.4.13).
  useEffect(() => {
    if (active === null) return undefined;
    const letGo = (event: globalThis.KeyboardEvent) => {
      if (event.key === 'Escape' && !event.defaultPrevented) setChosen(null);
    };
    document.addEventListener('keydown', letGo);
    return () => document.removeEventListener('keydown', letGo);
  }, [active]);
  const last = keys.length - 1;
  const start = begin === 'last' ? last : 0;
  const at = active === null ? start : keys.indexOf(active);
  const step = (by: number) => (active === null ? start : at + by);
  const moves: Record<string, number | undefined> = {
    ArrowLeft: step(-1),
    ArrowDown: step(-1),
    ArrowRight: step(1),
    ArrowUp: step(1),
    PageDown: at - stride,
    PageUp: at + stride,
    Home: 0,
    End: last,
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const move = moves[event.key];
    if (move !== undefined) setChosen(keys[Math.max(0, Math.min(last, move))] ?? null);
    else if (event.key === 'Enter' && active) onOpen(active);
    else if (event.key === 'Escape' && active) setChosen(null);
    else return;
    event.preventDefault();
  };
  return { active, index: at, setActive: setChosen, onKeyDown };
};
