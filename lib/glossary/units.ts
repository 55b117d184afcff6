import type { GlossaryTerm } from './term';

/** The units of the gauges and scales. */
export const UNITS = [
  {
    id: 'inches-of-mercury-vacuum',
    name: 'Inches of mercury vacuum',
    also: ['inHg'],
    unit: 'inHg; 1 inHg = 3.386 kPa',
    meaning:
      'How far below the air’s pressure a gauge reads: 0 is the open air, 29.92 nothing at all. 10 inHg vacuum is 67.5 kPa absolute.',
    source: { standing: 'standard', text: 'NIST Special Publication 811, appendix B' },
  },
  {
    id: 'psig',
    name: 'Pounds per square inch, gauge',
    also: ['psig', 'psia', 'psi'],
    unit: 'psi; 1 psi = 6.894757 kPa',
    meaning: 'Pressure above that of the air; 0 psig is the open air. psia counts from nothing: 0 psig is 14.7 psia.',
    source: { standing: 'standard', text: 'NIST Special Publication 811, appendix B' },
  },
  {
    id: 'mm-hg-absolute',
    name: 'Millimetres of mercury, absolute',
    also: ['mm Hg', 'torr'],
    unit: 'mm Hg; 1 mm Hg = 0.1333 kPa',
    meaning: 'Pressure counted from nothing; the open air has 760. Low pressure appliances are evacuated to 25.',
    source: { standing: 'standard', text: 'NIST Special Publication 811, appendix B; 40 CFR 82.156(a), Table 1' },
  },
  {
    id: 'micron',
    name: 'Micron',
    also: ['micron of mercury'],
    unit: '1,000 microns = 1 mm Hg',
    meaning:
      'A thousandth of a millimetre of mercury, counted from nothing: the unit of vacuum gauges. 1 inHg is 25,400 microns.',
    source: { standing: 'standard', text: 'NIST Special Publication 811, appendix B' },
  },
  {
    id: 'pounds-and-ounces',
    name: 'Pounds and ounces',
    also: ['lb-oz', 'lb', 'oz'],
    unit: '1 lb = 16 oz = 0.45359237 kg exactly',
    meaning: 'Written as 7-8 for 7 lb 8 oz, which is 7.5 lb and not 7.8: the commonest slip on a ticket.',
    source: { standing: 'standard', text: 'NIST Handbook 44, appendix C, for the factors' },
  },
] as const satisfies readonly GlossaryTerm[];
