import { formatCount, plural } from '@/lib/format';
import type { ImportList, ImportView } from '@/lib/imports/contract';

type ListItem = ImportList['items'][number];

/** What an import has come to, in one or two words. */
export const statusWords = ({ status, dryRun }: Pick<ListItem, 'status' | 'dryRun'>): string => {
  switch (status) {
    case 'queued':
      return 'waiting';
    case 'running':
      return dryRun ? 'being read' : 'being taken in';
    case 'failed':
      return 'not taken in';
    case 'undone':
      return 'undone';
    case 'done':
      return dryRun ? 'preview only' : 'taken in';
  }
};

/** Rows that change the records. */
export const takenCount = ({ added, updated }: Pick<ListItem, 'added' | 'updated'>): number => added + updated;

const workingSentence = ({ fileName, dryRun, rowsRead, rowsTotal }: ImportView): string => {
  const verb = dryRun ? 'Reading' : 'Taking in';
  if (rowsTotal === null) return `${verb} ${fileName}`;
  return `${verb} ${fileName}: ${formatCount(rowsRead)} of ${plural(rowsTotal, 'row', 'rows')}`;
};

const previewSentence = (view: ImportView): string => {
  const questions = view.reading?.questions.length ?? 0;
  if (questions) return `${plural(questions, 'question', 'questions')} before ${view.fileName} can be read`;
  if (takenCount(view) === 0)
    return view.unchanged > 0 ? `${view.fileName} brings nothing new` : `No row of ${view.fileName} can be taken in`;
  return `${formatCount(takenCount(view))} of ${plural(view.rowsRead, 'row', 'rows')} would change your records`;
};

/** The answering sentence over an import. */
export const importSentence = (view: ImportView): string => {
  switch (view.status) {
    case 'queued':
    case 'running':
      return workingSentence(view);
    case 'failed':
      return `${view.fileName} was not taken in`;
    case 'undone':
      return `The import of ${view.fileName} was undone`;
    case 'done':
      return view.dryRun
        ? previewSentence(view)
        : `${plural(takenCount(view), 'record', 'records')} came in from ${view.fileName}`;
  }
};
