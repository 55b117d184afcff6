import { setTimeout as sleep } from 'node:timers/promises';
import { GET as getRefused } from '@/app/api/imports/[id]/rejected.csv/route';
import { GET as getImport } from '@/app/api/imports/[id]/route';
import { POST as undo } from '@/app/api/imports/[id]/undo/route';
import { POST as upload } from '@/app/api/imports/route';
import { type ImportView, importSchema, type Mapping } from '@/lib/imports/contract';
import { apiRequest } from './company';

export type Send = { fileName?: string; mapping?: Mapping; dryRun?: boolean; headers?: Record<string, string> };

/** What a handler gets of its address. */
export const at = (id: string) => ({ params: Promise.resolve({ id }) });

/** Hands a file in as a program would. */
export const send = (token: string, file: string | Uint8Array<ArrayBuffer>, options: Send = {}): Promise<Response> => {
  const form = new FormData();
  form.set('file', new Blob([file]), options.fileName ?? 'recoveries.csv');
  if (options.mapping) form.set('mapping', JSON.stringify(options.mapping));
  if (options.dryRun) form.set('dryRun', 'true');
  return upload(apiRequest('/api/imports', token, { method: 'POST', body: form, headers: options.headers ?? {} }), {});
};

/** The import as the API shows it now. */
export const look = async (token: string, id: string): Promise<ImportView> =>
  importSchema.parse(await (await getImport(apiRequest(`/api/imports/${id}`, token), at(id))).json());

/** Waits until an import is over. */
export const settled = async (token: string, id: string): Promise<ImportView> => {
  for (;;) {
    const view = await look(token, id);
    if (!['queued', 'running'].includes(view.status)) return view;
    await sleep(30);
  }
};

/** Hands a file in and waits until it is over. */
export const takeIn = async (
  token: string,
  file: string | Uint8Array<ArrayBuffer>,
  options: Send = {},
): Promise<ImportView> => {
  const response = await send(token, file, options);
  if (response.status !== 202) throw new Error(`${response.status} ${await response.text()}`);
  const { id } = (await response.json()) as { id: string };
  return settled(token, id);
};

/** Takes an import back. */
export const takeBack = (token: string, id: string): Promise<Response> =>
  undo(apiRequest(`/api/imports/${id}/undo`, token, { method: 'POST' }), at(id));

/** The file of refused rows. */
export const refusedRows = async (token: string, id: string): Promise<string> =>
  new TextDecoder().decode(
    await (await getRefused(apiRequest(`/api/imports/${id}/rejected.csv`, token), at(id))).arrayBuffer(),
  );
