'use client';

import Link from 'next/link';
import { EVERY_RECORD, onlyOf } from '@/analytics/scope-address';
import type { ApplianceHistory } from '@/analytics/visits/contract';
import { lowVisitsNote, nameplateChanges, nameplateNote, visitsAnswer } from '@/analytics/visits/sentence';
import { FigurePage } from '@/components/figures/figure-page';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { ApplianceLeaksSheets } from '@/components/leaks/appliance-leaks';
import { useScope } from '@/components/scope/use-scope';
import { choiceName } from '@/components/scope/wording';
import { PageHead } from '@/components/ui/page-head';
import { Empty } from '@/components/ui/states';
import { useMay } from '@/components/viewer-context';
import { formatDay, formatDesignation } from '@/lib/format';
import { VisitsSheet } from './visits-sheet';

/** One unit: what it gave over all its visits, and each of them. */
export const ApplianceScreen = ({ history }: { history: ApplianceHistory }) => {
  const { scope } = useScope();
  const { appliance, site, siteId, category, manufacturedOn, visits } = history;
  const { unit } = scope;
  const name = `${formatDesignation(appliance)} at ${site}`;
  const own = { ...onlyOf(onlyOf(EVERY_RECORD, 'site', [site]), 'appliance', [appliance]), unit };
  const mayReadLeaks = useMay('leaks:read');
  const changed = new Set(nameplateChanges(visits).map(({ visit }) => visit.recoveryId));
  return (
    <FigurePage>
      <p className="mb-3 text-sm text-ink-2">
        <Link href="/appliances" className="link print:hidden">
          All appliances
        </Link>{' '}
        <Link href={`/sites/${siteId}`} className="link ml-4">
          {site}
        </Link>
        <span className="ml-4">
          {choiceName('category', category)}
          {manufacturedOn ? `, made ${formatDay(manufacturedOn)}` : ''}
        </span>
      </p>
      <div className="flex flex-col gap-6">
        <PageHead
          title={<FigureSentence pieces={visitsAnswer(name, visits, unit)} scope={own} />}
          sub={[lowVisitsNote(visits), nameplateNote(visits, unit)].filter(Boolean).join(' ')}
        />
        {mayReadLeaks ? (
          <ApplianceLeaksSheets applianceId={history.applianceId} name={name} visits={visits} unit={unit} />
        ) : null}
        {visits.length ? (
          <VisitsSheet place={name} visits={visits} unit={unit} changed={changed} />
        ) : (
          <Empty title="No visit is recorded">A recovery from this unit will stand here once it is written down.</Empty>
        )}
      </div>
    </FigurePage>
  );
};
