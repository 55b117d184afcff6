import 'server-only';
import type { PoolClient } from 'pg';
import type { JudgedCylinder, JudgedRecord } from '@/analytics/judging/record';

const ROWS_A_FETCH = 10_000;

// float8 and text are what node-postgres reads without detours. Small appliances and pressure classes: 40 CFR 82.156.
const JUDGED_RECORDS = `
  select r.id, r.record_ref, r.recovered_on::text,
         to_char(r.recovered_at at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS"Z"'),
         r.technician_id, r.site_id, r.appliance_id, r.cylinder_id, r.category, r.job_type, r.refrigerant,
         r.nameplate_charge_kg::float8, r.full_charge_kg::float8, r.start_weight_kg::float8, r.end_weight_kg::float8,
         r.recovered_mass_kg::float8, r.mass_unit, r.final_vacuum_kpa_abs::float8, r.vacuum_unit, r.hold_minutes,
         r.hold_rise_kpa::float8, required_level_kpa_abs(f.pressure_class, r.full_charge_kg, r.category),
         r.exclusion is not null
  from recoveries r join refrigerants f on f.designation = r.refrigerant
  where r.company_id = $1`;

/** The due records ($2) and the other records of their appliances and cylinders. */
const WITH_NEIGHBOURS = `
  and (r.appliance_id in (select appliance_id from recoveries where company_id = $1 and id = any ($2))
       or r.cylinder_id in (select cylinder_id from recoveries where company_id = $1 and id = any ($2)))`;

// In the order of the columns above; what each of them holds, its table says.
type Row = [
  string,
  string,
  string,
  string | null,
  string,
  string,
  string,
  string | null,
  JudgedRecord['category'],
  JudgedRecord['jobType'],
  string,
  number,
  number,
  number | null,
  number | null,
  number,
  JudgedRecord['massUnit'],
  number | null,
  JudgedRecord['vacuumUnit'],
  number | null,
  number | null,
  number | null,
  boolean,
];

type Decisions = Map<
  string,
  { rule: JudgedRecord['decisions'][number]['rule']; decision: JudgedRecord['decisions'][number]['decision'] }[]
>;
const UNDECIDED: JudgedRecord['decisions'] = [];

const toRecord = (row: Row, decisions: Decisions): JudgedRecord => ({
  id: row[0],
  recordRef: row[1],
  recoveredOn: row[2],
  recoveredAt: row[3],
  technicianId: row[4],
  siteId: row[5],
  applianceId: row[6],
  cylinderId: row[7],
  category: row[8],
  jobType: row[9],
  refrigerant: row[10],
  nameplateChargeKg: row[11],
  fullChargeKg: row[12],
  startWeightKg: row[13],
  endWeightKg: row[14],
  recoveredMassKg: row[15],
  massUnit: row[16],
  finalVacuumKpaAbs: row[17],
  vacuumUnit: row[18],
  holdMinutes: row[19],
  holdRiseKpa: row[20],
  requiredLevelKpaAbs: row[21],
  decisions: decisions.get(row[0]) ?? UNDECIDED,
  isExcluded: row[22],
});

const readDecisions = async (client: PoolClient, companyId: string): Promise<Decisions> => {
  const { rows } = await client.query<Decisions extends Map<string, (infer One)[]> ? One & { id: string } : never>(
    `select recovery_id as id, rule, decision from flags where company_id = $1 and state = 'decided'`,
    [companyId],
  );
  const decisions: Decisions = new Map();
  for (const { id, ...one } of rows) decisions.set(id, [...(decisions.get(id) ?? []), one]);
  return decisions;
};

/** All records of a company as they are judged, or the due ones with their neighbours. */
export const readJudgedRecords = async (
  client: PoolClient,
  companyId: string,
  due?: readonly string[],
): Promise<JudgedRecord[]> => {
  const decisions = await readDecisions(client, companyId);
  const records: JudgedRecord[] = [];
  await client.query({
    text: `declare judged no scroll cursor for ${JUDGED_RECORDS}${due ? WITH_NEIGHBOURS : ''}`,
    values: due ? [companyId, due] : [companyId],
  });
  for (;;) {
    const { rows } = await client.query<Row>({ text: `fetch ${ROWS_A_FETCH} from judged`, rowMode: 'array' });
    for (const row of rows) records.push(toRecord(row, decisions));
    if (rows.length < ROWS_A_FETCH) break;
  }
  await client.query('close judged');
  return records;
};

/**
 * What is known of the cylinders. The most that a cylinder may hold is 80 % of its water capacity times the liquid's
 * specific gravity at 77 °F (AHRI Guideline K; water 997.05 kg/m3).
 */
export const readJudgedCylinders = async (client: PoolClient, companyId: string): Promise<JudgedCylinder[]> => {
  const { rows } = await client.query<JudgedCylinder>(
    `select c.id, c.refrigerant, c.tare_weight_kg::float8 as "tareWeightKg",
            0.8 * c.water_capacity_kg::float8 * f.liquid_density_kg_per_m3 / 997.05 as "fillLimitKg"
     from cylinders c left join refrigerants f on f.designation = c.refrigerant
     where c.company_id = $1`,
    [companyId],
  );
  return rows;
};
