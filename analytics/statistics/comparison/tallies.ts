type Tally = { count: number; sum: number };

const NONE: Tally = { count: 0, sum: 0 };

/** Numbers counted and summed by key. */
class Tallies {
  readonly #all = new Map<string, Tally>();

  add(key: string, value: number): void {
    const { count, sum } = this.of(key);
    this.#all.set(key, { count: count + 1, sum: sum + value });
  }

  of(key: string): Tally {
    return this.#all.get(key) ?? NONE;
  }
}

/** Counts and sums by key, from which any one owner's own part can be taken away. */
export class TalliesWithout {
  readonly #all = new Tallies();
  readonly #own = new Tallies();

  add(key: string, owner: string, value: number): void {
    this.#all.add(key, value);
    this.#own.add(JSON.stringify([key, owner]), value);
  }

  /** All rows of the key but the owner's. */
  without(key: string, owner: string): Tally {
    const all = this.#all.of(key);
    const own = this.#own.of(JSON.stringify([key, owner]));
    const count = all.count - own.count;
    return { count, sum: count === 0 ? 0 : all.sum - own.sum };
  }
}
