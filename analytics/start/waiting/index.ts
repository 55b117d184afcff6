import 'server-only';
import type { Tx } from '@/db/client';
import type { WaitingItem } from '../contract';
import { disposalsWithoutVacuum } from './disposals-without-vacuum';
import { emptyMonths } from './empty-months';
import { failedImports } from './failed-imports';
import { importsAtWork } from './imports-at-work';
import type { WaitingFor, WaitingKind } from './kind';
import { openFlags } from './open-flags';
import { openPreviews } from './open-previews';
import { refusedRows } from './refused-rows';

/** Every kind of thing that waits, in the order in which it is told. */
const KINDS: readonly WaitingKind[] = [
  failedImports,
  refusedRows,
  openPreviews,
  openFlags,
  disposalsWithoutVacuum,
  emptyMonths,
  importsAtWork,
];

/** What waits for somebody of a role. */
export const getWaiting = async (tx: Tx, waitingFor: WaitingFor): Promise<WaitingItem[]> => {
  const items: WaitingItem[] = [];
  for (const { kind, concerns, find } of KINDS) {
    const item = concerns(waitingFor.role) ? await find(tx, waitingFor) : null;
    if (item) items.push({ kind, ...item });
  }
  return items;
};
