'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { FunnelFigure } from '@/components/charts/funnel-figure';
import { Sheet } from '@/components/ui/sheet';
import { formatCount, formatPoints } from '@/lib/format';
import { crewLimits, crewPoints } from './crew-funnel';

type CrewSheetProps = {
  rows: readonly TechnicianRow[];
  /** How much sound technicians differ beyond luck, as a standard deviation in points. */
  normalSpread: number;
  /** Under five technicians nobody knows how sound people differ. */
  spreadKnown: boolean;
  /** Records or decisions have changed since the comparison was made. */
  outdated: boolean;
};

/** The crew against like jobs: who lies outside of what luck and the usual differences explain. */
export const CrewSheet = ({ rows, normalSpread, spreadKnown, outdated }: CrewSheetProps) => {
  const router = useRouter();
  const points = useMemo(() => crewPoints(rows), [rows]);
  const limits = useMemo(() => crewLimits(rows, normalSpread), [rows, normalSpread]);
  const wordsOf = (key: string) => rows.find(({ technicianId }) => technicianId === key)?.why ?? '';
  return (
    <Sheet title="Against like jobs of colleagues" aside="points of nameplate; the middle is as much as they recover">
      {points.length ? (
        <FunnelFigure
          label="Technicians against like jobs of colleagues"
          points={points}
          limits={limits}
          amountLabel="jobs to judge by"
          valueLabel="points of nameplate"
          formatAmount={(jobs) => formatCount(Math.round(jobs))}
          formatValue={(value) => formatPoints(value, Number.isInteger(value) ? 0 : 1)}
          wordsOf={wordsOf}
          onOpen={(key) => router.push(`/technicians/${key}`)}
          verbsOf={(key) => (
            <Link href={`/technicians/${key}`} className="link whitespace-nowrap print:hidden">
              Open the page
            </Link>
          )}
          hint="Each dot is a technician: the more jobs, the farther to the right and the surer. Between the lines lies what luck and the usual differences explain. Point at a dot, or use the arrow keys and Enter."
        />
      ) : (
        <p className="max-w-prose text-ink-2">
          Nobody has done enough jobs that colleagues did too. Something is said of a technician from 20 such jobs on.
        </p>
      )}
      {points.length && !spreadKnown ? (
        <p className="mt-2 max-w-prose text-sm text-ink-2">
          With fewer than five technicians it is not known how much sound people differ, so nobody is called below or
          above.
        </p>
      ) : null}
      {outdated ? (
        <p className="mt-2 max-w-prose text-sm text-ink-2" role="status">
          Something was changed a moment ago. Masses and yields have it already; the comparison is being made anew.
        </p>
      ) : null}
    </Sheet>
  );
};
