'use client';

import type { PlacedNote } from './note-lanes';
import { useBand } from './use-band';

/** Pixels that a lane of notes takes above the bars. */
export const NOTE_LANE = 20;
const SIZE = 16;

/** Numbered marks above the months that a note touches, with a line along them; the words stand in the list below. */
export const NoteMarks = ({ notes }: { notes: readonly PlacedNote[] }) => {
  const band = useBand();
  if (!band) return null;
  return (
    <g>
      {notes.map(({ id, no, first, last, lane }) => {
        const y = band.top - 6 - lane * NOTE_LANE;
        const [left, right] = [band.xOf(first), band.xOf(last) + band.width];
        const middle = (left + Math.min(right, left + band.width)) / 2;
        return (
          <g key={id}>
            <line x1={left} x2={right} y1={y + 3} y2={y + 3} stroke="var(--ink)" strokeWidth={1.5} />
            <rect x={middle - SIZE / 2} y={y - SIZE + 3} width={SIZE} height={SIZE} fill="var(--ink)" />
            <text
              x={middle}
              y={y - SIZE / 2 + 3}
              fill="var(--sheet)"
              fontSize={11.5}
              fontWeight={600}
              textAnchor="middle"
              dominantBaseline="central"
            >
              {no}
            </text>
          </g>
        );
      })}
    </g>
  );
};
