'use client';

import dynamic from 'next/dynamic';
import { usePathname, useSearchParams } from 'next/navigation';
import { createContext, type ReactNode, useContext, useMemo, useRef, useState } from 'react';
import { type Figure, figureOfAddress, figureParams, isFigureKey } from '@/analytics/figures/figure';
import { EVERY_RECORD } from '@/analytics/scope-address';
import { useScope } from '@/components/scope/use-scope';

// Comes with the first figure that is opened.
const FigurePanel = dynamic(() => import('./figure-panel').then((module) => module.FigurePanel), { ssr: false });

type FigurePageState = {
  /** The address of this screen with the figure open. */
  hrefOf: (figure: Figure) => string;
  open: (figure: Figure) => void;
};

/** Outside of a screen with a scope a figure's address stands by itself. */
const ALONE: FigurePageState = {
  hrefOf: (figure) => `?${new URLSearchParams(figureParams(figure, EVERY_RECORD))}`,
  open: () => undefined,
};

const FigurePageContext = createContext(ALONE);

/** How figures of this screen are opened. */
export const useFigurePage = (): FigurePageState => useContext(FigurePageContext);

const addressOf = (pathname: string, params: [string, string][]): string =>
  params.length ? `${pathname}?${new URLSearchParams(params)}` : pathname;

/**
 * A screen whose figures open. Which one is open stands in the address: Back closes it, and a link shows it to a
 * colleague. The address changes without asking the server for the screen again.
 */
export const FigurePage = ({ children }: { children: ReactNode }) => {
  const { scope } = useScope();
  const pathname = usePathname();
  const search = useSearchParams();
  // Whether the step before this one in the history is the same screen without the figure.
  const openedHere = useRef(false);
  const figure = useMemo(() => figureOfAddress(new URLSearchParams(search), scope), [search, scope]);
  const [wanted, setWanted] = useState(false);
  if (figure && !wanted) setWanted(true);
  const state = useMemo<FigurePageState>(() => {
    const kept = [...search.entries()].filter(([key]) => !isFigureKey(key));
    const hrefOf = (next: Figure) => addressOf(pathname, [...kept, ...figureParams(next, scope)]);
    return {
      hrefOf,
      open: (next) => {
        openedHere.current = true;
        window.history.pushState(null, '', hrefOf(next));
      },
    };
  }, [pathname, search, scope]);
  const close = () => {
    if (openedHere.current) {
      openedHere.current = false;
      window.history.back();
    } else {
      const kept = [...search.entries()].filter(([key]) => !isFigureKey(key));
      window.history.replaceState(null, '', addressOf(pathname, kept));
    }
  };
  return (
    <FigurePageContext value={state}>
      {children}
      {wanted ? <FigurePanel figure={figure} unit={scope.unit} onClose={close} /> : null}
    </FigurePageContext>
  );
};
