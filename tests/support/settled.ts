import { setTimeout as sleep } from 'node:timers/promises';
import { GET as workRoute } from '@/app/api/work/route';
import { apiRequest } from './company';

/** Waits until nothing of the company's background work is left. */
export const settled = async (token: string): Promise<void> => {
  for (;;) {
    const answer = await (await workRoute(apiRequest('/api/work', token), undefined)).json();
    if (answer.pending === 0) return;
    await sleep(50);
  }
};
