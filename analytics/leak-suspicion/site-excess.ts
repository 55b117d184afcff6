import { sum } from 'simple-statistics';
import { requireWhole } from '@/analytics/statistics/checked';
import { benjaminiHochberg } from '@/analytics/statistics/comparison/adjusted-p';
import { binomialCdf } from '@/analytics/statistics/distributions/binomial';
import { FALSE_SITES } from './limits';

/** Appliances of one site of which something can be said, and how many of them are suspected. */
export type SiteCount = { judged: number; suspected: number };

export type SiteExcess = {
  /** How many would be suspected if the site were like all others. */
  expected: number;
  /** Probability of so many or more if it were, adjusted for the number of sites. */
  adjustedP: number;
  /** More than chance explains, with at most one in ten of the sites pointed out so by chance. */
  look: boolean;
};

/**
 * Whether more appliances of a site are suspected than of other sites, chance allowed for: an upper binomial tail at the
 * share of all other sites, adjusted over all sites by Benjamini & Hochberg (1995), JRSS B 57, 289-300. In the order of
 * the sites. Throws RangeError when more are suspected than judged.
 */
export const siteExcess = (sites: readonly SiteCount[]): SiteExcess[] => {
  for (const { judged, suspected } of sites) {
    requireWhole(suspected, 'Suspected appliances');
    requireWhole(judged, 'Judged appliances', suspected);
  }
  const all = { judged: sum(sites.map(({ judged }) => judged)), suspected: sum(sites.map((site) => site.suspected)) };
  const chances = sites.map(({ judged, suspected }) => {
    const others = all.judged - judged;
    // Half an appliance to either side, so that no share is impossible.
    const share = (all.suspected - suspected + 0.5) / (others + 1);
    return { share, p: suspected === 0 ? 1 : 1 - binomialCdf(suspected - 1, judged, share) };
  });
  const adjusted = benjaminiHochberg(chances.map(({ p }) => Math.min(1, Math.max(0, p))));
  return sites.map(({ judged }, index) => {
    const adjustedP = adjusted[index] ?? 1;
    return { expected: judged * (chances[index]?.share ?? 0), adjustedP, look: adjustedP <= FALSE_SITES };
  });
};
