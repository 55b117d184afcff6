'use client';

import { useCallback, useState } from 'react';
import { flushSync } from 'react-dom';

/** CSS pixels between the margins of a page, of A4 and Letter the narrower. */
const PAGE = 680;
const HALF_PAGE = PAGE / 2 - 20;

/** What takes the better part of a screen gets the whole width of a page, a smaller picture half of it. */
const printedWidth = (width: number): number => Math.min(width, width > HALF_PAGE * 1.25 ? PAGE : HALF_PAGE);

/** The width of an element in whole pixels, kept up with, and that of a page while it is printed; 0 until measured. */
export const useWidth = (): [ref: (element: HTMLElement | null) => (() => void) | undefined, width: number] => {
  const [width, setWidth] = useState(0);
  const ref = useCallback((element: HTMLElement | null) => {
    if (!element) return undefined;
    const measure = () => setWidth(Math.floor(element.clientWidth));
    // Paper is taken as the page stands when this is over: nothing may wait.
    const fitPage = () => flushSync(() => setWidth(printedWidth(Math.floor(element.clientWidth))));
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    window.addEventListener('beforeprint', fitPage);
    window.addEventListener('afterprint', measure);
    return () => {
      observer.disconnect();
      window.removeEventListener('beforeprint', fitPage);
      window.removeEventListener('afterprint', measure);
    };
  }, []);
  return [ref, width];
};
