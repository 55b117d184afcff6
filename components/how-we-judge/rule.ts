import type { FlagRule } from '@/lib/vocabulary';

/** A rule in plain words. */
export type JudgingRule = { rule: FlagRule; looksAt: string; doesNotMean: string; source: string };
