import 'server-only';
import type { Tx } from '@/db/client';
import { refrigerants } from '@/db/schema/refrigerants';

/** The designations of the catalogue. */
export const getDesignations = async (tx: Tx): Promise<ReadonlySet<string>> => {
  const rows = await tx.select({ designation: refrigerants.designation }).from(refrigerants);
  return new Set(rows.map((row) => row.designation));
};
