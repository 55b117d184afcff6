/**
 * What a method gives that needs a least amount of data: its value, or how many of what it needs and how many there
 * are. A reader is told "needs 12 months, has 7"; never a zero, a blank or a wide guess.
 */
export type Estimate<Value> = { enough: true; value: Value } | TooFew;
export type TooFew = { enough: false; needs: number; has: number; of: string };

/** A value that the data carry. */
export const enough = <Value>(value: Value): Estimate<Value> => ({ enough: true, value });

/** Not enough data: `needs` of `of` ("values", "full months"), and only `has` are there. */
export const tooFew = (needs: number, has: number, of: string): TooFew => ({ enough: false, needs, has, of });
