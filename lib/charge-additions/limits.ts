/** Most characters of a note on an addition, and of why one is corrected. No imports: the browser reads this too. */
export const ADDITION_NOTE_LENGTH = 500;

/** Most characters of the contractor's own number of an addition. */
export const ADDITION_REF_LENGTH = 100;

/** No single addition is heavier: kilograms. */
export const LARGEST_ADDITION_KG = 100_000;
