import type { GlossaryTerm } from './term';

/** The work at the appliance: what is taken out, and how one sees that it is all. */
export const WORK = [
  {
    id: 'recovery',
    name: 'Recovery',
    also: ['recover', 'pull'],
    meaning:
      'Taking refrigerant out of an appliance, in whatever condition it is, into an external container, without testing or treating it. In the records a recovery is one such pull into one cylinder.',
    source: { standing: 'rule', text: '40 CFR 82.152, “recover”' },
  },
  {
    id: 'recovered-mass',
    name: 'Recovered mass',
    also: ['net weight', 'recovered'],
    unit: 'lb, lb-oz, oz, kg or g',
    meaning:
      'What the scale gained: the weight of the cylinder after the pull less its weight before it. Weighed on one scale without touching hose or valve in between, it needs no tare.',
    source: { standing: 'common practice', text: 'Weighing of recovery cylinders before and after the pull' },
  },
  {
    id: 'final-vacuum',
    name: 'Final vacuum',
    also: ['evacuation level', 'vacuum'],
    unit: 'inHg vacuum, psig, mm Hg absolute, kPa absolute or microns',
    meaning:
      'The pressure in the appliance when the recovery machine was stopped. It says how much vapour was left: without it nobody can see afterwards whether the required level was reached.',
    source: {
      standing: 'rule',
      text: '40 CFR 82.156(a) and Table 1: levels to be reached, and checked before opening',
    },
  },
  {
    id: 'down-to-level',
    name: 'Down to level',
    also: ['required level', 'evacuation level reached'],
    unit: 'share of the records that state a final vacuum',
    meaning:
      'The final vacuum reached the level that the rule asks of the appliance’s pressure class and full charge, for a recovery machine made on or after 15 November 1993. A reading within 0.1 kPa of the level counts as reached. Exceptions for leaks and for repairs that are not major are not known to the record.',
    source: { standing: 'rule', text: '40 CFR 82.156(a), Table 1; (b) for small appliances' },
  },
  {
    id: 'hold',
    name: 'Hold',
    also: ['hold time', 'held', 'standing test'],
    unit: 'minutes',
    meaning:
      'The wait after the pull-down with the machine off. If the pressure comes up again, oil or trapped liquid is still giving refrigerant and the pull is not over. A record counts as held when it states more than no minutes.',
    source: {
      standing: 'common practice',
      text: 'Pressure alone proves little while oil still feeds vapour; no minutes are in the rule',
    },
  },
  {
    id: 'hold-rise',
    name: 'Pressure regained',
    also: ['rise', 'rebound'],
    unit: 'a difference of pressure: inHg, psi, mm Hg, kPa or microns',
    meaning:
      'How far the pressure came up during the hold. A rise that stops says trapped refrigerant; one that goes on to the air’s pressure says a leak.',
    source: { standing: 'common practice', text: 'Reading of a standing vacuum' },
  },
  {
    id: 'disposal',
    name: 'Disposal',
    meaning:
      'Throwing an appliance away, or taking it apart for scrap, dumping or parts. Its refrigerant is recovered first. Appliances of more than 5 and less than 50 lb full charge go into the disposal log.',
    source: { standing: 'rule', text: '40 CFR 82.152, “disposal”; 82.156(a)(3)' },
  },
  {
    id: 'disposal-log',
    name: 'Disposal log',
    meaning:
      'For disposed appliances of more than 5 and less than 50 lb full charge: company, location, date of recovery and refrigerant of each; the quantity by refrigerant in each calendar month; and what was sent away for reclaim or destruction, to whom and when. Kept for three years.',
    source: { standing: 'rule', text: '40 CFR 82.156(a)(3), in force since 1 January 2018' },
  },
  {
    id: 'job-type',
    name: 'Job type',
    meaning:
      'Why the refrigerant was taken out: service, repair, conversion to another refrigerant, or disposal. A system opened because it leaked gives less back than one that is scrapped while it works.',
    source: { standing: 'rule of this product', text: 'The four types of a recovery file' },
  },
  {
    id: 'disposition',
    name: 'Disposition',
    meaning:
      'Where the recovered refrigerant went: it stays in the cylinder, goes back into the system, or is sent to a reclaimer or to be destroyed.',
    source: { standing: 'rule of this product', text: 'The four dispositions of a recovery file' },
  },
  {
    id: 'technician-certification',
    name: 'Technician certification',
    also: ['Type I', 'Type II', 'Type III', 'Universal', 'card'],
    meaning:
      'Type I: small appliances. Type II: medium, high and very high pressure appliances. Type III: low pressure appliances. Universal: all of them. The card does not expire.',
    source: { standing: 'rule', text: '40 CFR 82.161' },
  },
  {
    id: 'de-minimis-release',
    name: 'De minimis release',
    meaning:
      'The little that escapes although the evacuation practices were kept, the machine is certified and so is the technician. Only then does a release count as de minimis.',
    source: { standing: 'rule', text: '40 CFR 82.154(a)(2)' },
  },
  {
    id: 'entry-error',
    name: 'Entry error',
    meaning:
      'A record whose figures were written down wrong, such as pounds for ounces, and cannot be put right. It stays among the records with its history and is left out of every figure.',
    source: { standing: 'rule of this product', text: 'Exclusion “entry error” of a record' },
  },
] as const satisfies readonly GlossaryTerm[];
