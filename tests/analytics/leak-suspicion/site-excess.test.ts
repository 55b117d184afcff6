import { expect, test } from 'vitest';
import { siteExcess } from '@/analytics/leak-suspicion/site-excess';
import { seededRandom } from '@/seed/random';

const plain = Array.from({ length: 200 }, (_, index) => ({ judged: 4, suspected: index % 10 === 0 ? 1 : 0 }));

// Upper binomial tail by hand: the others' share is (20 + 0.5) ÷ 801.
test('expects of a site what all others have', () => {
  const [site] = siteExcess([{ judged: 4, suspected: 3 }, ...plain]);
  expect(site?.expected).toBeCloseTo((4 * 20.5) / 801, 12);
  expect(site?.look).toBe(true);
});

test('one suspected appliance is no excess among many sites', () => {
  expect(siteExcess(plain).filter(({ look }) => look)).toHaveLength(0);
});

test('a site without a suspected appliance is never pointed out', () => {
  expect(siteExcess([{ judged: 0, suspected: 0 }])[0]).toMatchObject({ adjustedP: 1, look: false });
});

// Benjamini & Hochberg (1995): where no site differs, any discovery at all comes about with at most the rate chosen.
test('where no site differs, few companies get one pointed out', () => {
  const random = seededRandom('sites that are alike');
  const companies = Array.from({ length: 200 }, () =>
    siteExcess(
      Array.from({ length: 150 }, () => {
        const judged = random.integer(1, 8);
        return { judged, suspected: Array.from({ length: judged }, () => random.chance(0.06)).filter(Boolean).length };
      }),
    ).some(({ look }) => look),
  );
  expect(companies.filter(Boolean).length / companies.length).toBeLessThanOrEqual(0.13);
});

test('more suspected than judged is refused', () => {
  expect(() => siteExcess([{ judged: 1, suspected: 2 }])).toThrow(RangeError);
});
