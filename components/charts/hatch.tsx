import type { ChartLayer } from './layer';

/** The id of a layer's hatched fill inside one chart. */
export const hatchId = (chartId: string, layerId: string): string => `${chartId}-hatch-${layerId}`;

/** Hatched fills, one a layer, for what is not finished yet. */
export const Hatches = ({ chartId, layers }: { chartId: string; layers: readonly ChartLayer[] }) => (
  <defs>
    {layers.map(({ id, colour }) => (
      <pattern
        key={id}
        id={hatchId(chartId, id)}
        width={6}
        height={6}
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <rect width={6} height={6} fill="var(--sheet)" />
        <rect width={3} height={6} fill={colour} />
      </pattern>
    ))}
  </defs>
);
