import type { GlossaryTerm } from './term';

/** The cylinder, the scale, and where the refrigerant goes. */
export const CYLINDERS = [
  {
    id: 'cylinder',
    name: 'Recovery cylinder',
    also: ['bottle', 'tank'],
    meaning:
      'The refillable container that refrigerant is recovered into: grey body, yellow shoulder. One refrigerant to a cylinder; what is unknown gets one of its own. A disposable cylinder is never refilled.',
    source: { standing: 'common practice', text: 'Colours of AHRI Guideline K; one refrigerant to a cylinder' },
  },
  {
    id: 'tare-weight',
    name: 'Tare weight',
    also: ['TW'],
    unit: 'lb or kg',
    meaning: 'The weight of the empty cylinder with its valve, stamped on the collar as TW.',
    source: { standing: 'common practice', text: 'Collar marking TW' },
  },
  {
    id: 'start-and-end-weight',
    name: 'Start and end weight',
    also: ['gross weight', 'start weight', 'end weight'],
    unit: 'lb, lb-oz, oz, kg or g',
    meaning:
      'Cylinder with content on the scale before and after the pull. Their difference is the recovered mass; where a ticket also states it, both must agree within what the scale can tell.',
    source: { standing: 'rule of this product', text: 'The weights of a recovery file' },
  },
  {
    id: 'water-capacity',
    name: 'Water capacity',
    also: ['WC'],
    unit: 'lb or kg of water',
    meaning: 'The water the cylinder holds when full, stamped on the collar as WC. The fill limit is reckoned from it.',
    source: { standing: 'common practice', text: 'Collar marking WC' },
  },
  {
    id: 'fill-limit',
    name: 'Fill limit',
    also: ['80% rule', 'maximum gross weight', 'filling density'],
    unit: 'lb or kg',
    meaning:
      'The weight at which to stop. Guideline K: tare + 0.8 × water capacity × the liquid’s density at 77 °F over that of water. The rule of transport besides: a cylinder must not be liquid full at 131 °F (130 °F for gases without a row of their own). The smaller one holds.',
    source: { standing: 'standard', text: 'AHRI Guideline K; 49 CFR 173.301(a)(8) and 173.304a(a)(2)' },
  },
  {
    id: 'heel',
    name: 'Heel',
    unit: 'lb or kg',
    meaning: 'What stays in a cylinder that is called empty.',
    source: { standing: 'common practice', text: 'A word of those who fill and take back cylinders' },
  },
  {
    id: 'requalification-date',
    name: 'Requalification date',
    also: ['test date', 'retest'],
    meaning:
      'When the cylinder was last tested, or has to be. An overdue cylinder may not be filled and offered for transport; one filled before may still move. Recovery cylinders are tested every five years in practice.',
    source: { standing: 'rule', text: '49 CFR 173.301(a)(6) and 180.209; five years by common practice' },
  },
  {
    id: 'mixed',
    name: 'Mixed refrigerant',
    meaning:
      'More than one refrigerant in a cylinder. Nobody can part them in the field, reclaimers charge for them instead of paying, and mixing a flammable one in is dangerous.',
    source: { standing: 'common practice', text: 'Reclaimers’ terms' },
  },
  {
    id: 'contaminated',
    name: 'Contaminated refrigerant',
    unit: 'ppm of water and acid, per cent of the rest',
    meaning:
      'Recovered refrigerant with more water, acid, residue, air or other refrigerant in it than the standard of purity allows. Recovered refrigerant may go back to its owner’s appliances; to be sold it must be reclaimed.',
    source: { standing: 'standard', text: 'AHRI Standard 700; 40 CFR 82.154(d)' },
  },
  {
    id: 'reclaim',
    name: 'Reclaim',
    also: ['reclaimer', 'reclamation'],
    meaning:
      'To bring recovered refrigerant back to all of the standard of purity and to prove it by the prescribed analysis. Done by a certified reclaimer. Recycling, the cleaning for reuse on site, is less.',
    source: { standing: 'rule', text: '40 CFR 82.152, “reclaim” and “recycle”; 82.164; appendix A to subpart F' },
  },
  {
    id: 'settlement-statement',
    name: 'Settlement statement',
    meaning:
      'The reclaimer’s account of a shipment: gross less tare, less water, oil and air found, priced by the pound and refrigerant and by purity, with charges for mixed loads and cylinders.',
    source: { standing: 'common practice', text: 'Reclaimers’ statements; no rule sets their form' },
  },
] as const satisfies readonly GlossaryTerm[];
