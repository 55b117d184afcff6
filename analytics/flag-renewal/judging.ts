import { createHash } from 'node:crypto';
import type { Baselines } from '@/analytics/judging/baselines/baselines';
import { defaultSettings, type JudgingSettings } from '@/analytics/judging/settings';

/** Raised whenever the rules change: every company's flags are then judged anew. */
const VERSION = 1;

const fingerprint = ({ today: _moves, ...settings }: JudgingSettings): string =>
  createHash('sha256').update(JSON.stringify(settings)).digest('hex').slice(0, 12);

/** Version and settings of the judging, the day left out; another one judges everything anew. */
export const JUDGING = `${VERSION} ${fingerprint(defaultSettings('2000-01-01'))}`;

/** What is usual at a company and how that was judged, as it is kept: so that flags can be made again. */
export type KeptContent = { settings: JudgingSettings; usual: Baselines };
