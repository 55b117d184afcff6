import { FIRST_JOBS_LEFT_OUT, LEAST_JOBS } from '@/analytics/statistics/comparison/who-is-judged';
import { COMPARISON_SETTINGS } from '@/analytics/technician-comparison/settings';
import { formatPercent } from '@/lib/format';
import type { Topic } from './topics-section';

const { falseDiscoveryRate, leastEffect, leastTechnicians } = COMPARISON_SETTINGS;

/** How technicians are compared, in plain words. */
export const TECHNICIAN_TOPICS: readonly Topic[] = [
  {
    name: 'What would like jobs have given?',
    looksAt:
      'Each job stands against what colleagues got out of the same kind of system on the same kind of job. His own jobs are left out of that measure, so nobody sets his own standard. The difference is told in points of nameplate with its likely range: in nineteen of twenty cases the true figure lies inside.',
    doesNotMean:
      'A system that had leaked before anyone came is no shortfall. Yield and final vacuum together tell how likely that is, and such a job then weighs little or nothing.',
    source:
      'Case mix: Spiegelhalter, Statistics in Medicine 24, 2005; mixtures: Dempster, Laird & Rubin, JRSS B 39, 1977.',
  },
  {
    name: 'When is somebody called below?',
    looksAt: `When his full pulls come out clearly lower than colleagues’ and the final vacuum bears it out, or when clearly more of his pulls look stopped early than is usual. Both must be more than luck, allowing for the size of the crew (of those called below, at most ${formatPercent(falseDiscoveryRate)} should be so by luck), and more than ${formatPercent(leastEffect)} of the full charge.`,
    doesNotMean:
      '“Worth a look” is one sign alone. It is for the trainer’s eyes and says nothing yet. Nobody is ranked: ranges overlap, and an order among people would be noise.',
    source: 'Benjamini & Hochberg, JRSS B 57, 1995; Goldstein & Spiegelhalter, JRSS A 159, 1996.',
  },
  {
    name: 'Who is not judged?',
    looksAt: `Whoever has fewer than ${LEAST_JOBS} jobs that colleagues did too, and nobody in his first ${FIRST_JOBS_LEFT_OUT} jobs. With fewer than ${leastTechnicians} technicians it is not known how much sound people differ, so nobody is called below or above.`,
    doesNotMean: 'Too few jobs is neither good nor bad: the records cannot tell.',
    source: 'Common practice; the least numbers are ours.',
  },
  {
    name: 'The scale or the work?',
    looksAt:
      'When all pulls come out lower by the same share from a day on and the final vacuum stays as deep as before, the scale is in doubt: those months are set aside and the scale should be checked. When the vacuum follows, the work has changed, and only the jobs since then count.',
    doesNotMean: 'A scale in doubt says nothing about the person who used it.',
    source: 'Cumulative sums: Page, Biometrika 41, 1954; NIST/SEMATECH e-Handbook 6.3.2.3.',
  },
  {
    name: 'Did the coaching help?',
    looksAt:
      'Jobs since the day of the coaching stand against those before, ten on either side at least. The range holds however often somebody looks, so nobody has to wait for an appointed day.',
    doesNotMean: 'No clear change is not “it failed”: small changes take some hundred jobs to show.',
    source:
      'Mixture sequential test: Robbins, Annals of Mathematical Statistics 41, 1970; Johari et al., Operations Research 70, 2022.',
  },
  {
    name: 'What about the habits?',
    looksAt:
      'How often a hold is made, the level is reached, the cylinder is weighed before and after, beside colleagues. Where jobs with and without a habit differ clearly, the page says how many points the difference makes.',
    doesNotMean: 'A habit that goes with the gap need not be its cause. It is where to begin to look.',
    source: 'Common practice.',
  },
];
