/** Runs once when a server process starts, before it takes requests. */
export const register = async (): Promise<void> => {
  if (process.env.NEXT_RUNTIME !== 'nodejs' || process.env.NEXT_PHASE === 'phase-production-build') return;
  const { refuseStrongRole } = await import('./lib/jobs/refuse-strong-role');
  await refuseStrongRole();
  const { env } = await import('./lib/env');
  if (env().TAREBOOK_WORKER !== 'inside') return;
  const { startAllWork } = await import('./analytics/tasks');
  startAllWork();
};
