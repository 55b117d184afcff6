import { setTimeout as sleep } from 'node:timers/promises';
import Papa from 'papaparse';
import type { Flag, FlagsList } from '@/analytics/flags/contract';
import type { TechnicianRecoveries, TechnicianRow } from '@/analytics/technicians/contract';
import type { ImportView } from '@/lib/imports/contract';

const POLL_MS = 100;
const FLAGS_A_PAGE = 500;

/** What a program with a token of one company does; every call throws when the server answers otherwise than it should. */
export const companyApi = (address: string, token: string) => {
  const ask = async (path: string, init: RequestInit = {}): Promise<Response> => {
    const response = await fetch(`${address}${path}`, { ...init, headers: { authorization: `Bearer ${token}` } });
    if (!response.ok) throw new Error(`${response.status} from ${path}: ${await response.text()}`);
    return response;
  };
  // The shapes are those of the routes' contracts, which the routes' own tests hold them to.
  const read = async <Answer>(path: string): Promise<Answer> => (await (await ask(path)).json()) as Answer;

  return {
    /** Sends a recovery file and waits until it is in; gives what came of it and the seconds from the first byte on. */
    async importFile(name: string, content: BlobPart[]): Promise<{ view: ImportView; seconds: number }> {
      const form = new FormData();
      form.set('file', new Blob(content), name);
      // Making the file has kept this process busy: let it notice which idle connections the server has closed meanwhile.
      await sleep(200);
      const began = performance.now();
      const { id } = (await (await ask('/api/imports', { method: 'POST', body: form })).json()) as { id: string };
      for (;;) {
        const view = await read<ImportView>(`/api/imports/${id}`);
        if (view.status === 'failed') throw new Error(view.failure ?? 'failed');
        if (view.status === 'done') return { view, seconds: (performance.now() - began) / 1000 };
        await sleep(POLL_MS);
      }
    },

    /** Waits until no background work of the company is left; gives the seconds that took. */
    async untilIdle(): Promise<number> {
      const began = performance.now();
      while ((await read<{ pending: number }>('/api/work')).pending > 0) await sleep(POLL_MS);
      return (performance.now() - began) / 1000;
    },

    /** Ticket numbers of the rows that an import refused. */
    async refusedRefs(importId: string): Promise<string[]> {
      const text = await (await ask(`/api/imports/${importId}/rejected.csv`)).text();
      const { data } = Papa.parse<{ record_ref: string }>(text, { header: true, skipEmptyLines: true });
      return data.map(({ record_ref }) => record_ref);
    },

    /** All open flags in the order of the list, page by page. */
    async openFlags(): Promise<Flag[]> {
      const flags: Flag[] = [];
      for (let cursor: string | null = ''; cursor !== null; ) {
        const after: string = cursor ? `&cursor=${encodeURIComponent(cursor)}` : '';
        const page: FlagsList = await read(`/api/flags?state=open&limit=${FLAGS_A_PAGE}${after}`);
        flags.push(...page.items);
        cursor = page.nextCursor;
      }
      return flags;
    },

    /** Everybody with a record, and how he compares; throws while the comparison lacks a change. */
    async technicians(): Promise<TechnicianRow[]> {
      const { items, judgedOn } = await read<TechnicianRecoveries>('/api/technicians');
      if (!judgedOn.current) throw new Error('Nothing is pending, but the comparison is an old one');
      return items;
    },
  };
};
