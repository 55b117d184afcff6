import type { JudgedRecord } from '@/analytics/judging/record';
import { defaultSettings } from '@/analytics/judging/settings';

const KG_PER_LB = 0.45359237;

/** Kilograms of pounds with two decimals. */
export const lb = (pounds: number): number => Math.round(pounds * 100) * (KG_PER_LB / 100);

/** Absolute pressure in kPa of a vacuum in inches of mercury. */
export const inHg = (inches: number): number => 101.325 - inches * 3.386389;

export const SETTINGS = defaultSettings('2026-12-01');

/** A sound pull of 7.5 out of 8 lb at 10 inHg, in every part as wished. */
export const judged = (changes: Partial<JudgedRecord> = {}): JudgedRecord => {
  const nameplateChargeKg = changes.nameplateChargeKg ?? lb(8);
  return {
    id: 'looked at',
    recordRef: 'X-1',
    recoveredOn: '2025-06-10',
    recoveredAt: '2025-06-10T09:00:00-04:00',
    technicianId: 'Avery',
    siteId: 'Mill Street',
    applianceId: 'Mill Street/RTU-1',
    cylinderId: null,
    category: 'comfort_cooling',
    jobType: 'service',
    refrigerant: 'R-410A',
    nameplateChargeKg,
    fullChargeKg: nameplateChargeKg,
    startWeightKg: null,
    endWeightKg: null,
    recoveredMassKg: lb(7.5),
    massUnit: 'lb',
    finalVacuumKpaAbs: inHg(10),
    vacuumUnit: 'inhg',
    holdMinutes: null,
    holdRiseKpa: null,
    requiredLevelKpaAbs: inHg(0),
    decisions: [],
    isExcluded: false,
    ...changes,
  };
};

const CREW = ['Avery', 'Blake', 'Casey', 'Devon', 'Ellis'];

/**
 * A crew's usual work, made by arithmetic: 600 pulls of 5 to 12.9 lb, one in nine of a unit that had leaked, the rest
 * with 88 to 98 per cent; 8 to 12 inHg; tenths of a pound; each ticket into the cylinder that the one before left.
 */
export const usualWork = (changes: Partial<JudgedRecord> = {}): JudgedRecord[] => {
  let gross = 0;
  return Array.from({ length: 600 }, (_, i) => {
    const plate = 5 + ((i * 37) % 80) / 10;
    const share = i % 9 === 3 ? 0.2 + ((i * 7) % 50) / 100 : 0.88 + ((i * 13) % 11) / 100;
    const pulled = Math.round(plate * share * 10) / 10;
    const start = i % 3 === 0 ? 17.5 : gross;
    gross = start + pulled;
    const day = new Date(Date.UTC(2024, 0, 1) + i * 86_400_000).toISOString().slice(0, 10);
    return judged({
      id: `usual ${i}`,
      recordRef: `T-${1000 + i}`,
      recoveredOn: day,
      recoveredAt: `${day}T09:00:00-05:00`,
      technicianId: CREW[i % CREW.length] ?? 'Avery',
      applianceId: `unit ${i}`,
      cylinderId: `C-${Math.floor(i / 3)}`,
      nameplateChargeKg: lb(plate),
      startWeightKg: lb(start),
      endWeightKg: lb(gross),
      recoveredMassKg: lb(pulled),
      finalVacuumKpaAbs: inHg(10 + (((i * 29) % 41) - 20) / 10),
      ...changes,
    });
  });
};
