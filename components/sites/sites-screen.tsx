'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { spreadNote } from '@/analytics/group-sentence';
import { onlyOf, scopeQuery } from '@/analytics/scope-address';
import type { SiteRow } from '@/analytics/sites/contract';
import { useSiteRecoveries } from '@/analytics/sites/hook';
import { LAST, LOW, MASS_COLUMNS, measured, RECOVERIES } from '@/components/grouped-figures/column';
import { type GroupedKind, GroupedScreen } from '@/components/grouped-figures/grouped-screen';
import { useScope } from '@/components/scope/use-scope';

const SITES: GroupedKind<SiteRow> = {
  screen: 'Sites',
  words: { one: 'site', many: 'sites', verb: 'gave' },
  label: 'Recoveries by site',
  title: 'The sites',
  order: 'by name',
  columns: [
    {
      id: 'site',
      label: 'Site',
      kind: 'text',
      heads: true,
      value: ({ site }) => site,
      draw: ({ siteId, site }) => (
        <Link href={`/sites/${siteId}`} className="link">
          {site}
        </Link>
      ),
    },
    RECOVERIES,
    LOW,
    {
      id: 'suspected',
      label: 'Suspected leaks',
      kind: 'count',
      value: ({ suspected }) => suspected,
      draw: ({ suspected, moreThanChance }) =>
        moreThanChance ? <span className="marked">{suspected}</span> : String(suspected ?? '—'),
    },
    measured<SiteRow>('appliances', 'Appliances'),
    ...MASS_COLUMNS,
    LAST,
  ],
  rowId: ({ siteId }) => siteId,
  ownScope: (scope, { site }) => onlyOf(scope, 'site', [site]),
  sub: (items) =>
    `${spreadNote(items, 'sites')} A low yield at a site may mean that its equipment leaks; its records show which unit.`.trim(),
  note: 'Far below counts recoveries whose yield lies far below like jobs: a reason to look, not a finding. Appliances are those with a recovery in this scope. Total yield is all recovered mass over all full charges; median yield is the middle one of the recoveries. Entry errors are left out.',
};

/** Where refrigerant was recovered, and how much of what the equipment held. */
export const SitesScreen = () => {
  const { scope } = useScope();
  const query = useMemo(() => scopeQuery(scope), [scope]);
  return <GroupedScreen kind={SITES} scope={scope} answer={useSiteRecoveries(query)} />;
};
