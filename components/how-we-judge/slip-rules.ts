import type { JudgingRule } from './rule';

/** Rules about what was written down. */
export const SLIP_RULES: readonly JudgingRule[] = [
  {
    rule: 'unit_slip',
    looksAt:
      'Whether another unit or a shifted decimal point explains the mass better than the one written: kilograms written as pounds, ounces as pounds, a point one place off. The steps of the scale and the cylinder’s next weighing count too.',
    doesNotMean: 'Nothing is corrected by itself. An odd pull can be a true one; the ticket and the person know.',
    source: 'Bayes’ theorem over the possible slips; how often each comes is common practice.',
  },
  {
    rule: 'weights_disagree',
    looksAt: 'Whether end weight less start weight is the recovered mass, within the steps of the scale.',
    doesNotMean: 'It does not say which of the three figures is wrong.',
    source: 'Arithmetic. Scale readings: JCGM 100:2008.',
  },
  {
    rule: 'cylinder_chain',
    looksAt: 'Whether the cylinder’s weight at the next pull says that another mass went in than this ticket does.',
    doesNotMean: 'Between two pulls somebody may have emptied the cylinder, or weighed it with a hose on.',
    source: 'Bayes’ theorem, with what two readings of a scale can tell (JCGM 100:2008).',
  },
  {
    rule: 'over_full_charge',
    looksAt:
      'Whether more than 115% of the full charge came out. Up to that a system may simply have been overcharged.',
    doesNotMean: 'The nameplate may be of another unit, or the line set longer than written.',
    source: 'The limit of 115% is common practice; full charge by 40 CFR 82.152.',
  },
  {
    rule: 'nameplate_doubtful',
    looksAt:
      'Whether another nameplate explains the pull better: one with two digits changed over, a point one place off, another unit, or the one written at other visits to the appliance.',
    doesNotMean: 'A converted system may truly have a new nameplate.',
    source: 'Bayes’ theorem over the possible slips; how often each comes is common practice.',
  },
  {
    rule: 'duplicate',
    looksAt: 'Whether two tickets tell of the same appliance, technician, day, cylinder and masses.',
    doesNotMean: 'Two circuits of one appliance can give the same mass on one day.',
    source: 'A rule of this product.',
  },
  {
    rule: 'date_doubtful',
    looksAt: 'Whether the day lies in the future, or far from the days of the tickets numbered around it.',
    doesNotMean: 'A book of tickets may have lain in a truck for months.',
    source: 'A rule of this product.',
  },
];
