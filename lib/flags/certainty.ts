/** From this certainty on a flag counts as flagged in figures. No imports: the browser reads this too. */
export const SURE_ENOUGH = 0.5;
