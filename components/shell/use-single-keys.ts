import { useRouter } from 'next/navigation';
import { useEffect } from 'react';
import { useScreens } from './use-screens';

/** So long the second key of "g t" may take. */
const SECOND_KEY_MS = 1500;

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof Element &&
  target.closest('input, textarea, select, [contenteditable=""], [contenteditable="true"]') !== null;

const hasModifier = ({ altKey, ctrlKey, metaKey }: KeyboardEvent): boolean => altKey || ctrlKey || metaKey;

/** `?` asks for the sheet of keys, `g` and a screen's key lead there; never while somebody types or answers a dialog. */
export const useSingleKeys = (wanted: boolean, ask: () => void): void => {
  const router = useRouter();
  const screens = useScreens();
  useEffect(() => {
    if (!wanted) return undefined;
    let goSince = Number.NEGATIVE_INFINITY;
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || hasModifier(event) || isTyping(event.target)) return;
      if (document.querySelector('[role="dialog"]')) return;
      const going = event.timeStamp - goSince < SECOND_KEY_MS;
      goSince = Number.NEGATIVE_INFINITY;
      const screen = going ? screens.find(({ goKey }) => goKey === event.key) : undefined;
      if (screen) router.push(screen.href);
      else if (event.key === '?') ask();
      else if (event.key === 'g') goSince = event.timeStamp;
      if (screen || event.key === '?') event.preventDefault();
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [wanted, ask, router, screens]);
};
