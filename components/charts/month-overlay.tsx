'use client';

import type { ChartMonth } from './layer';
import { useBand } from './use-band';

type MonthOverlayProps = {
  months: readonly ChartMonth[];
  active: string | null;
  onPoint: (month: string | null) => void;
};

/** The line of the year before, the month being read, and what catches the pointer. */
export const MonthOverlay = ({ months, active, onPoint }: MonthOverlayProps) => {
  const band = useBand();
  if (!band) return null;
  const { width, step, top, bottom, yOf } = band;
  const beyond = Math.min(3, (step - width) / 2);
  const steps = months.map(({ month, yearBefore }, index) => {
    if (yearBefore === null) return '';
    const joined = (months[index - 1]?.yearBefore ?? null) !== null;
    const x = band.xOf(month);
    return `${joined ? 'L' : 'M'}${x - beyond} ${yOf(yearBefore)}H${x + width + beyond}`;
  });
  const line = steps.join('');
  return (
    <g>
      <path d={line} fill="none" stroke="var(--sheet)" strokeWidth={4} />
      <path d={line} fill="none" stroke="var(--ink)" strokeWidth={1.5} />
      {months.map(({ month }) => (
        <rect
          key={month}
          x={band.xOf(month) - (step - width) / 2}
          width={step}
          y={top}
          height={bottom - top}
          fill={month === active ? 'var(--ink)' : 'transparent'}
          fillOpacity={month === active ? 0.08 : 0}
          onPointerEnter={() => onPoint(month)}
          onPointerDown={() => onPoint(month)}
        />
      ))}
    </g>
  );
};
