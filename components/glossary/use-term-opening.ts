import { type PointerEvent, useEffect, useRef, useState } from 'react';

/** A mouse on its way elsewhere opens nothing; one on its way into the meaning does not lose it. */
const REST_MS = 350;
const LEAVE_MS = 250;

/** Whether a meaning is open, and by what: a press keeps it until it is put away, a resting mouse while it stays. */
export const useTermOpening = () => {
  const [openedBy, setOpenedBy] = useState<'press' | 'mouse' | null>(null);
  // Once it is put away nothing else tells any more what had opened it.
  const lastOpenedBy = useRef(openedBy);
  useEffect(() => {
    if (openedBy) lastOpenedBy.current = openedBy;
  }, [openedBy]);
  const timer = useRef<number | undefined>(undefined);
  useEffect(() => () => window.clearTimeout(timer.current), []);
  const after = (ms: number, act: () => void) => {
    window.clearTimeout(timer.current);
    timer.current = window.setTimeout(act, ms);
  };
  const isMouse = (event: PointerEvent) => event.pointerType === 'mouse';
  return {
    open: openedBy !== null,
    pressed: openedBy === 'press',
    wasPressed: () => lastOpenedBy.current === 'press',
    close: () => setOpenedBy(null),
    press: () => {
      window.clearTimeout(timer.current);
      setOpenedBy((by) => (by === 'press' ? null : 'press'));
    },
    rest: (event: PointerEvent) => {
      if (isMouse(event)) after(REST_MS, () => setOpenedBy((by) => by ?? 'mouse'));
    },
    leave: (event: PointerEvent) => {
      if (isMouse(event)) after(LEAVE_MS, () => setOpenedBy((by) => (by === 'mouse' ? null : by)));
    },
    stay: () => window.clearTimeout(timer.current),
  };
};
