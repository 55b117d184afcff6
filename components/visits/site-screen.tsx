'use client';

import { clsx } from 'clsx';
import Link from 'next/link';
import { useMemo } from 'react';
import { useApplianceRecoveries } from '@/analytics/appliances/hook';
import { EVERY_RECORD, onlyOf, scopeQuery } from '@/analytics/scope-address';
import type { SiteHistory } from '@/analytics/visits/contract';
import { lowVisitsNote, visitsAnswer } from '@/analytics/visits/sentence';
import { APPLIANCE_COLUMNS, applianceId, ownApplianceScope } from '@/components/appliances/appliance-columns';
import { FigurePage } from '@/components/figures/figure-page';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { FileButtons } from '@/components/files/file-buttons';
import { groupedFile } from '@/components/grouped-figures/grouped-file';
import { GroupedTable } from '@/components/grouped-figures/grouped-table';
import { SiteLeaksSheet } from '@/components/leaks/site-leaks';
import { useScope } from '@/components/scope/use-scope';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { Empty, Failed, Loading } from '@/components/ui/states';
import { useMay } from '@/components/viewer-context';
import { VisitsSheet } from './visits-sheet';

/** One site: what it gave over the whole time, its units, and each visit. */
export const SiteScreen = ({ history: { siteId, site, address, visits } }: { history: SiteHistory }) => {
  const { scope } = useScope();
  const { unit } = scope;
  const own = useMemo(() => ({ ...onlyOf(EVERY_RECORD, 'site', [site]), unit }), [site, unit]);
  const query = useMemo(() => scopeQuery(own), [own]);
  const { data, error, isPlaceholderData, refetch } = useApplianceRecoveries(query);
  const mayReadLeaks = useMay('leaks:read');
  const label = `Appliances at ${site}`;
  return (
    <FigurePage>
      <p className="mb-3 text-sm text-ink-2">
        <Link href="/sites" className="link print:hidden">
          All sites
        </Link>
        {address ? <span className="ml-4">{address}</span> : null}
      </p>
      <div className="flex flex-col gap-6">
        <PageHead
          title={<FigureSentence pieces={visitsAnswer(site, visits, unit)} scope={own} />}
          sub={lowVisitsNote(visits)}
        />
        {visits.length ? (
          <>
            <Sheet
              title="Its appliances"
              aside={
                <>
                  by name<span className="print:hidden">; a heading puts them in another order</span>
                </>
              }
              tools={
                data ? <FileButtons makeTable={() => groupedFile(label, APPLIANCE_COLUMNS, data.items, own)} /> : null
              }
            >
              {data ? (
                <div
                  aria-busy={isPlaceholderData}
                  className={clsx('transition-opacity', isPlaceholderData && 'opacity-50')}
                >
                  <GroupedTable
                    label={label}
                    columns={APPLIANCE_COLUMNS}
                    items={data.items}
                    rowId={applianceId}
                    ownScope={ownApplianceScope}
                    scope={own}
                  />
                </div>
              ) : error ? (
                <Failed error={error} onRetry={() => refetch()} />
              ) : (
                <Loading minHeight={240} />
              )}
            </Sheet>
            {mayReadLeaks ? <SiteLeaksSheet siteId={siteId} site={site} unit={unit} /> : null}
            <VisitsSheet place={site} visits={visits} unit={unit} withAppliance />
          </>
        ) : (
          <Empty title="No visit is recorded">A recovery at this site will stand here once it is written down.</Empty>
        )}
      </div>
    </FigurePage>
  );
};
