'use client';

import { useState } from 'react';
import { Button, LinkButton } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { plural } from '@/lib/format';
import type { ImportView, Mapping } from '@/lib/imports/contract';
import { ChangedRecords } from './changed-records';
import type { useImportVerbs } from './import-api';
import { importSentence, takenCount } from './import-words';
import { NewNames } from './new-names';
import { OpenQuestions } from './open-questions';
import { OutcomeCounts } from './outcome-counts';
import { ReadingSheet } from './reading-sheet';
import { RefusedRows } from './refused-rows';
import { answerTo } from './tell';

type ImportPreviewProps = { view: ImportView; verbs: ReturnType<typeof useImportVerbs> };

/** What a file would change, how it is read, and the button that takes it in. Also where a file failed, to read it anew. */
export const ImportPreview = ({ view, verbs }: ImportPreviewProps) => {
  const [draft, setDraft] = useState<Mapping>(view.mapping);
  const { reading, summary } = view;
  const questions = reading?.questions ?? [];
  const changed = JSON.stringify(draft) !== JSON.stringify(view.mapping);
  const answered = questions.every((question) => answerTo(draft, question) !== '');
  const count = takenCount(view);
  const isBusy = verbs.preview.isPending || verbs.apply.isPending;
  const fault = verbs.preview.error ?? verbs.apply.error;

  const action =
    questions.length || changed || view.status === 'failed' ? (
      <Button
        tone="primary"
        disabled={isBusy || !answered || !(changed || view.status === 'failed')}
        onClick={() => verbs.preview.mutate(draft)}
      >
        Read the file again
      </Button>
    ) : count > 0 ? (
      <Button tone="primary" disabled={isBusy} onClick={() => verbs.apply.mutate()}>
        Take in {plural(count, 'row', 'rows')}
      </Button>
    ) : (
      <LinkButton href="/imports">Choose another file</LinkButton>
    );

  return (
    <div className="flex flex-col gap-6">
      <PageHead title={importSentence(view)} sub={subOf(view)} actions={action} />
      {view.failure ? (
        <Notice tone="danger" title="Why">
          {view.failure}
        </Notice>
      ) : null}
      {fault ? (
        <Notice tone="danger" announce title="This did not work">
          {fault.message}
        </Notice>
      ) : null}
      {reading && questions.length ? <OpenQuestions reading={reading} mapping={draft} onTell={setDraft} /> : null}
      {summary ? <OutcomeCounts view={view} /> : null}
      {summary ? <RefusedRows view={view} /> : null}
      {summary ? <NewNames names={summary.newNames} made={false} /> : null}
      {summary ? <ChangedRecords view={view} made={false} /> : null}
      {reading ? <ReadingSheet reading={reading} mapping={draft} onTell={setDraft} /> : null}
      {reading ? <div className="flex flex-wrap gap-3">{action}</div> : null}
    </div>
  );
};

const subOf = ({ status, fileName, reading }: ImportView) => {
  if (status === 'failed') return 'No record was changed.';
  return reading?.questions.length
    ? 'Answer below, then the file is read again. No record has been changed.'
    : `This is what ${fileName} would do. No record has been changed yet.`;
};
