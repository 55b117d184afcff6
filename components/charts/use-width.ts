'use client';

import { useCallback, useState } from 'react';

/** The width of an element in whole pixels, kept up with; 0 until it has been measured. */
export const useWidth = (): [ref: (element: HTMLElement | null) => (() => void) | undefined, width: number] => {
  const [width, setWidth] = useState(0);
  const ref = useCallback((element: HTMLElement | null) => {
    if (!element) return undefined;
    const measure = () => setWidth(Math.floor(element.clientWidth));
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
};
