import { eq, sql } from 'drizzle-orm';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type Tx, withCompany } from '@/db/client';
import { monthlySummary } from '@/db/schema/monthly-summary';
import { recoveries } from '@/db/schema/recoveries';
import { groupSummary, likeJobs, middleYields } from '@/db/schema/summaries';
import { newCompany } from '../support/company';
import { summaryDifferences } from '../support/kept-summaries';
import { newPlaces, type Places, recoveryRow } from '../support/records';

/** The same months worked out from the records, each dimension by a plain GROUP BY of its own. */
const fromRecords = (dimension: string, key: string) => `
  select '${dimension}' as dimension, r.recovered_month as month, coalesce(${key}, '') as key, count(*)::int as recoveries,
         sum(r.recovered_mass_kg) as recovered_mass_kg, sum(r.full_charge_kg) as full_charge_kg,
         round((percentile_cont(0.5) within group (order by (r.recovered_mass_kg / r.full_charge_kg)::float8))::numeric, 9) as median_yield,
         round(sum(r.recovered_mass_kg * f.gwp_ar4::numeric), 3) as co2e_kg,
         count(r.final_vacuum_kpa_abs)::int as vacuum_stated, count(r.hold_minutes)::int as hold_stated,
         count(*) filter (where r.hold_minutes > 0)::int as held
  from recoveries r join refrigerants f on f.designation = r.refrigerant
  where r.exclusion is null group by 2, 3`;

const KEYS = {
  all: "''",
  refrigerant: 'r.refrigerant',
  technician: 'r.technician_id::text',
  site: 'r.site_id::text',
  branch: 'r.branch_id::text',
  category: 'r.category',
  job_type: 'r.job_type',
};

const differences = async (tx: Tx): Promise<unknown[]> => {
  const expected = Object.entries(KEYS)
    .map(([dimension, key]) => `(${fromRecords(dimension, key)})`)
    .join(' union all ');
  const kept = `select dimension, month, key, recoveries, recovered_mass_kg, full_charge_kg, round(median_yield::numeric, 9), round(co2e_kg::numeric, 3), vacuum_stated, hold_stated, held from monthly_summary`;
  const found = await tx.execute(
    sql.raw(`((${expected}) except all (${kept})) union all ((${kept}) except all (${expected}))`),
  );
  return found.rows;
};

const record = fc.record({
  recoveredOn: fc
    .integer({ min: 0, max: 90 })
    .map((day) => new Date(Date.UTC(2025, 0, 1 + day)).toISOString().slice(0, 10)),
  technician: fc.nat(2),
  unit: fc.nat(1),
  branch: fc.option(fc.nat(1)),
  category: fc.option(fc.constantFrom('comfort_cooling' as const, 'small_appliance' as const)),
  jobType: fc.option(fc.constantFrom('repair' as const, 'disposal' as const)),
  refrigerant: fc.constantFrom('R-22', 'R-410A', 'R-123'),
  // Few different yields or many: ties are where a rank goes wrong.
  micrograms: fc.oneof(fc.nat(9_000_000_000_000), fc.constantFrom(4_000_000_000, 4_500_000_000, 5_000_000_000)),
  holdMinutes: fc.option(fc.constantFrom(0, 10)),
  vacuum: fc.option(fc.constantFrom('101.325', '67.461', '3.3')),
});
type Draft = typeof record extends fc.Arbitrary<infer T> ? T : never;

const toRow = (companyId: string, places: Places, draft: Draft) =>
  recoveryRow(companyId, places, {
    ...places.units[draft.unit],
    recoveredOn: draft.recoveredOn,
    technicianId: places.technicianIds[draft.technician] ?? '',
    branchId: draft.branch === null ? null : (places.branchIds[draft.branch] ?? null),
    category: draft.category,
    jobType: draft.jobType,
    refrigerant: draft.refrigerant,
    recoveredMassKg: (draft.micrograms / 1e9).toFixed(9),
    holdMinutes: draft.holdMinutes,
    finalVacuumKpaAbs: draft.vacuum,
  });

const step = fc.oneof(
  fc.record({ kind: fc.constant('add' as const), rows: fc.array(record, { minLength: 1, maxLength: 12 }) }),
  fc.record({ kind: fc.constant('change' as const), pick: fc.nat(), row: record }),
  fc.record({ kind: fc.constant('exclude' as const), pick: fc.nat() }),
  fc.record({ kind: fc.constant('remove' as const), pick: fc.nat() }),
);

test('what is kept ready equals the records after any edits, exclusions and deletions', {
  timeout: 120_000,
}, async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(step, { minLength: 1, maxLength: 12 }), async (steps) => {
      const { companyId, scope } = await newCompany();
      const places = await withCompany(scope, (tx) => newPlaces(tx, companyId));
      for (const change of steps) {
        await withCompany(scope, async (tx) => {
          const ids = await tx.select({ id: recoveries.id }).from(recoveries).orderBy(recoveries.recordRef);
          const id = 'pick' in change ? ids[change.pick % Math.max(ids.length, 1)]?.id : undefined;
          if (change.kind === 'add')
            await tx.insert(recoveries).values(change.rows.map((row) => toRow(companyId, places, row)));
          else if (!id) return;
          else if (change.kind === 'remove') await tx.delete(recoveries).where(eq(recoveries.id, id));
          else if (change.kind === 'exclude')
            await tx.update(recoveries).set({ exclusion: 'entry_error' }).where(eq(recoveries.id, id));
          else {
            const { recordRef: _kept, ...row } = toRow(companyId, places, change.row);
            await tx.update(recoveries).set(row).where(eq(recoveries.id, id));
          }
        });
      }
      expect(await withCompany(scope, differences)).toEqual([]);
      expect(await withCompany(scope, summaryDifferences)).toEqual([]);
    }),
    { numRuns: 40, seed: 608 },
  );
});

test('two records saved at the same time are both in the months', async () => {
  const { companyId, scope } = await newCompany();
  const places = await withCompany(scope, (tx) => newPlaces(tx, companyId));
  const save = () => withCompany(scope, (tx) => tx.insert(recoveries).values(recoveryRow(companyId, places)));
  await Promise.all(Array.from({ length: 8 }, save));
  expect(await withCompany(scope, differences)).toEqual([]);
  expect(await withCompany(scope, summaryDifferences)).toEqual([]);
});

test('a technician’s own edit adds up everybody’s records, and shows him none of the sums', async () => {
  const { companyId, scope } = await newCompany();
  const places = await withCompany(scope, (tx) => newPlaces(tx, companyId));
  const [mine = '', other = ''] = places.technicianIds;
  await withCompany(scope, (tx) =>
    tx.insert(recoveries).values(recoveryRow(companyId, places, { technicianId: other })),
  );
  await withCompany({ ...scope, technicianId: mine }, async (tx) => {
    await tx.insert(recoveries).values(recoveryRow(companyId, places, { technicianId: mine }));
    for (const kept of [monthlySummary, groupSummary, likeJobs, middleYields])
      expect(await tx.select().from(kept)).toEqual([]);
  });
  expect(await withCompany(scope, differences)).toEqual([]);
  expect(await withCompany(scope, summaryDifferences)).toEqual([]);
});
