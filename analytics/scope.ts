import { z } from 'zod';
import { APPLIANCE_CATEGORIES, JOB_TYPES } from '@/lib/vocabulary';
import { type Dimension, SCOPE_PARTS, UNSTATED } from './dimensions';

export { DIMENSIONS, type Dimension, SCOPE_PARTS, UNSTATED } from './dimensions';

const day = /^(19|20|21)\d{2}-(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/;
const month = /^(19|20|21)\d{2}-(0[1-9]|1[0-2])$/;

// JavaScript reads 31 February as 3 March; only a day that comes back as it went in is one.
const isDay = (text: string): boolean =>
  day.test(text) && new Date(`${text}T00:00:00Z`).toISOString().slice(0, 10) === text;

const monthOrDay = z
  .string()
  .refine(
    (text) => month.test(text) || isDay(text),
    'Expected a day or month between 1900 and 2199: YYYY-MM-DD or YYYY-MM',
  );

const many = <Item extends z.ZodType<string>>(item: Item) =>
  z
    .union([item, z.array(item)])
    .transform((value) => (Array.isArray(value) ? value : [value]))
    .optional();
// PostgreSQL keeps no NUL in text, so no name has one.
const name = z
  .string()
  .min(1)
  .max(200)
  .regex(/^[^\0]*$/, 'Expected text');

/** The scope parameters that every analytic route takes; each but the dates may be repeated. */
export const scopeShape = {
  from: monthOrDay.optional(),
  to: monthOrDay.optional(),
  branch: many(name),
  refrigerant: many(name),
  technician: many(name),
  site: many(name),
  category: many(z.enum([...APPLIANCE_CATEGORIES, UNSTATED])),
  jobType: many(z.enum([...JOB_TYPES, UNSTATED])),
  appliance: many(name),
  /** Parts whose values are left out rather than kept: `site=A&except=site` is every site but A. */
  except: many(z.enum(SCOPE_PARTS)),
};

export const scopeSchema = z
  .object(scopeShape)
  .refine((scope) => !scope.from || !scope.to || firstDay(scope.from) < dayAfter(scope.to), {
    path: ['to'],
    message: 'The end lies before the beginning',
  });
export type Scope = z.output<typeof scopeSchema>;

/** Whether anything but the period narrows a scope; `besides` one part that may. */
export const isNarrowed = (scope: Scope, besides?: Dimension): boolean =>
  Boolean(scope.except?.length) || SCOPE_PARTS.some((part) => part !== besides && scope[part]?.length);

/** Whether a scope leaves nothing out: every record of every time. */
export const isWhole = (scope: Scope): boolean => !scope.from && !scope.to && !isNarrowed(scope);

/** First day of an inclusive `from`, `YYYY-MM-DD`. */
export const firstDay = (from: string): string => (month.test(from) ? `${from}-01` : from);

/** First day that an inclusive `to` leaves out, `YYYY-MM-DD`: ranges are half-open inside. */
export const dayAfter = (to: string): string => {
  const [year = 0, monthNo = 1, dayNo] = to.split('-').map(Number);
  const next =
    dayNo === undefined ? new Date(Date.UTC(year, monthNo, 1)) : new Date(Date.UTC(year, monthNo - 1, dayNo + 1));
  return next.toISOString().slice(0, 10);
};
