'use client';

import { useCursor } from './use-cursor';

/** The cursor of a row of months: it begins with the newest and leaps a year. */
export const useMonthCursor = (months: readonly string[], onOpen: (month: string) => void) =>
  useCursor(months, onOpen, { begin: 'last', stride: 12 });
