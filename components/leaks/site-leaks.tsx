'use client';

import Link from 'next/link';
import type { SiteAppliance } from '@/analytics/leak-rate/contract';
import { useSiteLeaks } from '@/analytics/leak-rate/hook';
import { rateText, triggerText } from '@/analytics/leak-rate/sentence';
import { SUSPECTED_FROM } from '@/analytics/leak-suspicion/limits';
import { chanceText, siteSuspicionSentence } from '@/analytics/leak-suspicion/sentence';
import { Sheet } from '@/components/ui/sheet';
import { Failed, Loading } from '@/components/ui/states';
import { Table, Td, Th } from '@/components/ui/table';
import { formatDay, formatDesignation, formatMass, formatNumber } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import { MethodChoice } from './method-choice';

const LastRate = ({ lastRate }: Pick<SiteAppliance, 'lastRate'>) => {
  if (!lastRate) return '—';
  const against = triggerText(lastRate);
  return (
    <>
      {lastRate.above ? <span className="marked">{rateText(lastRate)}</span> : rateText(lastRate)}
      <span className="block text-xs text-ink-2">
        {formatDay(lastRate.addedOn)}
        {against ? `, ${against}` : ''}
      </span>
    </>
  );
};

const Row = ({ appliance: one, unit }: { appliance: SiteAppliance; unit: DisplayUnit }) => (
  <tr>
    <Th scope="row">
      <Link href={`/appliances/${one.applianceId}`} className="link">
        {formatDesignation(one.appliance)}
      </Link>
      {one.refrigerant ? <span className="block text-sm text-ink-2">{formatDesignation(one.refrigerant)}</span> : null}
    </Th>
    <Td numeric>{one.fullCharge === null ? '—' : formatMass(one.fullCharge, unit)}</Td>
    <Td numeric>
      {one.visits ? `${one.shortVisits} of ${one.visits}` : 'no visit'}
      {one.visits ? <span className="block text-xs text-ink-2">{formatNumber(one.expectedShort, 1)} usual</span> : null}
    </Td>
    <Td numeric>
      {one.leakSuspicion === null ? (
        'too few visits'
      ) : one.leakSuspicion >= SUSPECTED_FROM ? (
        <span className="marked">{chanceText(one.leakSuspicion)}</span>
      ) : (
        chanceText(one.leakSuspicion)
      )}
    </Td>
    <Td numeric>{one.additions}</Td>
    <Td numeric>
      <LastRate lastRate={one.lastRate} />
    </Td>
  </tr>
);

type SiteLeaksProps = { siteId: string; site: string; unit: DisplayUnit };

/** Which units of a site are suspected to leak, their last leak rates, and the method the site keeps to. */
export const SiteLeaksSheet = ({ siteId, site, unit }: SiteLeaksProps) => {
  const { data, error, refetch } = useSiteLeaks(siteId);
  if (error && !data) return <Failed error={error} onRetry={() => refetch()} />;
  if (!data) return <Loading label="Looking at leaks" minHeight={320} />;
  return (
    <Sheet title="Leaks" aside="most suspected first; marked: suspected, or above its trigger">
      <p className="max-w-prose text-lg">{siteSuspicionSentence(data.excess)}</p>
      <p className="mt-1 mb-3 max-w-prose text-sm text-ink-2">
        From recoveries of the last 36 months against jobs like them: a reason to look, not a finding. Rates rest on the
        additions written down here and on the full charge that most records state; the regulation and the authority
        decide.
      </p>
      {data.appliances.length ? (
        <Table label={`Leaks at ${site}`}>
          <thead>
            <tr>
              <Th>Appliance</Th>
              <Th numeric>Full charge, {unit}</Th>
              <Th numeric>Came short</Th>
              <Th numeric>Leaks with</Th>
              <Th numeric>Additions</Th>
              <Th numeric>Last leak rate (range)</Th>
            </tr>
          </thead>
          <tbody>
            {data.appliances.map((one) => (
              <Row key={one.applianceId} appliance={one} unit={unit} />
            ))}
          </tbody>
        </Table>
      ) : null}
      <MethodChoice siteId={siteId} method={data.method} />
    </Sheet>
  );
};
