import type { Action } from '@/lib/auth/permissions';
import type { FilledCompany } from './filled-company';

/** What a handler promises about access; `open` says why somebody who is not signed in may call it. */
export type RouteRule =
  | { open: string }
  | {
      action: Action;
      /** The id in the path, of a company's own. */
      id?: (company: FilledCompany) => string;
      /** The id of a record that belongs to another technician of the same company. */
      colleagues?: (company: FilledCompany) => string;
      /** What is sent, for writes. */
      send?: (company: FilledCompany) => { body: BodyInit; headers?: Record<string, string> };
      search?: string;
      /** The answer to a role that may. */
      status: number;
      /** For lists and sums: the number of records that the answer is about, as it says itself. */
      records?: (answer: never) => number;
    };

const asJson = (value: unknown) => ({
  body: JSON.stringify(value),
  headers: { 'content-type': 'application/json' },
});

const recoveryFile = () => {
  const form = new FormData();
  form.set('file', new File(['record_ref,recovered_at\nA-1,2025-01-02\n'], 'two-columns.csv', { type: 'text/csv' }));
  form.set('dryRun', 'true');
  return { body: form };
};

const additionFile = () => {
  const form = new FormData();
  const text = 'addition_ref,added_on,site,appliance,added_charge,mass_unit\nA-1,2025-01-02,Nowhere,RTU-1,5.0,lb\n';
  form.set('file', new File([text], 'additions.csv', { type: 'text/csv' }));
  form.set('dryRun', 'true');
  return { body: form };
};

const takenRecord = ({ label }: FilledCompany) =>
  asJson({
    recordRef: `${label}-0`,
    recoveredAt: '2025-01-15',
    site: `Site of ${label}`,
    appliance: `Appliance of ${label}`,
    technician: `Technician of ${label}`,
    refrigerant: 'R-410A',
    nameplateCharge: 5,
    recoveredMass: 4,
  });

const recoveryId = ({ ids }: FilledCompany) => ids.recoveryId;
const otherRecoveryId = ({ ids }: FilledCompany) => ids.otherRecoveryId;
const flagId = ({ ids }: FilledCompany) => ids.flagId;
const othersFlagId = ({ ids }: FilledCompany) => ids.othersFlagId;
const decidedFlagId = ({ ids }: FilledCompany) => ids.decidedFlagId;
const noteId = ({ ids }: FilledCompany) => ids.noteId;
const coachingId = ({ ids }: FilledCompany) => ids.coachingId;
const additionId = ({ ids }: FilledCompany) => ids.additionId;
const applianceId = ({ ids }: FilledCompany) => ids.applianceId;
const siteId = ({ ids }: FilledCompany) => ids.siteId;
const importId = ({ ids }: FilledCompany) => ids.importId;
const sumOf = (items: { recoveries: number }[]) => items.reduce((sum, { recoveries }) => sum + recoveries, 0);

/**
 * Every handler under app/api. A route that is not here fails the access test: say who may call it, with what, and what
 * comes back.
 */
