import 'server-only';
import Papa from 'papaparse';
import type { Tx } from '@/db/client';
import { plainCharacters } from '@/lib/format';
import { toFormulaSafe } from '@/lib/formula-safe';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Flag, FlagsQuery } from './contract';
import { flagsInList } from './filters';
import { toFlags } from './items';
import { scopeOfQuery } from './query';
import { getFlagRows } from './rows';

/** Excel takes a file for Windows-1252 unless it begins with this. */
const BYTE_ORDER_MARK = '\uFEFF';

const COLUMNS: Record<string, (flag: Flag) => string | number | null> = {
  record_ref: (flag) => flag.recordRef,
  recovered_on: (flag) => flag.recoveredOn,
  technician: (flag) => flag.technician,
  site: (flag) => flag.site,
  appliance: (flag) => flag.appliance,
  refrigerant: (flag) => flag.refrigerant,
  rule: (flag) => flag.rule,
  certainty: (flag) => flag.certainty.toFixed(3),
  recovered_mass_kg: (flag) => flag.recoveredMass.toFixed(3),
  full_charge_kg: (flag) => flag.fullCharge.toFixed(3),
  expected_mass_kg: (flag) => flag.expectedMass?.toFixed(3) ?? null,
  explanation: (flag) => plainCharacters(flag.explanation),
  state: (flag) => flag.state,
  decision: (flag) => flag.decision,
  decided_by: (flag) => (flag.state === 'decided' ? (flag.decisions[0]?.by ?? null) : null),
  decided_at: (flag) => (flag.state === 'decided' ? (flag.decisions[0]?.at ?? null) : null),
  decision_note: (flag) => (flag.state === 'decided' ? (flag.decisions[0]?.note ?? null) : null),
  assigned_to: (flag) => flag.assignedTo?.name ?? null,
  note: (flag) => flag.note,
};

/** All flags that a list query means as a CSV file, one row a flag, the surest first. */
export const exportFlags = async (tx: Tx, query: FlagsQuery, unit: DisplayUnit): Promise<string> => {
  const where = flagsInList({ ...query, cursor: undefined, scope: scopeOfQuery(query) });
  const flags = await toFlags(tx, await getFlagRows(tx, where), unit);
  const rows = flags.map((flag) => Object.values(COLUMNS).map((cell) => toFormulaSafe(String(cell(flag) ?? ''))));
  return `${BYTE_ORDER_MARK}${Papa.unparse([Object.keys(COLUMNS), ...rows], { newline: '\r\n' })}\r\n`;
};
