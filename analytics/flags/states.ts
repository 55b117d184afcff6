/** Which flags a list shows. No imports: the browser reads this too. */
export const FLAG_STATES = ['open', 'decided', 'all'] as const;
export type FlagState = (typeof FLAG_STATES)[number];
