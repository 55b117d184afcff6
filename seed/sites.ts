import { SITE_KINDS, type SiteKind } from './equipment';
import { STREETS, siteNames } from './names';
import { BRANCH_SHARES, type Plan } from './plan';
import type { Random } from './random';

/** A customer's place that a branch looks after. */
export type Site = { name: string; kind: SiteKind; branch: string; address: string };

const SHARES: Record<SiteKind, number> = {
  home: 0.3,
  office: 0.17,
  store: 0.13,
  restaurant: 0.14,
  supermarket: 0.07,
  school: 0.07,
  clinic: 0.07,
  plant: 0.05,
};

/** The sites of the company, spread over its branches. */
export const makeSites = (plan: Plan, random: Random): Site[] => {
  const unused = Object.fromEntries(SITE_KINDS.map((kind) => [kind, siteNames(kind)]));
  const numbers = new Map<string, number>();
  return Array.from({ length: plan.sites }, (_, i): Site => {
    // The first of each kind are given out in turn, so that even a small company has every kind.
    const kind = SITE_KINDS[i] ?? random.pick(SITE_KINDS, (k) => SHARES[k]);
    const branch = random.pick(plan.branches, (b) => BRANCH_SHARES[plan.branches.indexOf(b)] ?? 1);
    const names = unused[kind] ?? [];
    const base = names.splice(random.integer(0, Math.max(names.length - 1, 0)), 1)[0] ?? random.pick(siteNames(kind));
    const count = (numbers.get(base) ?? 0) + 1;
    numbers.set(base, count);
    const address = `${random.integer(3, 980)} ${random.pick(STREETS)} Street, ${branch}`;
    return { name: count > 1 ? `${base} ${count}` : base, kind, branch, address };
  });
};
