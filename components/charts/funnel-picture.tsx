'use client';

import { spreadLabels } from './end-labels';
import { type FunnelLimit, type FunnelPoint, funnelScales, limitPath } from './funnel';

type FunnelPictureProps = {
  points: readonly FunnelPoint[];
  limits: readonly FunnelLimit[];
  /** What stands along the axes, and how their values are written. */
  amountLabel: string;
  valueLabel: string;
  formatAmount: (amount: number) => string;
  formatValue: (value: number) => string;
  width: number;
  height: number;
  narrow: boolean;
  active: string | null;
  onPoint: (key: string | null) => void;
};

const RADIUS = 5.5;
// A dot is small; what catches a finger is not.
const CATCH = 16;
const LINE = 17;
// A name stands to the left of its dot where it would leave the picture on the right, or cover another named dot.
const ROOM_FOR_NAME = 130;
const DASHES = ['', '5 4'];

/** Points inside and outside of two pairs of limits that narrow to the right. */
export const FunnelPicture = (props: FunnelPictureProps) => {
  const { points, limits, width, height, narrow, active, onPoint, formatAmount, formatValue } = props;
  const margin = { top: 26, right: narrow ? 8 : 130, bottom: 42, left: 46 };
  const scales = funnelScales(points, limits, { width, height, margin });
  const { x, y } = scales;
  const [left, right] = [margin.left, width - margin.right];
  const named = points.filter((point) => point.isMarked || point.key === active);
  const labels = spreadLabels(
    named.map(({ key, value }) => ({ id: key, y: y(value) })),
    LINE,
    margin.top,
    height - margin.bottom,
  );
  const covers = (point: FunnelPoint, side: 1 | -1): boolean =>
    named.some(({ key, amount, value }) => {
      const away = side * (x(amount) - x(point.amount));
      return key !== point.key && away >= 0 && away < ROOM_FOR_NAME && Math.abs(y(value) - y(point.value)) < LINE;
    });
  const read = points.find(({ key }) => key === active);
  return (
    <svg width={width} height={height} aria-hidden="true">
      <g fontFamily="var(--font-reading)" fontSize={13} fill="var(--ink-2)">
        {y.ticks(6).map((value) => (
          <g key={value}>
            <line x1={left} x2={right} y1={y(value)} y2={y(value)} stroke="var(--rule-2)" />
            <text x={left - 8} y={y(value)} dy="0.34em" textAnchor="end">
              {formatValue(value)}
            </text>
          </g>
        ))}
        {x.ticks(narrow ? 4 : 7).map((amount) => (
          <text key={amount} x={x(amount)} y={height - margin.bottom + 18} textAnchor="middle">
            {formatAmount(amount)}
          </text>
        ))}
      </g>
      <g fontSize={13} fill="var(--ink-2)">
        <text x={0} y={12}>
          {props.valueLabel}
        </text>
        <text x={right} y={height - 6} textAnchor="end">
          {props.amountLabel}
        </text>
        {narrow
          ? null
          : limits.map(({ name, halfWidth }) => (
              <text key={name} x={right + 6} y={y(-halfWidth(scales.most * 1.04))} dy="0.34em" fontSize={12.5}>
                {name}
              </text>
            ))}
      </g>
      <line x1={left} x2={right} y1={y(0)} y2={y(0)} stroke="var(--ink)" strokeWidth={1.5} />
      {limits.flatMap((limit, at) =>
        ([1, -1] as const).map((sign) => (
          <path
            key={`${limit.name} ${sign}`}
            d={limitPath(limit, sign, scales)}
            fill="none"
            stroke="var(--edge)"
            strokeWidth={1.25}
            strokeDasharray={DASHES[at]}
          />
        )),
      )}
      {read ? (
        <line
          x1={x(read.amount)}
          x2={x(read.amount)}
          y1={y(read.low)}
          y2={y(read.high)}
          stroke="var(--ink)"
          strokeWidth={2}
        />
      ) : null}
      {points.map((point) => (
        <g
          key={point.key}
          transform={`translate(${x(point.amount)} ${y(point.value)})`}
          onPointerEnter={() => onPoint(point.key)}
          onPointerDown={() => onPoint(point.key)}
        >
          <circle r={CATCH} fill="transparent" />
          <circle
            r={point.key === active ? RADIUS + 2 : RADIUS}
            fill={point.isMarked ? 'var(--flag)' : 'var(--act)'}
            stroke="var(--sheet)"
            strokeWidth={1.5}
          />
          {/* The mark is told by more than its colour. */}
          {point.isMarked ? <circle r={RADIUS + 3.5} fill="none" stroke="var(--flag)" strokeWidth={1.5} /> : null}
        </g>
      ))}
      {narrow ? null : (
        <g fontSize={13.5} fontWeight={600} fill="var(--ink)" stroke="var(--sheet)" strokeWidth={4} paintOrder="stroke">
          {labels.map(({ id, y: at }) => {
            const point = points.find(({ key }) => key === id);
            if (!point) return null;
            const isLeft = x(point.amount) > right - ROOM_FOR_NAME || (covers(point, 1) && !covers(point, -1));
            const beside = CATCH * (isLeft ? -1 : 1);
            return (
              <text key={id} x={x(point.amount) + beside} y={at} dy="0.34em" textAnchor={isLeft ? 'end' : 'start'}>
                {point.name}
              </text>
            );
          })}
        </g>
      )}
    </svg>
  );
};
