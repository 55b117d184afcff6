import { randomUUID } from 'node:crypto';
import { addSettings, type Tx, withCompany } from '@/db/client';
import { additionImports, chargeAdditions, siteLeakMethods } from '@/db/schema/charge-additions';
import { coaching } from '@/db/schema/coaching';
import { settings } from '@/db/schema/companies';
import { flagBaselines, flagRenewals } from '@/db/schema/flag-renewal';
import { flagDecisions, flags } from '@/db/schema/flags';
import { importFileChunks, importMappings, importRows, imports } from '@/db/schema/imports';
import { notes } from '@/db/schema/notes';
import { passwordLinks, sessions } from '@/db/schema/people';
import { appliances, branches, cylinders, sites, technicianCertifications, technicians } from '@/db/schema/places';
import { applianceSuspicions, recordDigests, siteSuspicions } from '@/db/schema/record-digests';
import { recoveries } from '@/db/schema/recoveries';
import { newCompany } from './company';
import { newPerson } from './session';

/** Enough like jobs that the views which judge say something. */
const JOBS = 24;

const ids = () => ({
  branchId: randomUUID(),
  technicianId: randomUUID(),
  otherTechnicianId: randomUUID(),
  siteId: randomUUID(),
  applianceId: randomUUID(),
  cylinderId: randomUUID(),
  importId: randomUUID(),
  flagId: randomUUID(),
  decidedFlagId: randomUUID(),
  othersFlagId: randomUUID(),
  baselineId: randomUUID(),
  recoveryId: randomUUID(),
  noteId: randomUUID(),
  coachingId: randomUUID(),
  otherCoachingId: randomUUID(),
  additionId: randomUUID(),
  undoneAdditionImportId: randomUUID(),
  otherRecoveryId: randomUUID(),
});
type Ids = ReturnType<typeof ids>;

const fillPlaces = async (tx: Tx, companyId: string, label: string, id: Ids): Promise<void> => {
  const named = (rowId: string, what: string) => ({ companyId, id: rowId, name: `${what} of ${label}` });
  await tx.insert(settings).values({ companyId, key: 'test', value: label });
  await tx.insert(branches).values(named(id.branchId, 'Branch'));
  await tx
    .insert(technicians)
    .values([named(id.technicianId, 'Technician'), named(id.otherTechnicianId, 'Other technician')]);
  await tx.insert(technicianCertifications).values({ companyId, technicianId: id.technicianId, type: 'universal' });
  await tx.insert(sites).values(named(id.siteId, 'Site'));
  await tx.insert(appliances).values({ ...named(id.applianceId, 'Appliance'), siteId: id.siteId });
  await tx.insert(cylinders).values(named(id.cylinderId, 'Cylinder'));
};

/** One low pull by the technician, and usual ones, most of them by the other technician. */
const fillRecords = async (tx: Tx, companyId: string, label: string, id: Ids, massKg: string): Promise<void> => {
  const rows = Array.from({ length: JOBS }, (_, n) => ({
    companyId,
    id: [id.recoveryId, randomUUID(), randomUUID(), id.otherRecoveryId][n] ?? randomUUID(),
    recordRef: `${label}-${n}`,
    recoveredOn: `2025-0${1 + (n % 6)}-15`,
    technicianId: n < 3 ? id.technicianId : id.otherTechnicianId,
    siteId: id.siteId,
    applianceId: id.applianceId,
    branchId: id.branchId,
    cylinderId: id.cylinderId,
    category: 'comfort_cooling' as const,
    jobType: 'repair' as const,
    refrigerant: 'R-410A',
    nameplateChargeKg: '1000',
    recoveredMassKg: n === 0 ? '1' : massKg,
    massUnit: 'kg' as const,
  }));
  await tx.insert(recoveries).values(rows);
};

/** An open and a decided flag on the low pull, and an open one on the other technician's record. */
const fillFlags = async (tx: Tx, companyId: string, id: Ids): Promise<void> => {
  const { baselineId, recoveryId } = id;
  await tx.insert(flagBaselines).values({ companyId, id: baselineId, judging: 'test', content: {} });
  await tx
    .insert(flagRenewals)
    .values({ companyId, judging: 'test', baselineId, records: JOBS, added: 3, changed: 0, gone: 0 });
  const flag = { companyId, recoveryId, certainty: 0.9, evidence: {}, baselineId };
  await tx.insert(flags).values([
    { ...flag, id: id.flagId, rule: 'low_unexplained' },
    { ...flag, id: id.decidedFlagId, rule: 'hold_missing', state: 'decided', decision: 'known_low_charge' },
    { ...flag, id: id.othersFlagId, rule: 'unit_slip', recoveryId: id.otherRecoveryId },
  ]);
  await tx
    .insert(flagDecisions)
    .values({ companyId, flagId: id.decidedFlagId, decision: 'known_low_charge', decidedBy: 'test' });
};

