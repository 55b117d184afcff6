import { explainVerdict } from '@/analytics/technician-comparison/explain-verdict';
import type { HABITS, Habits } from '@/analytics/technician-comparison/habits';
import type { Ranged, TechnicianResult } from '@/analytics/technician-comparison/technician-result';
import type { TechnicianRow } from './contract';

const POINTS = 100;
const round = (value: number, digits: number): number => Number(value.toFixed(digits));
const toGram = (kg: number): number => round(kg, 3);
const rounded = (own: Ranged | null, digits = 2): Ranged | null =>
  own && { value: round(own.value, digits), low: round(own.low, digits), high: round(own.high, digits) };

const inPoints = (habits: Habits): TechnicianRow['habits'] => {
  const toPoints = (name: (typeof HABITS)[number]) => {
    const { costs, ...own } = habits[name];
    return { ...own, costs: costs === null ? null : round(POINTS * costs, 2) };
  };
  return {
    'hold made': toPoints('hold made'),
    'level reached': toPoints('level reached'),
    'weighed twice': toPoints('weighed twice'),
    'written the same day': toPoints('written the same day'),
  };
};

/** What the comparison says of a technician, as it goes out: points of nameplate, masses to the gram, the reason in words. */
export const judgementRow = (name: string, own: TechnicianResult) => ({
  observedMass: toGram(own.observedMassKg),
  expectedMass: toGram(own.expectedMassKg),
  effect: own.effect && round(own.effect.value, 2),
  low: own.effect && round(own.effect.low, 2),
  high: own.effect && round(own.effect.high, 2),
  look: own.look,
  verdict: own.verdict,
  restsOn: own.restsOn,
  why: explainVerdict(name, own),
  method: own.method,
  judgedJobs: own.judgedJobs,
  weakShare: own.weakShare,
  judgedFrom: own.judgedFrom,
  leftOut: own.leftOut,
  plainEffect: rounded(own.plainEffect),
  shrunkEffect: rounded(own.shrunkEffect),
  chance: own.p,
  adjustedChance: own.adjustedP,
  shallowerKpa: rounded(own.shallowerKpa, 3),
  earlyStops: own.earlyStops,
  funnel: own.funnel,
  scale: own.scale,
  workChange: own.workChange,
  habits: inPoints(own.habits),
  habitBehind: own.habitBehind,
  trend: rounded(own.trend),
  learning: own.learning && {
    first: POINTS * own.learning.first,
    since: POINTS * own.learning.since,
    gain: POINTS * own.learning.gain,
    low: POINTS * own.learning.low,
    high: POINTS * own.learning.high,
  },
  run: own.run,
});
