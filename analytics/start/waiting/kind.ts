import type { Tx } from '@/db/client';
import type { Role } from '@/lib/vocabulary';
import type { WaitingItem } from '../contract';

/** For whom and on which local date of the company something is looked for. */
export type WaitingFor = { role: Role; today: string };

/** One kind of thing that can wait for a person. */
export type WaitingKind = {
  kind: string;
  /** Whose business it is. */
  concerns: (role: Role) => boolean;
  /** What waits; null when nothing does. The transaction decides which rows are seen. */
  find: (tx: Tx, waitingFor: WaitingFor) => Promise<Omit<WaitingItem, 'kind'> | null>;
};
