'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { scopeQuery } from '@/analytics/scope-address';
import type { TechnicianRow } from '@/analytics/technicians/contract';
import { useTechnicianRecoveries } from '@/analytics/technicians/hook';
import { type GroupedKind, GroupedScreen } from '@/components/grouped-figures/grouped-screen';
import { useScope } from '@/components/scope/use-scope';
import { crewAnswer } from './crew-answer';
import { CrewSheet } from './crew-sheet';
import { ownTechnicianScope, TECHNICIAN_COLUMNS, technicianRowId } from './technician-columns';

/** The crew by name; its reader may sort it, nobody is ranked. */
const TECHNICIANS: GroupedKind<TechnicianRow> = {
  screen: 'Technicians',
  words: { one: 'technician', many: 'technicians', verb: 'brought in' },
  label: 'Technicians against like jobs',
  title: 'The crew',
  order: 'by name',
  columns: TECHNICIAN_COLUMNS,
  rowId: technicianRowId,
  ownScope: ownTechnicianScope,
  answer: crewAnswer,
  sub: () => (
    <>
      Each is compared with what the same jobs would have given an average colleague; units that came short are excused,
      and chance is allowed for. It is for training: a reason to look, not a finding. Trainees and fewer than 20 jobs
      are not judged.{' '}
      <Link href="/how-we-judge#technicians" className="link">
        How we judge
      </Link>
    </>
  ),
  note: 'Expected is what colleagues’ like jobs would have given; observed is what came, both without units that are known to have come short. A few chillers decide these masses, so they judge nobody. Entry errors are left out.',
};

/** Who recovers less than like jobs give, fairly: the funnel, then each by name. */
export const TechniciansScreen = () => {
  const { scope } = useScope();
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const answer = useTechnicianRecoveries(query);
  const { data } = answer;
  return (
    <GroupedScreen
      kind={TECHNICIANS}
      scope={scope}
      answer={answer}
      picture={
        data ? (
          <CrewSheet
            rows={data.items}
            normalSpread={data.judgedOn.normalSpread}
            spreadKnown={data.judgedOn.spreadKnown}
            outdated={!data.judgedOn.current}
          />
        ) : null
      }
    />
  );
};
