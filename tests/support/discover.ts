import { readdirSync } from 'node:fs';
import { join, relative, resolve } from 'node:path';

const ROOT = resolve('app');
const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const;

/** A route handler as Next calls it. */
export type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;
export type FoundHandler = { name: string; path: string; method: string; handler: Handler };

const filesNamed = (name: string, folder: string): string[] =>
  readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => file === name || file.endsWith(`/${name}`))
    .map((file) => join(folder, file))
    .sort();

/** The address of a route or page file; groups in parentheses are no part of it. */
const addressOf = (file: string): string =>
  `/${relative(ROOT, file)
    .split('/')
    .slice(0, -1)
    .filter((part) => !part.startsWith('('))
    .join('/')}`;

/** Every handler that the application exports, found on disk. */
export const findHandlers = async (): Promise<FoundHandler[]> => {
  const found: FoundHandler[] = [];
  for (const file of filesNamed('route.ts', join(ROOT, 'api'))) {
    const exported: Record<string, unknown> = await import(file);
    const path = addressOf(file);
    for (const method of METHODS) {
      const handler = exported[method];
      if (typeof handler === 'function')
        found.push({ name: `${method} ${path}`, path, method, handler: handler as Handler });
    }
  }
  return found;
};

/** Addresses of the pages under a group of app, found on disk. */
export const findPages = (group: string): string[] => filesNamed('page.tsx', join(ROOT, group)).map(addressOf);
