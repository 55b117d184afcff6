import Papa from 'papaparse';
import { createAccessToken, createCompany } from '@/lib/auth/provision';
import type { SimulatedTruth } from '@/seed/simulation/truth';
import { companyApi } from '../company-api';
import type { JudgedCrew } from '../technicians/figures';
import type { JudgedCompany } from './score';
import { plantedFaults } from './truth-of-flags';

/** A company as the product judges it, and what that took. */
export type ImportedCompany = JudgedCompany & {
  crew: JudgedCrew;
  records: number;
  seconds: { import: number; renewal: number };
};

/** The number of each ticket's row, counted from 1 below the header. */
const rowsByRef = (file: string): ((ref: string) => string) => {
  const { data } = Papa.parse<{ record_ref: string }>(file, { header: true, skipEmptyLines: true });
  const rows = new Map(data.map(({ record_ref }, index) => [record_ref, String(index + 1)]));
  return (ref) => {
    const row = rows.get(ref);
    if (!row) throw new Error(`The file has no ticket ${ref}`);
    return row;
  };
};

/**
 * Makes a company, sends it the file as a program would, waits until all background work is done and reads flags and
 * technicians from the API. Records are matched by ticket number.
 */
export const judgeThroughImport = async (
  address: string,
  name: string,
  { file, truth }: { file: string; truth: SimulatedTruth },
): Promise<ImportedCompany> => {
  const companyId = await createCompany(name);
  const api = companyApi(address, await createAccessToken(companyId, { role: 'owner', label: 'bench' }));
  const sent = await api.importFile('recoveries.csv', [file]);
  const renewal = await api.untilIdle();
  const rowOf = rowsByRef(file);
  const flags = await api.openFlags();
  const technicians = await api.technicians();
  return {
    flags: flags.map(({ recordRef, rule, certainty, recoveredMass }) => ({
      recordId: rowOf(recordRef),
      rule,
      certainty,
      recoveredMassKg: recoveredMass,
    })),
    refused: (await api.refusedRefs(sent.view.id)).map((ref) => Number(rowOf(ref))),
    planted: plantedFaults(truth),
    crew: {
      called: technicians.map(({ technician, verdict, look, scale, low, high }) => ({
        name: technician,
        verdict,
        look,
        hasScale: scale !== null,
        range: low !== null && high !== null ? { low, high } : null,
      })),
      planted: truth.technicians,
    },
    records: sent.view.added,
    seconds: { import: sent.seconds, renewal },
  };
};
