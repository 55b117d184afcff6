import { z } from 'zod';
import type { Contract } from '@/lib/api/contract';
import type { PublishedRoute } from '@/lib/api/openapi';
import { additionImportListSchema } from '@/lib/charge-additions/file/contract';
import { importListSchema, importSchema } from '@/lib/imports/contract';
import { applianceRecoveries } from './appliances/contract';
import { additionChanges, additionsList } from './charge-additions/contract';
import { coachingList } from './coaching/contract';
import { explain } from './explain/contract';
import { assignableList, flagSchema, flagsList } from './flags/contract';
import { applianceLeaksSchema, siteLeaksSchema } from './leak-rate/contract';
import { monthlyPattern } from './monthly-pattern/contract';
import { monthlyTrends } from './monthly-trends/contract';
import { notesList } from './notes/contract';
import { recordHistorySchema, recordListContract, recordSchema } from './records/contract';
import { cylinderContentContract } from './records/cylinder-content-contract';
import { knownNamesContract } from './records/known-names-contract';
import { scopeOptions } from './scope-options/contract';
import { siteRecoveries } from './sites/contract';
import { start } from './start/contract';
import { technicianPersonSchema } from './technician-person/contract';
import { technicianRecoveries } from './technicians/contract';
import { trendsComparison } from './trends-comparison/contract';
import { applianceHistorySchema, siteHistorySchema } from './visits/contract';

const published = (
  { path, action, query, response }: Contract<z.ZodType, z.ZodType>,
  summary: string,
): PublishedRoute => ({ path, action, query, answer: response, summary });

const health = z.object({ status: z.enum(['ok', 'failing']), database: z.string(), version: z.string() });

/** Every route that reads, for programs: a test holds this list against the handlers that there are. */
export const PUBLISHED_ROUTES: readonly PublishedRoute[] = [
  published(explain, 'How a figure was computed, and the query of its records'),
  published(start, 'What changed and what waits, by role'),
  published(monthlyTrends, 'Recovered mass by month, split by one dimension'),
  published(trendsComparison, 'A period against another one, like for like'),
  published(monthlyPattern, 'Season, trend and unusual months'),
  published(technicianRecoveries, 'What each technician recovered'),
  published(siteRecoveries, 'What was recovered at each site'),
  published(applianceRecoveries, 'What was recovered from each appliance'),
  published(flagsList, 'Reasons to look at a record, the surest first; with format=csv as a file'),
  published(assignableList, 'Who may be asked to look at a flag'),
  {
    path: '/api/flags/{id}',
    summary: 'One flag, with what was decided on it and the other reasons of its record',
    action: 'flags:read',
    answer: flagSchema,
  },
  published(recordListContract, 'Records, page by page; with format=csv all of them as a recovery file'),
  published(knownNamesContract, 'Names that a new record can use'),
  published(cylinderContentContract, 'What a cylinder holds, as far as the records tell'),
  published(scopeOptions, 'What a scope can be narrowed to'),
  published(coachingList, 'Coachings of technicians'),
  published(notesList, 'Notes pinned to days'),
  published(additionsList, 'Refrigerant put into appliances'),
  published(additionChanges, 'Every change of the additions of an appliance'),
  {
    path: '/api/charge-additions/imports',
    summary: 'Files of charge additions that were taken in',
    action: 'leaks:read',
    answer: additionImportListSchema,
  },
  {
    path: '/api/appliances/{id}/leaks',
    summary: 'Additions, leak rates and suspicion of an appliance',
    action: 'leaks:read',
    answer: applianceLeaksSchema,
  },
  {
    path: '/api/sites/{id}/leaks',
    summary: 'Leak rate method of a site, and its appliances',
    action: 'leaks:read',
    answer: siteLeaksSchema,
  },
  {
    path: '/api/sites/{id}',
    summary: 'One site and its recoveries of all time',
    action: 'sites:read',
    answer: siteHistorySchema,
  },
  {
    path: '/api/appliances/{id}',
    summary: 'One appliance and its recoveries of all time',
    action: 'appliances:read',
    answer: applianceHistorySchema,
  },
  {
    path: '/api/technicians/{id}',
    summary: 'One technician against like jobs of colleagues, month by month and since each coaching',
    action: 'technician:read',
    answer: technicianPersonSchema,
  },
  {
    path: '/api/recoveries/{id}',
    summary: 'One record',
    action: 'records:read',
    answer: recordSchema,
  },
  {
    path: '/api/recoveries/{id}/history',
    summary: 'Every change of a record, newest first',
    action: 'records:read',
    answer: recordHistorySchema,
  },
  { path: '/api/imports', summary: 'Imports, newest first', action: 'imports:manage', answer: importListSchema },
  {
    path: '/api/imports/{id}',
    summary: 'How far an import is and what came of it',
    action: 'imports:manage',
    answer: importSchema,
  },
  {
    path: '/api/imports/{id}/rejected.csv',
    summary: 'The refused rows as they came, with their reasons',
    action: 'imports:manage',
    answer: 'text/csv',
  },
  {
    path: '/api/work',
    summary: 'How much background work is waiting or under way',
    action: 'records:read',
    answer: z.object({ pending: z.int().nonnegative() }),
  },
  { path: '/api/health', summary: 'Whether the database answers', action: null, answer: health },
  { path: '/api/openapi.json', summary: 'This document', action: null, answer: z.record(z.string(), z.unknown()) },
];
