'use client';

import { useCallback, useEffect, useState } from 'react';

/** How far before the window's edge something counts as seen, so that it is there when it is scrolled to. */
const AHEAD = '300px';

/** Whether an element has come near the window once; on paper everything is seen. */
export const useSeen = (): [ref: (element: HTMLElement | null) => (() => void) | undefined, seen: boolean] => {
  const [seen, setSeen] = useState(false);
  useEffect(() => {
    const show = () => setSeen(true);
    window.addEventListener('beforeprint', show);
    return () => window.removeEventListener('beforeprint', show);
  }, []);
  const ref = useCallback((element: HTMLElement | null) => {
    if (!element) return undefined;
    const observer = new IntersectionObserver(
      (entries) => entries.some((entry) => entry.isIntersecting) && setSeen(true),
      {
        rootMargin: AHEAD,
      },
    );
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, seen];
};
