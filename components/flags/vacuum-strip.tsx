import { scaleLinear } from '@visx/scale';
import type { Flag } from '@/analytics/flags/contract';
import { formatNumber } from '@/lib/format';
import { KPA, kpaAbsToVacuum } from '@/lib/units';

const WIDTH = 220;
const HEIGHT = 30;
const MIDDLE = 15;
const SIDE = 6;

const inHg = (kpaAbs: number): number => Math.max(0, kpaAbsToVacuum(kpaAbs, 'inhg'));

/**
 * Where a final vacuum lies among like jobs, from none on the left to a perfect one on the right: the box is what is
 * usual, one robust standard deviation to either side of the median, the dot is this pull.
 */
export const VacuumStrip = ({ kpaAbs, usualKpaAbs, spreadKpa }: NonNullable<Flag['vacuum']>) => {
  const deepest = kpaAbsToVacuum(0, 'inhg');
  const x = scaleLinear<number>({ domain: [0, deepest], range: [SIDE, WIDTH - SIDE], clamp: true });
  const spread = spreadKpa / KPA.inHg;
  const [own, usual] = [inHg(kpaAbs), inHg(usualKpaAbs)];
  const [from, to] = [x(usual - spread), x(usual + spread)];
  return (
    <figure>
      <svg
        viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
        role="img"
        aria-label={`Final vacuum ${formatNumber(own, 1)} inHg; like jobs usually reach ${formatNumber(usual, 1)} inHg`}
        className="block h-auto w-full max-w-[220px]"
      >
        <line x1={x(0)} x2={x(deepest)} y1={MIDDLE} y2={MIDDLE} stroke="var(--rule)" />
        <line x1={x(0)} x2={x(0)} y1={MIDDLE - 4} y2={MIDDLE + 4} stroke="var(--edge)" />
        <line x1={x(deepest)} x2={x(deepest)} y1={MIDDLE - 4} y2={MIDDLE + 4} stroke="var(--edge)" />
        <rect
          x={from}
          width={Math.max(1.5, to - from)}
          y={MIDDLE - 8}
          height={16}
          fill="var(--act-weak)"
          stroke="var(--edge)"
        />
        <line x1={x(usual)} x2={x(usual)} y1={MIDDLE - 8} y2={MIDDLE + 8} stroke="var(--ink)" strokeWidth={2} />
        <circle cx={x(own)} cy={MIDDLE} r={5} fill="var(--flag)" stroke="var(--sheet)" strokeWidth={1.5} />
      </svg>
      <figcaption className="text-xs text-ink-2">
        vacuum {formatNumber(own, 1)} inHg, usually {formatNumber(usual, 1)}
      </figcaption>
    </figure>
  );
};
