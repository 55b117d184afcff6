import type {
  ApplianceCategory,
  CertificationType,
  Disposition,
  JobType,
  MassUnit,
  VacuumUnit,
} from '@/lib/vocabulary';
import type { Reading } from './contract';
import type { RecoveryField } from './fields';
import type { FileLayout } from './layout';

/**
 * One row of a recovery file in the product's own words. Numbers are the text of exact decimals; null is what the row
 * does not state.
 */
export type RecoveryRow = {
  recordRef: string;
  /** Local date of the company, `YYYY-MM-DD`. */
  recoveredOn: string;
  /** ISO instant with offset, when the row gives a time of day. */
  recoveredAt: string | null;
  technician: string;
  site: string;
  appliance: string;
  branch: string | null;
  jobType: JobType | null;
  category: ApplianceCategory | null;
  /** Designation as the catalogue writes it. */
  refrigerant: string;
  nameplateChargeKg: string;
  /** `0` when the row does not state one. */
  addedChargeKg: string;
  startWeightKg: string | null;
  endWeightKg: string | null;
  recoveredMassKg: string;
  massUnit: MassUnit;
  finalVacuumKpaAbs: string | null;
  vacuumUnit: VacuumUnit | null;
  holdMinutes: string | null;
  holdRiseKpa: string | null;
  cylinder: string | null;
  disposition: Disposition | null;
  manufacturedOn: string | null;
  technicianCertification: CertificationType | null;
  notes: string | null;
  /** Field → text as typed; filled fields only. */
  entered: Record<string, string>;
  /** Header of a column that no field takes → text; filled cells only. */
  extra: Record<string, string>;
};

/** Why a row is refused: the column's header as in the file, a stable code, a sentence, the cell as it came. */
export type RowReason = { column: string | null; code: string; message: string; value: string };

/** One row as read: the line on which it begins (the header of a plain file is line 1) and its cells as they came. */
export type ParsedRow = { line: number; cells: string[]; recordRef: string | null } & (
  | { ok: true; row: RecoveryRow }
  | { ok: false; reasons: RowReason[] }
);

/** Opens the file's bytes from their beginning; may be called several times. */
export type OpenFile = () => AsyncIterable<Uint8Array>;

/** What the reader must know besides the file. `today` is the company's local date; `refrigerants` the catalogue. */
export type ReadContext = { fileName: string; timeZone: string; refrigerants: ReadonlySet<string>; today: string };

/** How a file will be read: what the person sees of it, and what the second pass works by. */
export type FilePlan = {
  reading: Reading;
  /** The same for every file with the same set of headers. */
  headerKey: string;
  headers: string[];
  rowsTotal: number;
  /** Fields that a column of this file holds. */
  fields: RecoveryField[];
  layout: FileLayout;
};
