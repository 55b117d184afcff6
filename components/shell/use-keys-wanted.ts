import { useEffect, useState } from 'react';

const PLACE = 'single keys';

/** Whether single keys do something in this browser; who speaks to the machine turns them off (WCAG 2.1.4). */
export const useKeysWanted = (): [wanted: boolean, want: (wanted: boolean) => void] => {
  const [wanted, setWanted] = useState(true);
  // Storage is the browser's: what it keeps is read after the server's first picture.
  useEffect(() => {
    try {
      setWanted(window.localStorage.getItem(PLACE) !== 'off');
    } catch {
      // A browser may refuse storage: the keys stay on.
    }
  }, []);
  const want = (next: boolean) => {
    setWanted(next);
    try {
      window.localStorage.setItem(PLACE, next ? 'on' : 'off');
    } catch {
      // Without storage the choice lives as long as the page.
    }
  };
  return [wanted, want];
};
