import { expect, test } from 'vitest';
import { PUBLISHED_ROUTES } from '@/analytics/published-routes';
import { GET } from '@/app/api/openapi.json/route';
import { findHandlers } from '../support/discover';
import { ROUTES } from '../support/route-table';

type Parameter = { name: string; in: string; required: boolean; schema: object };
type Operation = { parameters?: Parameter[]; responses: Record<string, { content: object }>; security?: [] };
type Document = { openapi: string; paths: Record<string, { get: Operation }>; components: { schemas: object } };

const document = (await GET().json()) as Document;
const operation = (path: string): Operation => {
  const found = document.paths[path]?.get;
  if (!found) throw new Error(`${path} is not published.`);
  return found;
};

test('every reading handler on disk is published, and nothing else is', async () => {
  const handlers = await findHandlers();
  const reading = handlers
    .filter(({ method, path }) => method === 'GET' && !path.startsWith('/api/auth/'))
    .map(({ path }) => path.replace(/\[(\w+)\]/g, '{$1}'));
  expect(Object.keys(document.paths).sort()).toEqual(reading.sort());
});

test('each says the permission that the table of routes expects', () => {
  for (const { path, action } of PUBLISHED_ROUTES) {
    const rule = ROUTES[`GET ${path.replace(/\{(\w+)\}/g, '[$1]')}`];
    expect(rule && 'action' in rule ? rule.action : null, path).toBe(action);
  }
});

test('scope, repeated names and defaults stand in the parameters', () => {
  expect(document.openapi).toBe('3.1.0');
  const { parameters = [], responses } = operation('/api/trends/monthly');
  const names = parameters.map(({ name }) => name);
  expect(names).toEqual(
    expect.arrayContaining(['from', 'to', 'branch', 'refrigerant', 'technician', 'site', 'category', 'jobType', 'by']),
  );
  expect(parameters.find(({ name }) => name === 'by')?.schema).toMatchObject({
    default: 'refrigerant',
    type: 'string',
  });
  expect(parameters.find(({ name }) => name === 'site')?.schema).toMatchObject({
    anyOf: [{ type: 'string' }, { type: 'array', items: { type: 'string' } }],
  });
  expect(JSON.stringify(responses['200'])).toContain('partialMonth');
  expect(JSON.stringify(responses['400'])).toContain('#/components/schemas/Problem');
  expect(operation('/api/explain').parameters?.find(({ name }) => name === 'measure')?.required).toBe(true);
  expect(operation('/api/recoveries/{id}').parameters).toEqual([
    { name: 'id', in: 'path', required: true, schema: { type: 'string', format: 'uuid' } },
  ]);
  expect(operation('/api/health').security).toEqual([]);
});
