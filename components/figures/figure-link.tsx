'use client';

import Link from 'next/link';
import type { MouseEvent, ReactNode } from 'react';
import type { Figure, FigureScope } from '@/analytics/figures/figure';
import type { Measure } from '@/analytics/figures/measures';
import { useFigurePage } from './figure-page';

type FigureLinkProps = { measure: Measure; scope: FigureScope; className?: string; children: ReactNode };

const isPlain = (event: MouseEvent): boolean =>
  event.button === 0 && !event.metaKey && !event.ctrlKey && !event.shiftKey && !event.altKey;

/** A figure that opens: what it is made of, in a panel beside it. An address of its own, for a new tab or a colleague. */
export const FigureLink = ({ measure, scope, className = 'figure-link', children }: FigureLinkProps) => {
  const { hrefOf, open } = useFigurePage();
  const figure: Figure = { measure, scope };
  return (
    <Link
      href={hrefOf(figure)}
      prefetch={false}
      scroll={false}
      className={className}
      onClick={(event) => {
        if (!isPlain(event)) return;
        event.preventDefault();
        open(figure);
      }}
    >
      {children}
    </Link>
  );
};
