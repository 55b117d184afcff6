import type { Baselines } from '../baselines/baselines';
import type { NextWeighing } from '../neighbours/cylinder-chain';
import type { Neighbours } from '../neighbours/neighbours';
import type { JudgingSettings } from '../settings';

/** What records are judged with. */
export type Bench = { baselines: Baselines; neighbours: Neighbours; settings: JudgingSettings };

/** What is seen around one record, looked up once for all of its meanings. */
export type Seen = {
  next: NextWeighing | null;
  /** Nameplates that other visits wrote down, kg. */
  plates: number[];
  /** Share of this person's pulls that are stopped early. */
  stopsEarly: number;
};
