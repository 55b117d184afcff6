import 'server-only';
import type { TaskList } from 'graphile-worker';
import { failImport } from '@/lib/imports/progress';
import { takeIn } from '@/lib/imports/take-in';
import { failUndo, undoImport } from '@/lib/imports/undo';
import { importPayload, jobHandler } from './task';

/** The work on imports, by the name under which `work.enqueue` takes it. */
export const TASKS: TaskList = {
  'take-in-file': jobHandler({ payload: importPayload, run: takeIn, giveUp: failImport }),
  'undo-import': jobHandler({ payload: importPayload, run: undoImport, giveUp: failUndo }),
};

/** Somebody waits for these at the screen: a retry comes within seconds. */
export const URGENT_TASKS = ['take-in-file', 'undo-import'];
