const shown = (value: unknown): string => (typeof value === 'number' ? String(value) : typeof value);

/** Throws a RangeError that names the first value which is no finite number. */
export const requireFinite = (values: readonly number[], name: string): void => {
  const at = values.findIndex((value) => !Number.isFinite(value));
  if (at >= 0) throw new RangeError(`${name} must be finite numbers: number ${at + 1} is ${shown(values[at])}`);
};

/** Throws a RangeError unless the value is a finite number. */
export const requireFiniteNumber = (value: number, name: string): void => {
  if (!Number.isFinite(value)) throw new RangeError(`${name} must be a finite number, not ${shown(value)}`);
};

/** Throws a RangeError unless the value is a finite number above zero. */
export const requirePositive = (value: number, name: string): void => {
  if (!(Number.isFinite(value) && value > 0)) throw new RangeError(`${name} must be above 0, not ${shown(value)}`);
};

/** Throws a RangeError unless the value is a finite number of at least zero. */
export const requireNotNegative = (value: number, name: string): void => {
  if (!(Number.isFinite(value) && value >= 0)) throw new RangeError(`${name} must be at least 0, not ${shown(value)}`);
};

/** Throws a RangeError unless the value is a whole number of at least `least`. */
export const requireWhole = (value: number, name: string, least = 0): void => {
  if (!(Number.isInteger(value) && value >= least)) {
    throw new RangeError(`${name} must be a whole number from ${least} up, not ${shown(value)}`);
  }
};

/** Throws a RangeError unless 0 <= value <= 1. */
export const requireProbability = (value: number, name: string): void => {
  if (!(value >= 0 && value <= 1)) throw new RangeError(`${name} must lie between 0 and 1, not ${shown(value)}`);
};

/** Throws a RangeError unless the lists are equally long. */
export const requireSameLength = (first: readonly unknown[], second: readonly unknown[], names: string): void => {
  if (first.length !== second.length) {
    throw new RangeError(`${names} must be equally many: ${first.length} and ${second.length}`);
  }
};
