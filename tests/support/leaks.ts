import type { ApplianceLeaks } from '@/analytics/leak-rate/contract';
import { applianceLeaksSchema } from '@/analytics/leak-rate/contract';
import { GET as getLeaks } from '@/app/api/appliances/[id]/leaks/route';
import { POST as createAddition } from '@/app/api/charge-additions/route';
import { apiRequest } from './company';

const at = (id: string) => ({ params: Promise.resolve({ id }) });

/** A request with a JSON body. */
export const sent = (
  path: string,
  token: string,
  body: unknown,
  method = 'POST',
  headers: Record<string, string> = {},
) =>
  apiRequest(path, token, {
    method,
    body: JSON.stringify(body),
    headers: { 'content-type': 'application/json', ...headers },
  });

/** Writes an addition as a program would. */
export const add = (token: string, body: unknown, headers: Record<string, string> = {}): Promise<Response> =>
  createAddition(sent('/api/charge-additions', token, body, 'POST', headers), undefined);

/** What is told of an appliance's leaks. */
export const leaksOf = async (token: string, id: string): Promise<ApplianceLeaks> => {
  const response = await getLeaks(apiRequest(`/api/appliances/${id}/leaks`, token), at(id));
  return applianceLeaksSchema.parse(await response.json());
};
