import type { Columns } from './columns';

const PRIOR_JOBS = 20;

/** Sums of chances by cell; shares of few jobs are drawn towards those of the job type, these towards all. */
export class ShortShares {
  readonly #columns: Columns;
  readonly #sum: Float64Array;
  readonly #jobs: Float64Array;
  readonly #typeSum: Float64Array;
  readonly #typeJobs: Float64Array;
  readonly #typeOf: Int32Array;
  #all = 0;
  #allJobs = 0;

  constructor(columns: Columns) {
    this.#columns = columns;
    this.#sum = new Float64Array(columns.cells);
    this.#jobs = new Float64Array(columns.cells);
    this.#typeSum = new Float64Array(columns.jobTypes);
    this.#typeJobs = new Float64Array(columns.jobTypes);
    this.#typeOf = new Int32Array(columns.cells);
  }

  add(at: number, chance: number): void {
    const cell = this.#columns.cell[at] ?? 0;
    const type = this.#columns.jobType[at] ?? 0;
    this.#typeOf[cell] = type;
    this.#sum[cell] = (this.#sum[cell] ?? 0) + chance;
    this.#jobs[cell] = (this.#jobs[cell] ?? 0) + 1;
    this.#typeSum[type] = (this.#typeSum[type] ?? 0) + chance;
    this.#typeJobs[type] = (this.#typeJobs[type] ?? 0) + 1;
    this.#all += chance;
    this.#allJobs += 1;
  }

  /** Share of units that come short, by cell; `otherwise` where there is no job at all. */
  shares(otherwise: number): Float64Array {
    const overall = this.#allJobs > 0 ? this.#all / this.#allJobs : otherwise;
    const drawn = (sum: number, jobs: number, towards: number) => (sum + PRIOR_JOBS * towards) / (jobs + PRIOR_JOBS);
    return this.#sum.map((sum, cell) => {
      const type = this.#typeOf[cell] ?? 0;
      return drawn(sum, this.#jobs[cell] ?? 0, drawn(this.#typeSum[type] ?? 0, this.#typeJobs[type] ?? 0, overall));
    });
  }
}
