/**
 * Weighted sums by group and technician, from which anybody's own part can be taken away. What is expected of a
 * technician comes from his colleagues alone, or a busy one would set the standard that he is held to.
 */
export class SumsWithout {
  readonly #people: number;
  readonly #weight: Float64Array;
  readonly #sum: Float64Array;
  readonly #groupWeight: Float64Array;
  readonly #groupSum: Float64Array;
  readonly #ownWeight: Float64Array;
  readonly #ownSum: Float64Array;
  #allWeight = 0;
  #allSum = 0;

  constructor(groups: number, people: number) {
    this.#people = people;
    this.#weight = new Float64Array(groups * people);
    this.#sum = new Float64Array(groups * people);
    this.#groupWeight = new Float64Array(groups);
    this.#groupSum = new Float64Array(groups);
    this.#ownWeight = new Float64Array(people);
    this.#ownSum = new Float64Array(people);
  }

  add(group: number, person: number, weight: number, value: number): void {
    const at = group * this.#people + person;
    const product = weight * value;
    this.#weight[at] = (this.#weight[at] ?? 0) + weight;
    this.#sum[at] = (this.#sum[at] ?? 0) + product;
    this.#groupWeight[group] = (this.#groupWeight[group] ?? 0) + weight;
    this.#groupSum[group] = (this.#groupSum[group] ?? 0) + product;
    this.#ownWeight[person] = (this.#ownWeight[person] ?? 0) + weight;
    this.#ownSum[person] = (this.#ownSum[person] ?? 0) + product;
    this.#allWeight += weight;
    this.#allSum += product;
  }

  /** Weight of colleagues' records in the group. */
  weightOfOthers(group: number, person: number): number {
    return Math.max(0, (this.#groupWeight[group] ?? 0) - (this.#weight[group * this.#people + person] ?? 0));
  }

  /** Colleagues' mean over all groups; the mean of all where nobody else has a record. */
  overall(person: number): number {
    const weight = this.#allWeight - (this.#ownWeight[person] ?? 0);
    if (weight > 1e-9) return (this.#allSum - (this.#ownSum[person] ?? 0)) / weight;
    return this.#allWeight > 0 ? this.#allSum / this.#allWeight : 0;
  }

  /** Colleagues' mean in the group, mixed with `prior` records of their mean over all groups. */
  expected(group: number, person: number, prior: number): number {
    return this.expectedTowards(group, person, prior, this.overall(person));
  }

  /** The same, mixed with `prior` records of a given mean. */
  expectedTowards(group: number, person: number, prior: number, base: number): number {
    const weight = this.weightOfOthers(group, person) + prior;
    const sum = (this.#groupSum[group] ?? 0) - (this.#sum[group * this.#people + person] ?? 0) + prior * base;
    return weight > 1e-9 ? sum / weight : base;
  }
}
