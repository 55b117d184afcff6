import { useEffect } from 'react';
import { useKeysWanted } from '@/components/shell/use-keys-wanted';

type FlagKeys = { next: () => void; previous: () => void; decide: () => void };

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest('input, textarea, select, [contenteditable="true"]') !== null;

/** `j` and `k` go through the records, `d` decides; never while somebody types or answers a dialog. */
export const useFlagKeys = ({ next, previous, decide }: FlagKeys): void => {
  const [wanted] = useKeysWanted();
  useEffect(() => {
    if (!wanted) return undefined;
    const does: Record<string, () => void> = { j: next, k: previous, d: decide };
    const onKeyDown = (event: KeyboardEvent) => {
      const doIt = does[event.key];
      if (!doIt || event.defaultPrevented || event.altKey || event.ctrlKey || event.metaKey) return;
      if (isTyping(event.target) || document.querySelector('[role="dialog"]')) return;
      event.preventDefault();
      doIt();
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [wanted, next, previous, decide]);
};
