/**
 * For the statements of this transaction. Room to sort and hash a whole file; no nested loops, because statistics know
 * nothing of the rows that an import has just written, and a loop over them takes minutes where a hash join takes a
 * moment; no compiling of statements that run once.
 */
export const FOR_MANY_ROWS = "set local work_mem = '64MB'; set local enable_nestloop = off; set local jit = off";

/** From so many changed records on the planner must be told, or the first screen afterwards waits too long. */
export const REFRESH_FROM_ROWS = 1_000;

/** Tells the planner of the rows that this transaction has written or taken away. */
export const REFRESH_STATISTICS = 'select refresh_statistics()';
