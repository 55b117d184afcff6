'use client';

import dynamic from 'next/dynamic';
import type { ReactNode } from 'react';
import type { ScopePart as Part } from '@/analytics/dimensions';
import { useScopeOptions } from '@/analytics/scope-options/hook';
import { TextButton } from '@/components/ui/button';
import { Failed, Loading } from '@/components/ui/states';
import { useViewer } from '@/components/viewer-context';
import { UNIT_NAMES } from '@/lib/wording';
import { CopyLink } from './copy-link';
import { MoreConditions } from './more-conditions';
import { PeriodEditor } from './period-editor';
import { ScopePart } from './scope-part';
import { UnitEditor } from './unit-editor';
import { useScope } from './use-scope';
import { DIMENSION_WORDS, isPeriodPart, partPhrase, periodPhrase } from './wording';

// Comes when a part of the sentence is opened.
const ChoiceEditor = dynamic(() => import('./choice-editor').then((module) => module.ChoiceEditor), {
  ssr: false,
  loading: () => <Loading />,
});

/** Words before and after the value of a dimension, where it has a fixed place in the sentence. */
const PLACES: Record<Part, { before: string; after?: string; always: boolean }> = {
  branch: { before: 'from', always: true },
  refrigerant: { before: 'of', always: true },
  technician: { before: 'by', always: true },
  site: { before: 'at', always: false },
  category: { before: 'on', always: false },
  appliance: { before: 'out of', always: false },
  jobType: { before: 'for', always: false },
};
const ORDER: readonly Part[] = ['branch', 'refrigerant', 'technician', 'site', 'appliance', 'category', 'jobType'];

type ScopeSentenceProps = {
  /** What the sentence speaks of. */
  subject?: string;
  /** Further verbs of the screen beside "Copy link". */
  actions?: ReactNode;
};

/** What the screen shows, as a sentence each part of which can be set in place; kept in the address. */
export const ScopeSentence = ({ subject = 'Recoveries', actions }: ScopeSentenceProps) => {
  const { role } = useViewer();
  const { scope, setScope, clear, narrowed } = useScope();
  const options = useScopeOptions();

  // A technician has one branch and one technician: himself.
  const offered = ORDER.filter((part) => role !== 'technician' || !['branch', 'technician'].includes(part));
  const spoken = offered.filter((part) => PLACES[part].always || scope[part].length);
  /** A company may have thousands of appliances: those of the address can be taken out, others come from their screen. */
  const choicesOf = (part: Part) =>
    part === 'appliance' ? scope.appliance.map((value) => ({ value, recoveries: null })) : options.data?.[part];
  const editorOf = (part: Part) => (close: () => void) => {
    if (options.error) return <Failed error={options.error} onRetry={() => options.refetch()} />;
    const choices = choicesOf(part);
    if (!choices) return <Loading />;
    return (
      <ChoiceEditor
        dimension={part}
        choices={choices}
        selected={scope.except.includes(part) ? [] : scope[part]}
        onApply={(values) =>
          setScope({ [part]: values.length ? values : null, except: scope.except.filter((other) => other !== part) })
        }
        close={close}
      />
    );
  };
  const isUnknown = (part: Part) => {
    const known = choicesOf(part);
    return Boolean(known) && scope[part].some((value) => !known?.some((choice) => choice.value === value));
  };
  const doubtfulPeriod = [scope.from, scope.to].some((part) => part !== null && !isPeriodPart(part));

  return (
    <div className="mb-5 flex flex-wrap items-baseline justify-between gap-x-8 gap-y-1">
      <p className="max-w-[62em] text-base text-ink-2 sm:text-lg">
        {role === 'technician' ? `Your ${subject.toLowerCase()}` : subject}{' '}
        {spoken.map((part) => (
          <span key={part}>
            {PLACES[part].before}{' '}
            <ScopePart label={DIMENSION_WORDS[part].many} editor={editorOf(part)} stop="," doubtful={isUnknown(part)}>
              {partPhrase(scope, part)}
            </ScopePart>{' '}
          </span>
        ))}
        <ScopePart
          label="Period"
          stop=","
          wide
          doubtful={doubtfulPeriod}
          editor={(close) => (
            <PeriodEditor
              scope={scope}
              firstMonth={options.data?.firstMonth ?? null}
              onApply={setScope}
              close={close}
            />
          )}
        >
          {periodPhrase(scope)}
        </ScopePart>{' '}
        in{' '}
        <ScopePart
          label="Unit of mass"
          stop="."
          editor={(close) => <UnitEditor unit={scope.unit} onApply={(unit) => setScope({ unit })} close={close} />}
        >
          {UNIT_NAMES[scope.unit]}
        </ScopePart>
      </p>
      <div className="flex flex-wrap items-baseline gap-x-5 text-sm print:hidden">
        <MoreConditions
          dimensions={offered.filter((part) => part !== 'appliance' && !spoken.includes(part))}
          editorOf={editorOf}
        />
        {narrowed ? <TextButton onClick={clear}>Clear</TextButton> : null}
        <CopyLink />
        <TextButton onClick={() => window.print()}>Print</TextButton>
        {actions}
      </div>
    </div>
  );
};
