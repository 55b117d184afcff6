import type { JudgingRule } from './rule';

/** Rules about how a pull was done. */
export const PRACTICE_RULES: readonly JudgingRule[] = [
  {
    rule: 'level_not_reached',
    looksAt:
      'Whether the final vacuum stopped short of the required level where like pulls of the company usually reach it.',
    doesNotMean:
      'Leaks and repairs that are not major have levels of their own, and a gauge is good to about half an inch of mercury. Where the company usually stops short, single records are not flagged.',
    source: '40 CFR 82.156(a) and Table 1; (b) for small appliances.',
  },
  {
    rule: 'hold_missing',
    looksAt: 'Whether the ticket states no hold, or one of no minutes, in a year in which most tickets state one.',
    doesNotMean: 'The hold may have been made and not written down.',
    source: 'No minutes are in the rule; that trapped refrigerant shows only while one waits is common practice.',
  },
  {
    rule: 'cylinder_overfilled',
    looksAt:
      'Whether the cylinder held more than 80% of its water capacity times the specific gravity of the liquid at 77 °F, half a per cent allowed for the scale.',
    doesNotMean:
      'The tare in the list may be another cylinder’s. A cylinder that may be too full is a matter for who is trained for it, at once.',
    source: 'AHRI Guideline K. The marking of the cylinder and 49 CFR 173.301 and 173.304a win.',
  },
  {
    rule: 'wrong_cylinder',
    looksAt: 'Whether other tickets, or its marking, have another refrigerant in this cylinder.',
    doesNotMean: 'The serial may have been misread; the cylinder may have been emptied and marked anew.',
    source: 'Mixed refrigerant is seldom reclaimed to AHRI Standard 700 and earns no credit: common practice.',
  },
];
