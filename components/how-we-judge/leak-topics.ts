import {
  FALSE_SITES,
  LEAST_SHORT_VISITS,
  LEAST_VISITS,
  SUSPECTED_FROM,
  VISIT_MONTHS,
} from '@/analytics/leak-suspicion/limits';
import { formatPercent } from '@/lib/format';
import type { Topic } from './topics-section';

/** How leaking systems are suspected and leak rates are computed, in plain words. */
export const LEAK_TOPICS: readonly Topic[] = [
  {
    name: 'Is this unit losing refrigerant?',
    looksAt: `Each visit of the last ${VISIT_MONTHS} months tells how likely it is that the unit came short of charge. A unit that comes short again and again, beyond what units like it do, is suspected from ${formatPercent(SUSPECTED_FROM)} on. It takes ${LEAST_VISITS} visits, ${LEAST_SHORT_VISITS} of them short.`,
    doesNotMean: 'It is nothing against whoever did the jobs, and no proof of a leak: look for one.',
    source: 'Two groups of units fitted by expectation and maximisation: Dempster, Laird & Rubin, JRSS B 39, 1977.',
  },
  {
    name: 'Is this site worse than others?',
    looksAt: `The number of suspected units beside the number that so many units would have by chance, allowing for how many sites are looked at (of those pointed out, at most ${formatPercent(FALSE_SITES)} should be so by luck).`,
    doesNotMean: 'A site with old equipment has more leaks whoever keeps it.',
    source: 'Binomial tail; Benjamini & Hochberg, JRSS B 57, 1995.',
  },
  {
    name: 'What is its leak rate?',
    looksAt:
      'Refrigerant added, over the full charge: annualizing (as if the loss since the last addition went on for a year) or rolling average (all additions of the last 365 days). One method for all appliances of a site.',
    doesNotMean:
      'Additions at installation, after a retrofit or for the season are no leak and stay out. The figure is arithmetic on what was written down; the regulation and the authority decide.',
    source: '40 CFR 82.152 (leak rate), 82.157; 40 CFR part 84 subpart C.',
  },
];
