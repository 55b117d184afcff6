'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { onlyOf, scopeQuery, scopeSearch } from '@/analytics/scope-address';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { useTechnicianRecoveries } from '@/analytics/technicians/hook';
import { FIRST, LAST, MASS_COLUMNS, RECOVERIES } from '@/components/grouped-figures/column';
import { type GroupedKind, GroupedScreen } from '@/components/grouped-figures/grouped-screen';
import { useScope } from '@/components/scope/use-scope';

/** The crew by name; its reader may sort it, nobody is ranked. */
const TECHNICIANS: GroupedKind<TechnicianRow> = {
  screen: 'Technicians',
  words: { one: 'technician', many: 'technicians', verb: 'brought in' },
  label: 'Recoveries by technician',
  title: 'The crew',
  order: 'by name',
  columns: [
    {
      id: 'technician',
      label: 'Technician',
      kind: 'text',
      heads: true,
      value: ({ technician }) => technician,
      draw: ({ technician }, own) => (
        <Link href={`/records${scopeSearch(own)}`} className="link">
          {technician}
        </Link>
      ),
    },
    RECOVERIES,
    ...MASS_COLUMNS,
    FIRST,
    LAST,
  ],
  rowId: ({ technicianId }) => technicianId,
  ownScope: (scope, { technician }) => onlyOf(scope, 'technician', [technician]),
  sub: () =>
    'A yield alone does not judge a person. A system that had leaked before anyone came gives little to the best technician, and large chillers give more than window units to anyone. Read the records before you speak to somebody.',
  note: 'Total yield is all recovered mass over all full charges; median yield is the middle one of the recoveries. Full charge is the nameplate charge plus what was added for long lines. Entry errors are left out.',
};

/** Who recovered how much, with what yields do and do not say. */
export const TechniciansScreen = () => {
  const { scope } = useScope();
  const query = useMemo(() => scopeQuery(scope), [scope]);
  return <GroupedScreen kind={TECHNICIANS} scope={scope} answer={useTechnicianRecoveries(query)} />;
};
