'use client';

import dynamic from 'next/dynamic';
import { useApplianceLeaks } from '@/analytics/leak-rate/hook';
import { lastRateSentence, METHOD_MEANINGS } from '@/analytics/leak-rate/sentence';
import { suspicionSentence } from '@/analytics/leak-suspicion/sentence';
import type { Visit } from '@/analytics/visits/contract';
import { useWidth } from '@/components/charts/use-width';
import { Sheet } from '@/components/ui/sheet';
import { Failed, Loading } from '@/components/ui/states';
import { formatPercent } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { LEAK_RATE_METHOD_NAMES } from '@/lib/wording';
import { AdditionsSheet } from './additions-sheet';
import { ChronicNote } from './chronic-note';
import { RateTable } from './rate-table';
import { RulesList } from './rules-list';

const HEIGHT = 318;

const UnitTimeline = dynamic(() => import('./unit-timeline').then((module) => module.UnitTimeline), {
  ssr: false,
  loading: () => <Loading label="Drawing the chart" minHeight={HEIGHT} />,
});

type ApplianceLeaksProps = { applianceId: string; name: string; visits: readonly Visit[]; unit: DisplayUnit };

/** Whether a unit leaks: what its visits say, what its additions make of it by the rules, and the additions themselves. */
export const ApplianceLeaksSheets = ({ applianceId, name, visits, unit }: ApplianceLeaksProps) => {
  const { data: leaks, error, refetch } = useApplianceLeaks(applianceId);
  const [measured, width] = useWidth();
  if (error && !leaks) return <Failed error={error} onRetry={() => refetch()} />;
  if (!leaks) return <Loading label="Looking at leaks" minHeight={420} />;
  const { method, methodUsed, events, suspicion } = leaks;
  return (
    <>
      <Sheet
        title="Does it leak?"
        aside="ringed: came short of charge; hollow: no leak; triangle: leaks tested as repaired"
      >
        <p className="max-w-prose text-lg">{suspicionSentence(suspicion)}</p>
        <p className="mt-1 max-w-prose text-sm text-ink-2">
          From recoveries of the last 36 months against jobs like them. A reason to look for a leak, not a finding, and
          nothing against whoever did the job.
        </p>
        {visits.length || events.length ? (
          <figure ref={measured} className="m-0 mt-4 min-w-0 overflow-hidden" style={{ minHeight: HEIGHT }}>
            {width > 0 ? <UnitTimeline leaks={leaks} visits={visits} unit={unit} width={width} /> : null}
          </figure>
        ) : null}
      </Sheet>
      <Sheet
        title="Leak rate"
        aside={`${LEAK_RATE_METHOD_NAMES[methodUsed]}${method.method ? '' : ', until one is chosen for the site'}`}
      >
        <p className="max-w-prose text-lg">{lastRateSentence(leaks, unit)}</p>
        <ChronicNote years={leaks.years} unit={unit} />
        <p className="mt-1 mb-3 max-w-prose text-sm text-ink-2">
          {METHOD_MEANINGS[methodUsed]} 40 CFR 82.152. The range is twice the uncertainty to either side: the scale’s
          last digit for what was added, {formatPercent(0.05)} for the full charge.
        </p>
        {events.length ? <RateTable label={`Leak rates of ${name}`} events={events} unit={unit} /> : null}
        {leaks.rules.length ? <RulesList leaks={leaks} unit={unit} /> : null}
      </Sheet>
      <AdditionsSheet leaks={leaks} unit={unit} />
    </>
  );
};
