import type { GlossaryTerm } from './term';

/** Leaks: what was added, what that comes to, and what visits make suspect. */
export const LEAKS = [
  {
    id: 'charge-addition',
    name: 'Charge addition',
    also: ['top-up', 'recharge'],
    unit: 'lb, lb-oz, oz, kg or g',
    meaning:
      'Refrigerant put into an appliance on a day, with why. The first charge at installation, a retrofit and what a season had taken out count for no leak; a top-up does, and so does an addition of which nobody said why.',
    source: { standing: 'rule', text: '40 CFR 82.157(b)' },
  },
  {
    id: 'annualizing-method',
    name: 'Annualizing method',
    unit: 'per cent of the full charge a year',
    meaning:
      'Added ÷ full charge × 365 ÷ the days since refrigerant was last added, 365 days at most. Without an earlier addition the 365 days are taken, which gives the least rate that is possible.',
    source: { standing: 'rule', text: '40 CFR 82.152, “leak rate”, annualizing method' },
  },
  {
    id: 'rolling-average-method',
    name: 'Rolling average method',
    unit: 'per cent of the full charge',
    meaning:
      'All that was added in the last 365 days ÷ full charge; when a follow-up test within those days showed the leaks repaired, only what came after it.',
    source: { standing: 'rule', text: '40 CFR 82.152, “leak rate”, rolling average method' },
  },
  {
    id: 'leak-trigger',
    name: 'Trigger of a leak repair',
    unit: 'per cent of the full charge a year',
    meaning:
      'The leak rate above which leaks must be repaired: 20% commercial refrigeration, 30% industrial process refrigeration, 10% comfort cooling and other. It holds from 50 lb of an ozone-depleting refrigerant, and since 1 January 2026 from 15 lb of an HFC or a substitute with a GWP above 53, residential and light commercial air conditioning and heat pumps left out. A rate within twice its own uncertainty of the trigger is called close to it.',
    source: { standing: 'rule', text: '40 CFR 82.157(c) and 84.106' },
  },
  {
    id: 'chronic-leaker',
    name: 'Chronic leaker',
    meaning:
      'An appliance that was given 125% of its full charge or more in a calendar year for leaks. It is reported by 1 March of the next year.',
    source: { standing: 'rule', text: '40 CFR 82.157(j)' },
  },
  {
    id: 'follow-up-test',
    name: 'Follow-up verification test',
    also: ['leaks verified'],
    meaning: 'A test after a repair, once the appliance runs again, that shows whether the leaks are gone.',
    source: { standing: 'rule', text: '40 CFR 82.157(e)' },
  },
  {
    id: 'leak-suspicion',
    name: 'Leak suspicion',
    unit: 'probability in per cent',
    meaning:
      'How likely an appliance leaks, from its visits of the last 36 months. Each yield says how likely the unit came short; odds of leaking are multiplied, visit by visit, by how much more often leaking units come short at such jobs than others do. Both shares and the share of leaking units are fitted to all units of the company. Nothing is said from fewer than three visits, or from a single short one. A reason to look, not a finding.',
    source: {
      standing: 'published work',
      text: 'Two latent classes fitted by EM: Dempster, Laird & Rubin, JRSS B 39 (1977); McLachlan & Peel, Finite Mixture Models (2000)',
    },
  },
] as const satisfies readonly GlossaryTerm[];
