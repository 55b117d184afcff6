/** Most characters of a plan and of its outcome. No imports: the browser reads this too. */
export const COACHING_LENGTH = 2000;
