import { createReadStream } from 'node:fs';
import { z } from 'zod';
import { readCompany } from '@/db/client';
import { defineContract } from '@/lib/api/contract';
import { fieldErrors } from '@/lib/api/problem';
import { getRoute, json, withViewer } from '@/lib/api/route';
import { scopeOf } from '@/lib/auth/viewer';
import { additionImportListSchema, additionImportSchema } from '@/lib/charge-additions/file/contract';
import { takeInAdditions } from '@/lib/charge-additions/file/take-in';
import { listAdditionImports } from '@/lib/charge-additions/file/undo';
import { badInput, tooLarge } from '@/lib/errors';
import { mappingSchema } from '@/lib/imports/contract';
import { withReceivedForm } from '@/lib/imports/multipart';

const MOST_MB = 10;

const list = defineContract({
  path: '/api/charge-additions/imports',
  action: 'leaks:read',
  query: z.object({}),
  response: additionImportListSchema,
});

/** Files of charge additions that were taken in, the newest first. */
export const GET = getRoute(list, (_query, viewer) => readCompany(scopeOf(viewer), listAdditionImports));

/** What a person may tell about such a file; its columns go by their names. */
const toldSchema = mappingSchema.omit({ columns: true, vacuumUnit: true, overwriteCorrections: true });

const toldOf = (text: string | undefined): z.output<typeof toldSchema> => {
  if (!text?.trim()) return {};
  const json = z
    .string()
    .transform((value, context) => {
      try {
        return JSON.parse(value) as unknown;
      } catch {
        context.addIssue({ code: 'custom', message: 'This is not JSON.' });
        return z.NEVER;
      }
    })
    .pipe(toldSchema)
    .safeParse(text);
  if (json.success) return json.data;
  throw badInput(
    fieldErrors(json.error).map(({ path, message }) => ({ path: path ? `mapping.${path}` : 'mapping', message })),
  );
};

const dryRunOf = (text: string | undefined): boolean => {
  if (text === undefined || text === '' || text === 'false') return false;
  if (text === 'true') return true;
  throw badInput([{ path: 'dryRun', message: 'Expected true or false.' }]);
};

/** Takes a file of charge additions in while the person waits; with dryRun=true it only says what would come of it. */
export const POST = withViewer('leaks:write', (request, viewer) =>
  withReceivedForm(request, async ({ file, fields }) => {
    if (file.size > MOST_MB * 1024 * 1024) throw tooLarge(`The file is larger than ${MOST_MB} MB. Send it in parts.`);
    const options = { told: toldOf(fields.get('mapping')), dryRun: dryRunOf(fields.get('dryRun')) };
    const taken = await takeInAdditions(viewer, { ...file, open: () => createReadStream(file.path) }, options);
    return json(additionImportSchema.parse(taken), options.dryRun ? 200 : 201);
  }),
);
