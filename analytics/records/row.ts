import 'server-only';
import { recoveryFacts as f } from '@/db/views/recovery-facts';
import { kgToGram } from '@/lib/units';
import type { RecordRow } from './contract';

/** Columns of one row of the table of records. */
export const rowColumns = {
  id: f.id,
  recordRef: f.recordRef,
  recoveredOn: f.recoveredOn,
  recoveredAt: f.recoveredAt,
  technician: f.technician,
  site: f.site,
  appliance: f.appliance,
  branch: f.branch,
  category: f.category,
  jobType: f.jobType,
  refrigerant: f.refrigerant,
  fullCharge: f.fullChargeKg,
  recoveredMass: f.recoveredMassKg,
  yield: f.recoveryYield,
  cylinder: f.cylinder,
  exclusion: f.exclusion,
  version: f.version,
};

/** A row of the facts as the API gives it: masses to the gram, instants in ISO 8601. */
export const toRow = ({ fullCharge, recoveredMass, recoveredAt, ...row }: RecordRow): RecordRow => ({
  ...row,
  recoveredAt: recoveredAt && new Date(recoveredAt).toISOString(),
  fullCharge: kgToGram(fullCharge),
  recoveredMass: kgToGram(recoveredMass),
});
