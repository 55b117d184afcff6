'use client';

import { type KeyboardEvent, useEffect, useState } from 'react';

/** Which month is being read, and the keys that move it: one tab stop for the whole chart. */
export const useMonthCursor = (months: readonly string[], onOpen: (month: string) => void) => {
  const [chosen, setChosen] = useState<string | null>(null);
  // A month that the scope no longer holds is no longer read.
  const active = chosen !== null && months.includes(chosen) ? chosen : null;
  // What a mouse has brought up must go away by Escape too, wherever the keyboard stands (WCAG 1.4.13).
  useEffect(() => {
    if (active === null) return undefined;
    const letGo = (event: globalThis.KeyboardEvent) => {
      if (event.key === 'Escape' && !event.defaultPrevented) setChosen(null);
    };
    document.addEventListener('keydown', letGo);
    return () => document.removeEventListener('keydown', letGo);
  }, [active]);
  const last = months.length - 1;
  const at = active === null ? last : months.indexOf(active);
  const moves: Record<string, number | undefined> = {
    ArrowLeft: active === null ? last : at - 1,
    ArrowDown: active === null ? last : at - 1,
    ArrowRight: active === null ? last : at + 1,
    ArrowUp: active === null ? last : at + 1,
    PageDown: at - 12,
    PageUp: at + 12,
    Home: 0,
    End: last,
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const move = moves[event.key];
    if (move !== undefined) setChosen(months[Math.max(0, Math.min(last, move))] ?? null);
    else if (event.key === 'Enter' && active) onOpen(active);
    else if (event.key === 'Escape' && active) setChosen(null);
    else return;
    event.preventDefault();
  };
  return { active, index: at, setActive: setChosen, onKeyDown };
};
