import { defineConfig } from 'drizzle-kit';

// Only `drizzle-kit generate` is used: it writes SQL to be read before it is committed.
// Migrations are run by db/migrate.ts; `push` and `migrate` of the kit lose policies or errors.
export default defineConfig({
  dialect: 'postgresql',
  schema: ['./db/schema/*.ts', './db/views/*.ts'],
  out: './db/migrations',
  migrations: { prefix: 'index' },
});
