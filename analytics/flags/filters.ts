import 'server-only';
import { and, eq, inArray, type SQL, sql } from 'drizzle-orm';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import { flags } from '@/db/schema/flags';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import type { FlagsQuery } from './contract';
import { readCursor } from './cursor';

/** The record that a flag is about. */
export const ofFlag = and(eq(f.companyId, flags.companyId), eq(f.id, flags.recoveryId));

const afterCursor = (cursor: string | undefined): SQL | undefined => {
  if (!cursor) return undefined;
  const { certainty, id } = readCursor(cursor);
  return sql`(${flags.certainty}, ${flags.id}) < (${certainty}::float8, ${id}::uuid)`;
};

type Filters = Pick<FlagsQuery, 'state' | 'rule' | 'recovery' | 'cursor'> & { scope: Scope };

/** The flags that a list query means, from its cursor on. */
export const flagsInList = ({ state, rule, recovery, cursor, scope }: Filters): SQL | undefined =>
  and(
    state === 'all' ? undefined : eq(flags.state, state),
    rule?.length ? inArray(flags.rule, rule) : undefined,
    recovery ? eq(flags.recoveryId, recovery) : undefined,
    inScope(scope),
    afterCursor(cursor),
  );
