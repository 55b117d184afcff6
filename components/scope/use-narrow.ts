'use client';

import { useSyncExternalStore } from 'react';

const NARROW = '(max-width: 39.99rem)';

const subscribe = (changed: () => void) => {
  const query = window.matchMedia(NARROW);
  query.addEventListener('change', changed);
  return () => query.removeEventListener('change', changed);
};

/** Whether the window is as narrow as a phone; the server, which cannot know, says no. */
export const useNarrow = (): boolean =>
  useSyncExternalStore(
    subscribe,
    () => window.matchMedia(NARROW).matches,
    () => false,
  );
