import 'server-only';
import { desc, eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { cylinders } from '@/db/schema/places';
import { recoveries as r } from '@/db/schema/recoveries';
import { nameKey } from '@/lib/recoveries/names';
import type { CylinderContent } from './cylinder-content-contract';

/** What a cylinder is meant for and what went into it last; nothing of a cylinder that nobody knows. */
export const getCylinderContent = async (tx: Tx, name: string): Promise<CylinderContent> => {
  const [cylinder] = await tx
    .select({ id: cylinders.id, meantFor: cylinders.refrigerant })
    .from(cylinders)
    .where(eq(cylinders.nameKey, nameKey(name)));
  if (!cylinder) return { meantFor: null, last: null };
  const [last] = await tx
    .select({ refrigerant: r.refrigerant, recoveredOn: r.recoveredOn })
    .from(r)
    .where(eq(r.cylinderId, cylinder.id))
    .orderBy(desc(r.recoveredOn), desc(r.recoveredAt), desc(r.createdAt))
    .limit(1);
  return { meantFor: cylinder.meantFor, last: last ?? null };
};
