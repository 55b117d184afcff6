import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import type { GlossaryTerm } from './term';

/** The words with which figures are judged. */
export const STATISTICS = [
  {
    id: 'like-jobs',
    name: 'Like jobs',
    meaning: `Recoveries of the same refrigerant from the same category of appliance, over the company’s whole record. With fewer than ${LEAST_LIKE_JOBS} of them nothing is said about any.`,
    source: { standing: 'rule of this product', text: 'So that like stands against like' },
  },
  {
    id: 'quartiles',
    name: 'Quartiles',
    also: ['middle half', 'lower quartile', 'upper quartile'],
    unit: 'per cent of the full charge',
    meaning:
      'Like jobs stand in order of their yield; a quarter lies below the lower quartile, a quarter above the upper, the middle half between them. They hold still when some records are wrong.',
    source: {
      standing: 'published work',
      text: 'Hyndman and Fan, The American Statistician 50 (1996) 361–365, definition 7',
    },
  },
  {
    id: 'far-below-like-jobs',
    name: 'Far below like jobs',
    also: ['low recovery', 'lower fence'],
    meaning:
      'The yield lies more than one and a half times the width of the middle half below the lower quartile of like jobs. A reason to look, not a finding: a system that had leaked looks the same as a pull cut short.',
    source: {
      standing: 'published work',
      text: 'J. W. Tukey, Exploratory Data Analysis, Addison-Wesley 1977, chapter 2',
    },
  },
  {
    id: 'flagged',
    name: 'Flagged',
    also: ['flag', 'needs a look'],
    meaning:
      'The record has at least one open flag of certainty 50% or more that speaks against the recovery or the record. A flag that says only that the system came short does not count: that is no fault. A decided flag counts no longer.',
    source: { standing: 'rule of this product', text: 'The page “How we judge” has every rule' },
  },
  {
    id: 'certainty',
    name: 'Certainty',
    unit: 'per cent',
    meaning:
      'How likely it is that the record is what the flag says: of ten flags with a certainty of 80%, about eight turn out to be so. What is decided on flags shows how often that holds.',
    source: { standing: 'rule of this product', text: 'Bayes’ theorem, with what the company’s own records show' },
  },
  {
    id: 'year-before',
    name: 'A year before',
    also: ['like for like', 'compared'],
    meaning:
      'A period is laid beside the same months a year earlier. Of a month that is still running only the same days are compared, and months before the first record are left out on both sides.',
    source: { standing: 'rule of this product', text: 'So that like stands against like' },
  },
  {
    id: 'likely-range',
    name: 'Likely range',
    also: ['95% interval', 'no clear change'],
    meaning:
      'How far a change can be believed. Jobs differ much in size, so two sums of them differ by chance alone; the range is where the true change lies in 95 of 100 such comparisons. If it holds “no change”, there is no clear change.',
    source: {
      standing: 'published work',
      text: 'Compound Poisson sum: S. M. Ross, Introduction to Probability Models, section 5.4.2',
    },
  },
  {
    id: 'season',
    name: 'Season and trend',
    unit: 'factor of the trend, and mass a month',
    meaning:
      'The trend is where the months go when the season is taken out; the season is what comes back each year, as a factor of the trend. Large plant is left out, since when a chiller comes up is no season.',
    source: {
      standing: 'published work',
      text: 'Cleveland, Cleveland, McRae and Terpenning, Journal of Official Statistics 6 (1990) 3–73',
    },
  },
  {
    id: 'control-limits',
    name: 'Control limits',
    also: ['control chart', 'unusual month', 'usual band'],
    unit: 'mass a month',
    meaning:
      'Where a usual month falls around trend and season: three standard deviations, as the months’ own moving ranges tell them. One month outside, or eight on one side, is worth a cause; a month inside needs none.',
    source: {
      standing: 'published work',
      text: 'NIST/SEMATECH e-Handbook of Statistical Methods, 6.3.2.2; Western Electric 1956 for eight on one side',
    },
  },
  {
    id: 'routine-jobs',
    name: 'Routine jobs and large plant',
    unit: '100 lb full charge divides them',
    meaning:
      'Jobs of 100 lb full charge and more are large plant: a few of them make most of a year’s mass. All others are routine.',
    source: { standing: 'rule of this product', text: 'The limit of the season’s chart' },
  },
  {
    id: 'expected-mass',
    name: 'Expected of the same jobs',
    also: ['case mix', 'expected yield', 'effect'],
    unit: 'points of full charge',
    meaning:
      'What an average colleague would have brought from just these jobs, by category and job type. The person judged is left out of the average, so that nobody sets his own standard.',
    source: {
      standing: 'published work',
      text: 'Indirect standardisation: Breslow and Day, Statistical Methods in Cancer Research II, IARC 1987, chapter 2',
    },
  },
  {
    id: 'funnel',
    name: 'Funnel',
    meaning:
      'Each technician stands by the amount of his work and by his distance from what was expected. The lines show how far chance alone scatters somebody with so many jobs: wide for few, narrow for many.',
    source: { standing: 'published work', text: 'D. J. Spiegelhalter, Statistics in Medicine 24 (2005) 1185–1202' },
  },
  {
    id: 'running-month',
    name: 'Running month',
    also: ['unfinished month'],
    meaning: 'A month that is not over. It is drawn hatched and never compared with a whole one.',
    source: { standing: 'rule of this product', text: 'Months are of the company’s local date' },
  },
] as const satisfies readonly GlossaryTerm[];
