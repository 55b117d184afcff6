'use client';

import { useStart } from '@/analytics/start/hook';
import { startAnswer } from '@/analytics/start/sentence';
import { FigurePage } from '@/components/figures/figure-page';
import { FigureSentence } from '@/components/figures/figure-sentence';
import { useScope } from '@/components/scope/use-scope';
import { LinkButton } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';
import { Failed, Loading } from '@/components/ui/states';
import { useViewer } from '@/components/viewer-context';
import { formatWeekday } from '@/lib/format';
import { FirstSteps } from './first-steps';
import { MonthBeside } from './month-beside';
import { WaitingList } from './waiting-list';
import { WhatChanged } from './what-changed';

/** What a technician comes for. */
const OwnVerbs = () => (
  <>
    <LinkButton tone="primary" href="/records/new">
      New record
    </LinkButton>
    <LinkButton href="/records">Your records</LinkButton>
  </>
);

/** The first page of the day: the answer of the role, what waits, what changed. */
export const StartScreen = () => {
  const { role } = useViewer();
  const { unit } = useScope().scope;
  const { data, error, refetch } = useStart();
  if (!data)
    return (
      <>
        <h1 className="sr-only">Today</h1>
        {error ? <Failed error={error} onRetry={() => refetch()} /> : <Loading minHeight={480} />}
      </>
    );
  const answer = startAnswer(data, role, unit);
  return (
    <FigurePage>
      <p className="mt-2 mb-3 font-mono text-sm text-ink-2">{formatWeekday(data.today)}</p>
      {answer && data.latest ? (
        <div className="grid gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,1fr)_20rem]">
          <div className="flex min-w-0 flex-col gap-8">
            <PageHead
              title={<FigureSentence pieces={answer.pieces} scope={answer.scope} />}
              sub={answer.sub.some(Boolean) ? <FigureSentence pieces={answer.sub} scope={answer.scope} /> : undefined}
              actions={role === 'technician' ? <OwnVerbs /> : undefined}
            />
            <WaitingList items={data.waiting} />
            <WhatChanged start={data} unit={unit} />
          </div>
          <MonthBeside latest={data.latest} unit={unit} own={role === 'technician'} className="self-start lg:mt-2" />
        </div>
      ) : (
        <FirstSteps />
      )}
    </FigurePage>
  );
};
