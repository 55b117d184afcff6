import 'server-only';
import { and, eq, gte, ilike, isNotNull, isNull, lt, or, type SQL, type SQLWrapper, sql } from 'drizzle-orm';
import type { LikeJobsStanding, PlantSize, StatedReading } from '@/analytics/figures/measures';
import { LARGE_PLANT_KG } from '@/analytics/monthly-pattern/pattern';
import type { Scope } from '@/analytics/scope';
import { inScope } from '@/analytics/scope-query';
import { appliances, sites, technicians } from '@/db/schema/places';
import { flaggedRecoveries as flagged } from '@/db/views/flagged-recoveries';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { lowRecoveries as low } from '@/db/views/yield-limits';
import type { RecordListQuery } from './contract';

/** A search text as a LIKE pattern that means just this text, anywhere. */
const containing = (text: string): string => `%${text.replace(/[\\%_]/g, '\\$&')}%`;

// Letters of plain ASCII fold alike in every language; folded without one they cost a fraction.
const isPlain = (text: string): boolean => /^[\x20-\x7e]*$/.test(text);

const inRef = (text: string): SQL =>
  isPlain(text) ? sql`${f.recordRef} collate "C" ilike ${containing(text)}` : ilike(f.recordRef, containing(text));

/** Rows whose name says the text, looked up once among the few names and not for each record. */
const inName = (id: SQLWrapper, table: typeof technicians | typeof sites | typeof appliances, text: string): SQL =>
  sql`(${id} in (select ${table.id} from ${table} where ${ilike(table.name, containing(text))})) is true`;

/**
 * Records whose ref, technician, site or appliance says a text. A trigram index would not help: row-level security lets
 * only leakproof operators near an index before the policy, and LIKE is none.
 */
const found = (text: string): SQL | undefined =>
  or(
    inRef(text),
    inName(f.technicianId, technicians, text),
    inName(f.siteId, sites, text),
    inName(f.applianceId, appliances, text),
  );

// IS TRUE keeps a set from being joined: of a company that was never analysed the planner expects one row, and would
// work the set out anew for each record.
const STANDS: Record<LikeJobsStanding, SQL> = {
  below: sql`(${f.id} in (select ${low.recoveryId} from ${low})) is true`,
};

const IS_FLAGGED = sql`(${f.id} in (select ${flagged.recoveryId} from ${flagged})) is true`;

const STATES: Record<StatedReading, SQL> = { hold: isNotNull(f.held), vacuum: isNotNull(f.downToLevel) };

const LACKS: Record<StatedReading, SQL> = { hold: isNull(f.held), vacuum: isNull(f.downToLevel) };

const PLANT: Record<PlantSize, SQL> = {
  routine: lt(f.fullChargeKg, LARGE_PLANT_KG),
  large: gte(f.fullChargeKg, LARGE_PLANT_KG),
};

/** What narrows a list of records besides the page and its order. */
type RecordFilters = Scope &
  Pick<RecordListQuery, 'q' | 'importId'> &
  Partial<Pick<RecordListQuery, 'exclusion' | 'flagged' | 'likeJobs' | 'states' | 'lacks' | 'plant'>>;

/** The records that a list query means, whatever page of them. */
export const recordsInList = ({
  q,
  importId,
  exclusion,
  flagged: isFlagged,
  likeJobs,
  states,
  lacks,
  plant,
  ...scope
}: RecordFilters): SQL | undefined =>
  and(
    inScope(scope),
    q ? found(q) : undefined,
    importId ? eq(f.importId, importId) : undefined,
    exclusion ? (exclusion === 'none' ? isNull(f.exclusion) : isNotNull(f.exclusion)) : undefined,
    isFlagged ? IS_FLAGGED : undefined,
    likeJobs ? STANDS[likeJobs] : undefined,
    states ? STATES[states] : undefined,
    lacks ? LACKS[lacks] : undefined,
    plant ? PLANT[plant] : undefined,
  );
