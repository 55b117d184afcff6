'use client';

import { spreadLabels } from './end-labels';
import type { ChartLayer, ChartMonth } from './layer';
import { useBand } from './use-band';

const LINE = 18;

/** Names of the layers beside the last bar, each at its own height: no legend to go back and forth to. */
export const StackLabels = ({ layers, last }: { layers: readonly ChartLayer[]; last: ChartMonth }) => {
  const band = useBand();
  if (!band) return null;
  let below = 0;
  const wishes = layers.map(({ id }) => {
    const value = last.values[id] ?? 0;
    const y = band.yOf(below + value / 2);
    below += value;
    return { id, y };
  });
  const places = new Map(spreadLabels(wishes, LINE, band.top + 4, band.bottom - 4).map(({ id, y }) => [id, y]));
  return (
    <g>
      {layers.map(({ id, name, colour }) => {
        const y = places.get(id) ?? band.bottom;
        return (
          <g key={id} transform={`translate(${band.right + 8} ${y})`}>
            <rect width={9} height={9} y={-4.5} fill={colour} />
            <text x={14} dominantBaseline="central" fontSize={13.5} fill="var(--ink)">
              {name.length > 15 ? `${name.slice(0, 14)}…` : name}
              {name.length > 15 ? <title>{name}</title> : null}
            </text>
          </g>
        );
      })}
    </g>
  );
};