const fillNotes = (tx: Tx, companyId: string, label: string, id: Ids) =>
  tx.insert(notes).values({
    companyId,
    id: id.noteId,
    fromDay: '2025-03-01',
    toDay: '2025-03-31',
    text: `Note of ${label}`,
    writtenBy: 'test',
  });

const fillCoaching = (tx: Tx, companyId: string, label: string, id: Ids) => {
  const shared = { companyId, startedOn: '2025-03-01', plan: `Plan of ${label}`, writtenBy: 'test' };
  return tx.insert(coaching).values([
    { ...shared, id: id.coachingId, technicianId: id.technicianId },
    { ...shared, id: id.otherCoachingId, technicianId: id.otherTechnicianId },
  ]);
};

const fillAdditions = async (tx: Tx, companyId: string, label: string, id: Ids, massKg: string): Promise<void> => {
  await tx.insert(additionImports).values({
    companyId,
    id: id.undoneAdditionImportId,
    fileName: `${label}.csv`,
    fileSha256: label,
    ...{ rowsRead: 1, added: 0, updated: 0, unchanged: 0, rejected: 1 },
    refused: [],
    ledger: [],
    createdBy: 'test',
    undoneAt: '2025-05-01T12:00:00Z',
  });
  await tx.insert(chargeAdditions).values({
    companyId,
    id: id.additionId,
    additionRef: `${label}-addition`,
    applianceId: id.applianceId,
    addedOn: '2025-04-01',
    addedChargeKg: massKg,
    massUnit: 'kg',
    enteredMass: massKg,
    reason: 'leak_top_up',
    createdBy: 'test',
  });
  await tx
    .insert(siteLeakMethods)
    .values({ companyId, siteId: id.siteId, method: 'annualizing', chosenBy: `Manager of ${label}` });
};

const fillImports = async (tx: Tx, companyId: string, label: string, id: Ids): Promise<void> => {
  const { importId } = id;
  await tx.insert(imports).values({
    companyId,
    id: importId,
    fileName: `${label}.csv`,
    fileSize: 3,
    fileSha256: label,
    status: 'running',
    rowsRead: 1,
    rowsTotal: 1,
    rejected: 1,
    createdBy: 'test',
  });
  await tx.insert(importFileChunks).values({ companyId, importId, chunkNo: 0, bytes: Buffer.from('a,b') });
  await tx.insert(importRows).values({
    companyId,
    importId,
    line: 2,
    outcome: 'rejected',
    recordRef: `${label}-refused`,
    cells: [label],
    reasons: [{ column: null, code: 'test', message: 'A reason.' }],
  });
  await tx.insert(importMappings).values({ companyId, headerKey: label, mapping: {} });
};

const fillDigest = async (tx: Tx, companyId: string, { applianceId, siteId }: Ids): Promise<void> => {
  await tx
    .insert(recordDigests)
    .values({ companyId, version: 0, revision: 0, comparison: { technicians: [], crew: { judged: 0 } } });
  const chance = 0.9;
  await tx.insert(applianceSuspicions).values({
    ...{ companyId, applianceId, visits: 1, shortVisits: 1, expectedShort: 0.1, chance },
    ...{ visitedOn: ['2025-01-15'], yields: [0.1], shortChances: [0.9] },
  });
  const counts = { judged: 1, suspected: 1, lowAgain: 0, expected: 0.1, adjustedP: 0.2, look: false };
  await tx.insert(siteSuspicions).values({ companyId, siteId, chance, ...counts });
};

/**
 * A company with rows in every table and view. `label` stands in every name and `massKg` in every mass, so that either
 * is recognised where it does not belong.
 */
export const filledCompany = async (label: string, massKg: string) => {
  const company = await newCompany(`${label} ${randomUUID()}`);
  const { companyId, scope } = company;
  const id = ids();
  await withCompany({ ...scope, reason: `filled for ${label}` }, async (tx) => {
    await fillPlaces(tx, companyId, label, id);
    await fillRecords(tx, companyId, label, id, massKg);
    await fillFlags(tx, companyId, id);
    await fillImports(tx, companyId, label, id);
    await fillNotes(tx, companyId, label, id);
    await fillCoaching(tx, companyId, label, id);
    await fillAdditions(tx, companyId, label, id, massKg);
    await fillDigest(tx, companyId, id);
  });
  const { personId } = await newPerson(companyId, 'owner');
  const expiresAt = '2099-01-01T00:00:00Z';
  await withCompany(scope, async (tx) => {
    await addSettings(tx, { person_id: personId });
    await tx.insert(sessions).values({ tokenHash: randomUUID(), personId, companyId, expiresAt });
    await tx.insert(passwordLinks).values({ tokenHash: randomUUID(), personId, expiresAt });
  });
  await company.token('auditor');
  return { ...company, label, personId, ids: id };
};
export type FilledCompany = Awaited<ReturnType<typeof filledCompany>>;
