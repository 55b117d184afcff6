/** Fewer like jobs than this, and nothing is said about any of them. No imports: the browser reads this too. */
export const LEAST_LIKE_JOBS = 20;
