/** How the list of low recoveries can be ordered. No imports: the browser reads this too. */
export const LOW_ORDERS = ['extreme', 'newest'] as const;
export type LowOrder = (typeof LOW_ORDERS)[number];
