import 'server-only';
import { z } from 'zod';
import { flagSchema } from '@/analytics/flags/contract';
import { getFlag } from '@/analytics/flags/query';
import { withCompany } from '@/db/client';
import { json } from '@/lib/api/route';
import { scopeOf, type Viewer } from '@/lib/auth/viewer';
import { notFound } from '@/lib/errors';
import type { DisplayUnit } from '@/lib/vocabulary';

/** The id out of a path; throws 404 for what is none. */
export const flagIdOf = async ({ params }: { params: Promise<{ id: string }> }): Promise<string> => {
  const id = z.uuid().safeParse((await params).id);
  if (!id.success) throw notFound('This flag');
  return id.data;
};

/** The flag as it stands now; throws 404 when there is none. */
export const flagAnswer = async (viewer: Viewer, id: string, unit: DisplayUnit = viewer.massUnit) => {
  const flag = await withCompany(scopeOf(viewer), (tx) => getFlag(tx, id, unit));
  if (!flag) throw notFound('This flag');
  return json(flagSchema.parse(flag));
};
