import type { ApplianceCategory, JobType } from '@/lib/vocabulary';

/** A kind of equipment the company looks after; charges are lognormal about the median. */
export type EquipmentKind = {
  kind: string;
  /** Names of units begin with it: RTU-3. */
  prefix: string;
  category: ApplianceCategory;
  medianChargeLb: number;
  chargeSpread: number;
  /** Places for such a unit in the whole company. */
  places: number;
  /** Recoveries in a middling month of the first year. */
  monthlyJobs: number;
  season: 'cooling' | 'refrigeration' | 'plant' | 'even';
  jobs: Record<JobType, number>;
  /** Which kinds of site have it. */
  sites: readonly SiteKind[];
};

export const SITE_KINDS = [
  'home',
  'office',
  'store',
  'restaurant',
  'supermarket',
  'school',
  'clinic',
  'plant',
] as const;
export type SiteKind = (typeof SITE_KINDS)[number];

const field = { service: 0.58, repair: 0.34, conversion: 0.03, disposal: 0.05 };
const cold = { service: 0.52, repair: 0.4, conversion: 0.04, disposal: 0.04 };
const large = { service: 0.66, repair: 0.31, conversion: 0.01, disposal: 0.02 };
const small = { service: 0.3, repair: 0.5, conversion: 0, disposal: 0.2 };

type Row = Omit<EquipmentKind, 'kind'>;
const KINDS: Record<string, Row> = {
  split: {
    prefix: 'AC',
    category: 'comfort_cooling',
    medianChargeLb: 7,
    chargeSpread: 0.36,
    places: 330,
    monthlyJobs: 60,
    season: 'cooling',
    jobs: field,
    sites: ['home', 'office', 'clinic', 'restaurant'],
  },
  rooftop: {
    prefix: 'RTU',
    category: 'comfort_cooling',
    medianChargeLb: 17,
    chargeSpread: 0.38,
    places: 200,
    monthlyJobs: 38,
    season: 'cooling',
    jobs: field,
    sites: ['office', 'store', 'school', 'clinic', 'supermarket'],
  },
  vrf: {
    prefix: 'VRF',
    category: 'comfort_cooling',
    medianChargeLb: 26,
    chargeSpread: 0.2,
    places: 40,
    monthlyJobs: 8,
    season: 'cooling',
    jobs: field,
    sites: ['office', 'school', 'clinic'],
  },
  chiller: {
    prefix: 'CH',
    category: 'comfort_cooling',
    medianChargeLb: 420,
    chargeSpread: 0.3,
    places: 26,
    monthlyJobs: 5,
    season: 'plant',
    jobs: large,
    sites: ['school', 'clinic', 'office'],
  },
  walkIn: {
    prefix: 'WI',
    category: 'commercial_refrigeration',
    medianChargeLb: 13,
    chargeSpread: 0.4,
    places: 130,
    monthlyJobs: 25,
    season: 'refrigeration',
    jobs: cold,
    sites: ['restaurant', 'store', 'supermarket'],
  },
  reachIn: {
    prefix: 'RI',
    category: 'commercial_refrigeration',
    medianChargeLb: 2.4,
    chargeSpread: 0.35,
    places: 70,
    monthlyJobs: 11,
    season: 'refrigeration',
    jobs: cold,
    sites: ['restaurant', 'store', 'supermarket'],
  },
  rack: {
    prefix: 'RACK',
    category: 'commercial_refrigeration',
    medianChargeLb: 340,
    chargeSpread: 0.3,
    places: 24,
    monthlyJobs: 5,
    season: 'refrigeration',
    jobs: large,
    sites: ['supermarket'],
  },
  process: {
    prefix: 'PC',
    category: 'industrial_process',
    medianChargeLb: 120,
    chargeSpread: 0.4,
    places: 24,
    monthlyJobs: 5,
    season: 'even',
    jobs: large,
    sites: ['plant'],
  },
  cabinet: {
    prefix: 'SA',
    category: 'small_appliance',
    medianChargeLb: 0.75,
    chargeSpread: 0.5,
    places: 60,
    monthlyJobs: 11,
    season: 'even',
    jobs: small,
    sites: ['home', 'office', 'store', 'school'],
  },
  dehumidifier: {
    prefix: 'DH',
    category: 'other',
    medianChargeLb: 3.5,
    chargeSpread: 0.3,
    places: 18,
    monthlyJobs: 3,
    season: 'even',
    jobs: field,
    sites: ['plant', 'school'],
  },
};

export const EQUIPMENT: readonly EquipmentKind[] = Object.entries(KINDS).map(([kind, row]) => ({ kind, ...row }));

/** Kinds that the large-plant specialist is sent to. */
export const isLargePlant = ({ medianChargeLb }: EquipmentKind): boolean => medianChargeLb > 100;
