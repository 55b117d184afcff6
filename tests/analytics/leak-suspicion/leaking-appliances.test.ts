import { expect, test } from 'vitest';
import {
  type LeakModel,
  leakChance,
  leakingAppliances,
  type VisitEvidence,
  visitFactor,
} from '@/analytics/leak-suspicion/leaking-appliances';
import { seededRandom } from '@/seed/random';
import { given } from '../statistics/given';

const MODEL: LeakModel = { leaking: 0.05, shortWhenLeaking: 0.7, shortOtherwise: { service: 0.1, repair: 0.35 } };
const short = (kind: string): VisitEvidence => ({ kind, short: 1 - 1e-6, usualShare: 0.2 });
const whole = (kind: string): VisitEvidence => ({ kind, short: 1e-6, usualShare: 0.2 });

// Worked by hand for visits that leave no doubt: 0.7 ÷ 0.1 for a short one, 0.3 ÷ 0.9 for one that was not.
test('a visit without doubt weighs as the two shares do', () => {
  expect(visitFactor(short('service'), 0.7, 0.1)).toBeCloseTo(7, 4);
  expect(visitFactor(whole('service'), 0.7, 0.1)).toBeCloseTo(1 / 3, 4);
});

test('a visit that tells nothing beyond what is usual changes nothing', () => {
  expect(visitFactor({ kind: 'service', short: 0.2, usualShare: 0.2 }, 0.7, 0.1)).toBeCloseTo(1, 9);
});

// Odds 1 ÷ 19 times 7 × 7 × 1 ÷ 3, worked by hand.
test('factors of visits multiply', () => {
  const odds = (1 / 19) * 7 * 7 * (1 / 3);
  const chance = leakChance([short('service'), short('service'), whole('service')], MODEL);
  expect(chance).toBeCloseTo(odds / (1 + odds), 3);
});

test('a short unit weighs less at a job where units often come short', () => {
  expect(leakChance([short('repair'), short('repair')], MODEL)).toBeLessThan(
    leakChance([short('service'), short('service')], MODEL),
  );
});

test('finds the shares that were planted', () => {
  const random = seededRandom('leaking and other appliances');
  const truth: boolean[] = [];
  const appliances = Array.from({ length: 1500 }, () => {
    const leaks = random.chance(0.08);
    truth.push(leaks);
    return Array.from({ length: 6 }, () => (random.chance(leaks ? 0.7 : 0.12) ? short('service') : whole('service')));
  });
  const { model, chances } = given(leakingAppliances(appliances));
  expect(model.leaking).toBeCloseTo(0.08, 1);
  expect(model.shortWhenLeaking).toBeCloseTo(0.7, 1);
  expect(model.shortOtherwise.service).toBeCloseTo(0.12, 1);
  // Said probabilities hold: among those said to leak with p, about p do.
  const expected = chances.reduce((sum, chance) => sum + chance, 0);
  expect(Math.abs(expected - truth.filter(Boolean).length)).toBeLessThan(25);
});

test('a company without leaks gets none', () => {
  const random = seededRandom('no leaks at all');
  const appliances = Array.from({ length: 300 }, () =>
    Array.from({ length: 5 }, () => (random.chance(0.1) ? short('service') : whole('service'))),
  );
  const { chances } = given(leakingAppliances(appliances));
  expect(chances.filter((chance) => chance >= 0.8).length).toBeLessThanOrEqual(2);
});

test('needs 20 appliances', () => {
  expect(leakingAppliances([[short('service')]])).toEqual({ enough: false, needs: 20, has: 1, of: 'appliances' });
});
