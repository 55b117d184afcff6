import { scaleLinear } from '@visx/scale';
import { formatPercent } from '@/lib/format';

const WIDTH = 220;
const HEIGHT = 30;
const MIDDLE = 15;
const SIDE = 6;

/** Shares of full charge. */
type YieldStripProps = {
  yield: number;
  lowerQuartile: number;
  medianYield: number;
  upperQuartile: number;
  lowerFence: number;
};

/**
 * Where a pull lies among like jobs, on a scale from nothing to the full charge: the box holds the middle half, its line
 * the median, the dashes stand at the lower fence, the dot is this pull.
 */
export const YieldStrip = (pull: YieldStripProps) => {
  const { lowerQuartile, medianYield, upperQuartile, lowerFence } = pull;
  const x = scaleLinear<number>({ domain: [0, Math.max(1, upperQuartile)], range: [SIDE, WIDTH - SIDE] });
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={`Yield ${formatPercent(pull.yield)}; half of the like jobs lie between ${formatPercent(lowerQuartile)} and ${formatPercent(upperQuartile)}, the lower fence at ${formatPercent(lowerFence)}`}
      className="block h-auto w-full max-w-[220px]"
    >
      <line x1={x(0)} x2={x(1)} y1={MIDDLE} y2={MIDDLE} stroke="var(--rule)" />
      <line x1={x(0)} x2={x(0)} y1={MIDDLE - 4} y2={MIDDLE + 4} stroke="var(--edge)" />
      <line x1={x(1)} x2={x(1)} y1={MIDDLE - 4} y2={MIDDLE + 4} stroke="var(--edge)" />
      <rect
        x={x(lowerQuartile)}
        width={Math.max(1.5, x(upperQuartile) - x(lowerQuartile))}
        y={MIDDLE - 8}
        height={16}
        fill="var(--act-weak)"
        stroke="var(--edge)"
      />
      <line
        x1={x(medianYield)}
        x2={x(medianYield)}
        y1={MIDDLE - 8}
        y2={MIDDLE + 8}
        stroke="var(--ink)"
        strokeWidth={2}
      />
      <line
        x1={x(lowerFence)}
        x2={x(lowerFence)}
        y1={MIDDLE - 10}
        y2={MIDDLE + 10}
        stroke="var(--ink-2)"
        strokeDasharray="3 2.5"
      />
      <circle
        cx={x(Math.min(pull.yield, 1))}
        cy={MIDDLE}
        r={5}
        fill="var(--flag)"
        stroke="var(--sheet)"
        strokeWidth={1.5}
      />
    </svg>
  );
};
