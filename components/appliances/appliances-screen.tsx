'use client';

import { useMemo } from 'react';
import type { ApplianceRow } from '@/analytics/appliances/contract';
import { useApplianceRecoveries } from '@/analytics/appliances/hook';
import { lowAgainNote, mostLowFirst } from '@/analytics/appliances/low-again';
import { scopeQuery } from '@/analytics/scope-address';
import { type GroupedKind, GroupedScreen } from '@/components/grouped-figures/grouped-screen';
import { useScope } from '@/components/scope/use-scope';
import { APPLIANCE_COLUMNS, applianceId, ownApplianceScope } from './appliance-columns';

const APPLIANCES: GroupedKind<ApplianceRow> = {
  screen: 'Appliances',
  words: { one: 'appliance', many: 'appliances', verb: 'gave' },
  label: 'Recoveries by appliance',
  title: 'The appliances',
  order: 'most often far below first',
  columns: APPLIANCE_COLUMNS,
  rowId: applianceId,
  ownScope: ownApplianceScope,
  sub: (items) =>
    `${lowAgainNote(items)} A unit that comes back low may leak, or its nameplate may be wrong; its history shows which.`,
  note: 'Far below counts recoveries whose yield lies far below like jobs: a reason to look, not a finding. “Unit holds” is the full charge, refrigerant and category those of the last recovery in this scope. Total yield is all recovered mass over the full charges of all recoveries; median yield is the middle one. Entry errors are left out.',
};

/** From which units refrigerant was recovered, and which of them come back low. */
export const AppliancesScreen = () => {
  const { scope } = useScope();
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const { data, error, isPlaceholderData, refetch } = useApplianceRecoveries(query);
  const ordered = useMemo(() => data && { items: mostLowFirst(data.items) }, [data]);
  return (
    <GroupedScreen kind={APPLIANCES} scope={scope} answer={{ data: ordered, error, isPlaceholderData, refetch }} />
  );
};
