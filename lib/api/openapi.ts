import { z } from 'zod';
import type { Action } from '@/lib/auth/permissions';

/** A reading route as it is published: where it is, what it tells, what it takes and gives. */
export type PublishedRoute = {
  /** With ids in braces: `/api/recoveries/{id}`. */
  path: string;
  summary: string;
  /** What its caller must be allowed; null for a route that anybody may ask. */
  action: Action | null;
  query?: z.ZodType;
  /** The schema of a JSON answer, or the media type of any other. */
  answer: z.ZodType | string;
};

type JsonSchema = Record<string, unknown>;

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): JsonSchema => {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' });
  return rest;
};

const idParameters = (path: string): JsonSchema[] =>
  [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string', format: 'uuid' },
  }));

const queryParameters = (query: z.ZodType | undefined): JsonSchema[] => {
  if (!query) return [];
  const { properties = {}, required = [] } = z.toJSONSchema(query, { io: 'input', unrepresentable: 'any' });
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    schema,
  }));
};

const contentOf = (answer: PublishedRoute['answer']): JsonSchema =>
  typeof answer === 'string'
    ? { [answer]: { schema: { type: 'string' } } }
    : { 'application/json': { schema: schemaOf(answer, 'output') } };

const problem = (description: string) => ({
  description,
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
});

const operationOf = ({ path, summary, action, query, answer }: PublishedRoute): JsonSchema => {
  const parameters = [...idParameters(path), ...queryParameters(query)];
  return {
    summary,
    ...(action ? { description: `Needs the permission ${action}.` } : { security: [] }),
    ...(parameters.length ? { parameters } : {}),
    responses: {
      200: { description: 'The answer.', content: contentOf(answer) },
      ...(query ? { 400: problem('Input that is none; `errors` says where.') } : {}),
      ...(action ? { 401: problem('No or bad credentials.'), 403: problem('The role may not.') } : {}),
      ...(path.includes('{') ? { 404: problem('Not there, or of another company.') } : {}),
    },
  };
};

/** An error as every route gives it (RFC 9457). */
const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});

/** The routes as an OpenAPI 3.1 document. It holds shapes and no data. */
export const openApiDocument = (routes: readonly PublishedRoute[], version: string): JsonSchema => ({
  openapi: '3.1.0',
  info: {
    title: 'Tarebook',
    version,
    description:
      'Masses are kilograms to the gram, yields are shares, months are YYYY-MM and days YYYY-MM-DD of the company’s time zone. Fields may be added; those here keep their meaning.',
  },
  security: [{ token: [] }],
  paths: Object.fromEntries(routes.map((route) => [route.path, { get: operationOf(route) }])),
  components: {
    securitySchemes: { token: { type: 'http', scheme: 'bearer' } },
    schemas: { Problem: schemaOf(problemSchema, 'output') },
  },
});
