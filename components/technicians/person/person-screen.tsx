'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { useCoachings } from '@/analytics/coaching/hook';
import { onlyOf, type ScopeSelection, scopeQuery, scopeSearch } from '@/analytics/scope-address';
import type { TechnicianPerson } from '@/analytics/technician-person/contract';
import { useTechnicianPerson } from '@/analytics/technician-person/hook';
import { CoachingSheet } from '@/components/coaching/coaching-sheet';
import { ScopedReport } from '@/components/scope/scoped-report';
import { useScope } from '@/components/scope/use-scope';
import { PageHead } from '@/components/ui/page-head';
import { Sheet } from '@/components/ui/sheet';
import { useMay } from '@/components/viewer-context';
import { plural } from '@/lib/format';
import { ChangeSince } from './change-since';
import { EvidenceList } from './evidence-list';
import { HabitsTable } from './habits-table';
import { RunSheet } from './run-sheet';

const ANSWERS = {
  below: 'less than like jobs give colleagues, beyond luck',
  within: 'what like jobs give colleagues, within luck and the usual differences',
  above: 'more than like jobs give colleagues, beyond luck',
} as const;

const answerOf = ({ technician, judgement }: TechnicianPerson): string =>
  !judgement || judgement.verdict === 'too few'
    ? `${technician}: too few jobs to say anything.`
    : `${technician} recovers ${ANSWERS[judgement.verdict]}.`;

type PersonReportProps = { person: TechnicianPerson; scope: ScopeSelection; today: string };

const PersonReport = ({ person, scope, today }: PersonReportProps) => {
  const { technician, technicianId, judgement, course } = person;
  const coachings = useCoachings(technicianId);
  const own = onlyOf(scope, 'technician', [technician]);
  return (
    <>
      <PageHead
        title={answerOf(person)}
        sub={
          <>
            {judgement?.why} It is for training: a reason to look, not a finding.{' '}
            <Link href="/how-we-judge#technicians" className="link">
              How we judge
            </Link>
          </>
        }
      />
      {judgement && course?.months.length ? (
        <RunSheet judgement={judgement} course={course} coachings={coachings.data?.items ?? []} own={own} />
      ) : null}
      {judgement ? (
        <div className="grid gap-6 lg:grid-cols-2">
          <Sheet title="What it stands on" aside={plural(judgement.judgedJobs, 'job judged', 'jobs judged')}>
            <EvidenceList judgement={judgement} unit={scope.unit} />
          </Sheet>
          <Sheet title="Habits" aside="as the records tell them">
            <HabitsTable habits={judgement.habits} habitBehind={judgement.habitBehind} />
          </Sheet>
        </div>
      ) : null}
      <CoachingSheet
        technicianId={technicianId}
        today={today}
        changeSince={({ startedOn }) => <ChangeSince course={course} startedOn={startedOn} />}
      />
      <p>
        <Link href={`/records${scopeSearch(own)}`} className="link">
          The {plural(person.recoveries, 'job', 'jobs')} behind it
        </Link>
      </p>
    </>
  );
};

/** One technician: the verdict with what it stands on, month by month, habits, and what was agreed. */
export const PersonScreen = ({ technicianId, today }: { technicianId: string; today: string }) => {
  const { scope } = useScope();
  const mayReadCrew = useMay('technicians:read');
  const query = useMemo(() => scopeQuery(scope), [scope]);
  const { data, error, isPlaceholderData, refetch } = useTechnicianPerson(technicianId, query);
  return (
    <>
      {mayReadCrew ? (
        <p className="mb-3 text-sm print:hidden">
          <Link href={`/technicians${scopeSearch(scope)}`} className="link">
            All technicians
          </Link>
        </p>
      ) : null}
      <ScopedReport
        screen="Technician"
        data={data}
        error={error}
        stale={isPlaceholderData}
        retry={() => refetch()}
        isEmpty={({ recoveries }) => recoveries === 0}
      >
        {(person) => <PersonReport person={person} scope={scope} today={today} />}
      </ScopedReport>
    </>
  );
};
