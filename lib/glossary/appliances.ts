import type { GlossaryTerm } from './term';

/** The appliance and what it holds. */
export const APPLIANCES = [
  {
    id: 'appliance',
    name: 'Appliance',
    also: ['unit', 'system', 'circuit'],
    meaning:
      'A device that holds refrigerant and uses it, at home or in trade. Each independent circuit is an appliance of its own.',
    source: { standing: 'rule', text: '40 CFR 82.152, “appliance”; the circuits from memory' },
  },
  {
    id: 'appliance-category',
    name: 'Category of appliance',
    also: ['comfort cooling', 'commercial refrigeration', 'industrial process refrigeration'],
    meaning:
      'Comfort cooling, commercial refrigeration, industrial process refrigeration, small appliances, or other. Leak limits depend on it, and like jobs are of one category.',
    source: { standing: 'rule', text: '40 CFR 82.152 and 82.157(c)' },
  },
  {
    id: 'small-appliance',
    name: 'Small appliance',
    meaning:
      'Made, charged and hermetically sealed in a factory with five pounds of refrigerant or less. A split system charged on site is none, even with four pounds. Of one 90% is recovered when its compressor runs and 80% when it does not, or it is pulled to 4 inHg vacuum.',
    source: { standing: 'rule', text: '40 CFR 82.152, “small appliance”; 82.156(b)' },
  },
  {
    id: 'nameplate-charge',
    name: 'Nameplate charge',
    unit: 'lb, lb-oz, oz, kg or g',
    meaning:
      'The refrigerant charge printed on the unit. Long lines, a conversion or a topped-up system hold another amount than their plate says.',
    source: { standing: 'rule', text: '40 CFR 82.152, “full charge”: the maker’s figure' },
  },
  {
    id: 'added-charge',
    name: 'Added charge',
    unit: 'lb, lb-oz, oz, kg or g',
    meaning:
      'What was charged on top of the nameplate, usually for lines longer than the length that the maker included.',
    source: { standing: 'common practice', text: 'Makers print an amount for each foot of extra line' },
  },
  {
    id: 'full-charge',
    name: 'Full charge',
    unit: 'lb, lb-oz, oz, kg or g',
    meaning:
      'The amount an appliance needs for normal operation: here the nameplate charge plus the added charge. The rule also allows a calculation from volumes, a measurement, or the middle of a documented range.',
    source: { standing: 'rule', text: '40 CFR 82.152, “full charge”' },
  },
  {
    id: 'yield',
    name: 'Yield',
    also: ['recovery efficiency'],
    unit: 'share of the full charge, in per cent',
    meaning:
      'Recovered mass over full charge. Below 100% the rest had leaked, stayed in the oil, or was left behind; above it the scale, the nameplate or the unit is in doubt.',
    source: { standing: 'rule', text: '40 CFR 82.152, “full charge” and “recovery efficiency”' },
  },
  {
    id: 'total-yield',
    name: 'Total yield',
    unit: 'per cent',
    meaning: 'All recovered mass of a group over all its full charges. A few large systems decide it.',
    source: { standing: 'rule of this product', text: 'The ratio of the two sums' },
  },
  {
    id: 'median-yield',
    name: 'Median yield',
    unit: 'per cent',
    meaning:
      'The middle one when the recoveries stand in order of their yield: each job counts alike, and no single slip moves it.',
    source: {
      standing: 'rule of this product',
      text: 'The median; of an even number the mean of the two in the middle',
    },
  },
  {
    id: 'pressure-class',
    name: 'Pressure class',
    also: ['low pressure', 'medium pressure', 'high pressure', 'very high pressure'],
    unit: 'psia of saturated liquid at 104 °F',
    meaning:
      'Low: below 45. Medium: 45 to 170. High: 170 to 355. Very high: above 355, or a critical temperature below 104 °F. The required level of evacuation follows from it and from the full charge.',
    source: { standing: 'rule', text: '40 CFR 82.152' },
  },
  {
    id: 'refrigerant',
    name: 'Refrigerant',
    also: ['designation', 'R-number'],
    meaning: 'Named by its standard designation, such as R-410A. R410A, 410a and R-410A are read as one.',
    source: { standing: 'standard', text: 'ANSI/ASHRAE Standard 34, designations' },
  },
  {
    id: 'gwp',
    name: 'Global warming potential',
    also: ['GWP', 'exchange value', 'AR4', 'AR6'],
    unit: 'kg of CO₂ for each kg of refrigerant, over 100 years',
    meaning:
      'How much more a kilogram of the gas warms the air than a kilogram of carbon dioxide. Of a blend: the sum of mass fraction times potential. AR4 values are those of the statute; AR6 are newer.',
    source: { standing: 'rule', text: '42 USC 7675(c) and 40 CFR part 98, Table A-1 (AR4); 40 CFR 84.64 for blends' },
  },
  {
    id: 'co2-equivalent',
    name: 'CO₂-equivalent',
    also: ['CO2e', 'kept from the air'],
    unit: 't CO₂e',
    meaning:
      'Recovered mass times global warming potential: the carbon dioxide that would warm as much as the refrigerant, had it gone into the air. It was recovered instead.',
    source: { standing: 'rule', text: '40 CFR part 98, Table A-1, and 40 CFR 84.64' },
  },
  {
    id: 'leak-rate',
    name: 'Leak rate',
    unit: 'per cent of the full charge a year',
    meaning:
      'Added refrigerant over full charge, brought to a year: either since the last addition, or all additions of the last 365 days. One method for all appliances of a facility. Limits are 10, 20 or 30% by category.',
    source: { standing: 'rule', text: '40 CFR 82.152, “leak rate”; 82.157(c)' },
  },
] as const satisfies readonly GlossaryTerm[];