export const ROUTES: Record<string, RouteRule> = {
  'GET /api/appliances/[id]/leaks': { action: 'leaks:read', id: applianceId, status: 200 },
  'PUT /api/appliances/[id]/subsector': {
    action: 'leaks:write',
    id: applianceId,
    send: () => asJson({ lightCommercial: true }),
    status: 200,
  },
  'GET /api/charge-additions': { action: 'leaks:read', status: 200 },
  'POST /api/charge-additions': {
    action: 'leaks:write',
    send: ({ ids }) =>
      asJson({ applianceId: ids.applianceId, addedOn: '2025-05-01', addedCharge: '2', reason: 'leak_top_up' }),
    status: 201,
  },
  'GET /api/charge-additions/changes': {
    action: 'leaks:read',
    search: '?appliance=00000000-0000-4000-8000-000000000000',
    status: 200,
  },
  // A version that nobody has seen yet.
  'PATCH /api/charge-additions/[id]': {
    action: 'leaks:write',
    id: additionId,
    send: () => asJson({ version: 999, why: 'a typing error', notes: 'mended' }),
    status: 409,
  },
  'DELETE /api/charge-additions/[id]': {
    action: 'leaks:write',
    id: additionId,
    search: '?version=999&why=a+typing+error',
    status: 409,
  },
  'GET /api/charge-additions/imports': { action: 'leaks:read', status: 200 },
  'POST /api/charge-additions/imports': { action: 'leaks:write', send: additionFile, status: 200 },
  'POST /api/charge-additions/imports/[id]/undo': {
    action: 'leaks:write',
    id: ({ ids }) => ids.undoneAdditionImportId,
    status: 409,
  },
  'GET /api/sites/[id]/leaks': { action: 'leaks:read', id: siteId, status: 200 },
  // The method of a filled company is chosen already.
  'PUT /api/sites/[id]/leak-method': {
    action: 'leaks:write',
    id: siteId,
    send: () => asJson({ method: 'rolling_average', version: 0 }),
    status: 409,
  },
  'GET /api/appliances': {
    action: 'appliances:read',
    status: 200,
    records: (answer: { items: { recoveries: number }[] }) => sumOf(answer.items),
  },
  'GET /api/appliances/[id]': {
    action: 'appliances:read',
    id: ({ ids }) => ids.applianceId,
    status: 200,
  },
  'GET /api/auth/[...nextauth]': { open: 'signing in is for those who are not signed in' },
  'POST /api/auth/[...nextauth]': { open: 'signing in is for those who are not signed in' },
  'GET /api/coaching': {
    action: 'coaching:read',
    status: 200,
  },
  'POST /api/coaching': {
    action: 'coaching:write',
    send: ({ ids }) => asJson({ technicianId: ids.technicianId, startedOn: '2025-03-15', plan: 'Wait out the hold.' }),
    status: 201,
  },
  // A version that nobody has seen yet.
  'PATCH /api/coaching/[id]': {
    action: 'coaching:write',
    id: coachingId,
    send: () => asJson({ version: 999, plan: 'mended' }),
    status: 409,
  },
  'DELETE /api/coaching/[id]': { action: 'coaching:write', id: coachingId, search: '?version=999', status: 409 },
  'GET /api/explain': {
    action: 'records:read',
    search: '?measure=recoveries',
    status: 200,
    records: (answer: { value: number }) => answer.value,
  },
  'GET /api/flags': { action: 'flags:read', status: 200 },
  'GET /api/flags/[id]': { action: 'flags:read', id: flagId, colleagues: othersFlagId, status: 200 },
  'GET /api/flags/people': { action: 'flags:decide', status: 200 },
  // Decided already: the flag stays as it is for whoever asks next.
  'POST /api/flags/[id]/decision': {
    action: 'flags:decide',
    id: decidedFlagId,
    send: () => asJson({ decision: 'leaked_before' }),
    status: 409,
  },
  'POST /api/flags/[id]/assign': {
    action: 'flags:decide',
    id: flagId,
    send: () => asJson({ note: 'ask about the hold' }),
    status: 200,
  },
  'POST /api/flags/[id]/reopen': { action: 'flags:decide', id: flagId, status: 409 },
  'GET /api/health': { open: 'whoever watches the server has no account; it says nothing about a company' },
  'GET /api/imports': { action: 'imports:manage', status: 200 },
  'POST /api/imports': { action: 'imports:manage', send: recoveryFile, status: 202 },
  'GET /api/imports/[id]': { action: 'imports:manage', id: importId, status: 200 },
  // The import of a filled company is being read: nothing else is done with it meanwhile.
  'POST /api/imports/[id]/preview': { action: 'imports:manage', id: importId, send: () => asJson({}), status: 409 },
  'POST /api/imports/[id]/apply': { action: 'imports:manage', id: importId, send: () => asJson({}), status: 409 },
  'POST /api/imports/[id]/undo': { action: 'imports:manage', id: importId, status: 409 },
  'GET /api/imports/[id]/rejected.csv': { action: 'imports:manage', id: importId, status: 200 },
  'GET /api/notes': { action: 'notes:read', status: 200 },
  'POST /api/notes': {
    action: 'notes:write',
    send: () => asJson({ from: '2025-03-15', text: 'A new pump.' }),
    status: 201,
  },
  // A version that nobody has seen yet.
  'PATCH /api/notes/[id]': {
    action: 'notes:write',
    id: noteId,
    send: () => asJson({ version: 999, text: 'mended' }),
    status: 409,
  },
  'DELETE /api/notes/[id]': { action: 'notes:write', id: noteId, search: '?version=999', status: 409 },
  'GET /api/openapi.json': { open: 'it says what the API looks like, the same to everybody, and holds no data' },
  'GET /api/recoveries': {
    action: 'records:read',
    status: 200,
    records: (answer: { total: number }) => answer.total,
  },
  // The record ref is taken: what may be written is the business of the tests of records.
  'POST /api/recoveries': { action: 'records:write', send: takenRecord, status: 409 },
  'GET /api/recoveries/[id]': { action: 'records:read', id: recoveryId, colleagues: otherRecoveryId, status: 200 },
  // A version that nobody has seen yet.
  'PATCH /api/recoveries/[id]': {
    action: 'records:write',
    id: recoveryId,
    colleagues: otherRecoveryId,
    send: () => asJson({ version: 999, reason: 'a typing error', changes: { notes: 'mended' } }),
    status: 409,
  },
  'GET /api/recoveries/[id]/history': {
    action: 'records:read',
    id: recoveryId,
    colleagues: otherRecoveryId,
    status: 200,
  },
  'GET /api/recoveries/cylinder': { action: 'records:write', search: '?name=C-1', status: 200 },
  'GET /api/recoveries/names': { action: 'records:write', status: 200 },
  'GET /api/scope-options': {
    action: 'records:read',
    status: 200,
    records: (answer: { recoveries: number }) => answer.recoveries,
  },
  'GET /api/sites': {
    action: 'sites:read',
    status: 200,
    records: (answer: { items: { recoveries: number }[] }) => sumOf(answer.items),
  },
  'GET /api/start': {
    action: 'records:read',
    status: 200,
    records: (answer: { recoveries: number }) => answer.recoveries,
  },
  'GET /api/sites/[id]': { action: 'sites:read', id: ({ ids }) => ids.siteId, status: 200 },
  'GET /api/technicians': {
    action: 'technicians:read',
    status: 200,
    records: (answer: { items: { recoveries: number }[] }) => sumOf(answer.items),
  },
  'GET /api/technicians/[id]': {
    action: 'technician:read',
    id: ({ ids }) => ids.technicianId,
    colleagues: ({ ids }) => ids.otherTechnicianId,
    status: 200,
  },
  // All 24 records are of one half-year; the only other period they have is itself.
  'GET /api/trends/comparison': {
    action: 'trends:read',
    search: '?from=2025-01&to=2025-06&versus=2025-01..2025-06',
    status: 200,
    records: (answer: { comparison: { now: { recoveries: number } } }) => answer.comparison.now.recoveries,
  },
  'GET /api/trends/monthly': {
    action: 'trends:read',
    status: 200,
    records: (answer: { totals: { recoveries: number } }) => answer.totals.recoveries,
  },
  'GET /api/trends/pattern': { action: 'trends:read', status: 200 },
  'GET /api/work': { action: 'records:read', status: 200 },
};
