import { z } from 'zod';

const schema = z.object({
  SERVER_DATABASE_URL: z.string().min(1),
  JOB_DATABASE_URL: z.string().min(1),
  NEXTAUTH_SECRET: z.string().min(16),
  NEXTAUTH_URL: z.url(),
  /** Jobs run in the server process unless a worker process does them (`npm run worker`). */
  TAREBOOK_WORKER: z.enum(['inside', 'apart']).default('inside'),
  LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
});

export type Env = z.infer<typeof schema>;

let parsed: Env | undefined;

/** The environment of the process, checked once; throws a sentence that names what is missing. Nothing else reads process.env. */
export const env = (): Env => {
  if (parsed) return parsed;
  const result = schema.safeParse(process.env);
  if (!result.success) {
    const missing = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join('; ');
    throw new Error(`The environment is not complete (npm start sets it up): ${missing}`);
  }
  parsed = result.data;
  return parsed;
};
