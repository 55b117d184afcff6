const numbered = (prefix: string, count: number): string[] =>
  Array.from({ length: count }, (_, index) => `${prefix} ${index + 1}`);

/** Companies that judging may be tuned on. */
export const TUNING_SEEDS: readonly string[] = numbered('tuning', 20);
/** Companies that only measure. Nothing is ever chosen by them. */
export const PROOF_SEEDS: readonly string[] = numbered('proof', 20);
