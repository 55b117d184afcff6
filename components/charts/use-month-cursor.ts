'use client';

import { type KeyboardEvent, useState } from 'react';

/** Which month is being read, and the keys that move it: one tab stop for the whole chart. */
export const useMonthCursor = (months: readonly string[], onOpen: (month: string) => void) => {
  const [chosen, setChosen] = useState<string | null>(null);
  // A month that the scope no longer holds is no longer read.
  const active = chosen !== null && months.includes(chosen) ? chosen : null;
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
