import type { ReactNode } from 'react';
import type { TechnicianPerson } from '@/analytics/technician-person/contract';
import { formatCount, formatDay, formatMassWithUnit, formatPercent, formatPoints, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { effectWords, type Ranged } from '../wording';

type Judgement = NonNullable<TechnicianPerson['judgement']>;
type Line = { name: string; words: ReactNode };

const ranged = ({ value, low, high }: Ranged): string =>
  `${formatPoints(value)} points, likely range ${formatPoints(low)} to ${formatPoints(high)}`;

const leftOutWords = ({ firstJobs, scaleInDoubt, shortOnArrival, beforeChange }: Judgement['leftOut']): string => {
  const parts = [
    firstJobs ? `${plural(firstJobs, 'first job', 'first jobs')} of a newcomer` : '',
    shortOnArrival ? `${plural(shortOnArrival, 'unit', 'units')} known to have come short` : '',
    scaleInDoubt ? `${plural(scaleInDoubt, 'job', 'jobs')} on a scale in doubt` : '',
    beforeChange ? `${plural(beforeChange, 'job', 'jobs')} from before the work changed` : '',
  ].filter(Boolean);
  return parts.join(', ');
};

const linesOf = (own: Judgement, unit: DisplayUnit): Line[] => {
  const lines: (Line | null)[] = [
    own.plainEffect ? { name: 'All jobs as they are', words: effectWords(own.plainEffect) } : null,
    own.shrunkEffect ? { name: 'Drawn towards the crew', words: ranged(own.shrunkEffect) } : null,
    {
      name: 'Mass',
      words: `${formatMassWithUnit(own.observedMass, unit)} came, ${formatMassWithUnit(own.expectedMass, unit)} would have been expected; a few large systems decide these, so they judge nobody`,
    },
    own.earlyStops
      ? {
          name: 'Look stopped early',
          words: `about ${formatCount(Math.round(own.earlyStops.found))} of ${formatCount(Math.round(own.earlyStops.of))} pulls (${formatPercent(own.earlyStops.share)}); usual is ${formatPercent(own.earlyStops.usualShare)}`,
        }
      : null,
    own.trend ? { name: 'A year brings', words: ranged(own.trend) } : null,
    own.learning
      ? { name: 'Since the first 40 jobs', words: ranged({ ...own.learning, value: own.learning.gain }) }
      : null,
    own.run
      ? { name: 'A run', words: `jobs lie ${own.run.side} what is expected since ${formatDay(own.run.from)}` }
      : null,
    leftOutWords(own.leftOut) ? { name: 'Left out', words: leftOutWords(own.leftOut) } : null,
  ];
  return lines.filter((line) => line !== null);
};

/** What the verdict stands on, line by line. */
export const EvidenceList = ({ judgement, unit }: { judgement: Judgement; unit: DisplayUnit }) => (
  <dl className="grid gap-x-6 gap-y-2 tabular-nums sm:grid-cols-[13rem_minmax(0,1fr)]">
    {linesOf(judgement, unit).map(({ name, words }) => (
      <div key={name} className="contents">
        <dt className="font-medium">{name}</dt>
        <dd className="max-w-prose text-ink-2 max-sm:mb-1.5">{words}</dd>
      </div>
    ))}
  </dl>
);
