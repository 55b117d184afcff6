import { scaleLinear } from '@visx/scale';
import { effectWords, type Ranged } from './wording';

const WIDTH = 168;
const HEIGHT = 22;
const MIDDLE = 11;
const SIDE = 5;

type EffectRangeProps = {
  effect: Ranged;
  /** The farthest end of any range beside which this one stands, in points: one scale for all of them. */
  reach: number;
  isMarked: boolean;
};

/** How far from colleagues' like jobs, with its likely range, on a line whose middle is "as much as they". */
export const EffectRange = ({ effect, reach, isMarked }: EffectRangeProps) => {
  const x = scaleLinear<number>({ domain: [-reach, reach], range: [SIDE, WIDTH - SIDE], clamp: true });
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={effectWords(effect)}
      className="block h-auto w-[168px] max-w-full"
    >
      <line x1={x(0)} x2={x(0)} y1={1} y2={HEIGHT - 1} stroke="var(--edge)" />
      <line x1={x(effect.low)} x2={x(effect.high)} y1={MIDDLE} y2={MIDDLE} stroke="var(--ink)" strokeWidth={2} />
      <circle
        cx={x(effect.value)}
        cy={MIDDLE}
        r={4.5}
        fill={isMarked ? 'var(--flag)' : 'var(--act)'}
        stroke="var(--sheet)"
        strokeWidth={1.5}
      />
    </svg>
  );
};
