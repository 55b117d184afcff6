'use client';

import { useQuery, useQueryClient } from '@tanstack/react-query';
import Link from 'next/link';
import { useEffect } from 'react';
import { PageHead } from '@/components/ui/page-head';
import { Failed, Loading } from '@/components/ui/states';
import type { ImportView } from '@/lib/imports/contract';
import { importOptions, isAtWork, useImportVerbs } from './import-api';
import { ImportPreview } from './import-preview';
import { ImportProgress } from './import-progress';
import { ImportResult } from './import-result';
import { importSentence } from './import-words';

const Stage = ({ view }: { view: ImportView }) => {
  const verbs = useImportVerbs(view.id);
  if (isAtWork(view))
    return (
      <div className="flex flex-col gap-6">
        <PageHead title={importSentence(view)} />
        <ImportProgress view={view} />
      </div>
    );
  if (view.status === 'undone' || (view.status === 'done' && !view.dryRun))
    return <ImportResult view={view} verbs={verbs} />;
  // A file that was read anew begins with what the server now knows.
  return <ImportPreview key={view.finishedAt} view={view} verbs={verbs} />;
};

/** Once a file has been taken in, everything read before it may be out of date. */
const useFreshFigures = (view: ImportView | undefined) => {
  const queryClient = useQueryClient();
  const takenAt = view?.status === 'done' && !view.dryRun ? view.finishedAt : null;
  useEffect(() => {
    if (takenAt) void queryClient.invalidateQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'imports' });
  }, [takenAt, queryClient]);
};

/** One file on its way into the records. */
export const ImportScreen = ({ id }: { id: string }) => {
  const { data, error, isPending, refetch } = useQuery(importOptions(id));
  useFreshFigures(data);
  return (
    <>
      <p className="mb-3 text-sm">
        <Link className="link" href="/imports">
          All imports
        </Link>
      </p>
      {isPending ? <Loading label="Reading the import" /> : null}
      {error && !data ? <Failed error={error} title="This import could not be read." onRetry={refetch} /> : null}
      {data ? <Stage view={data} /> : null}
      <p role="status" className="sr-only">
        {data && !isAtWork(data) ? importSentence(data) : ''}
      </p>
    </>
  );
};
