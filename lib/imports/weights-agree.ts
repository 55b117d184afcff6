import { kgToUnit, massToMicrograms } from '@/lib/units';
import type { MassUnit } from '@/lib/vocabulary';
import type { MassField } from './field-kinds';
import type { RowCells } from './row-cells';
import type { RowMass } from './row-masses';

type Weighing = { start: RowMass; end: RowMass; written: RowMass };

/** One step of a column's readings in micrograms, by the decimals that its cells are written with. */
const stepOf = (cells: RowCells, field: MassField, unit: MassUnit): bigint => {
  const decimals = cells.column(field)?.decimals[unit] ?? 0;
  const step = decimals ? `0.${'1'.padStart(decimals, '0')}` : '1';
  return massToMicrograms(step, unit === 'lb-oz' ? 'oz' : unit) ?? 0n;
};

/** Converting each of the three readings may be off by half a microgram. */
const ROUNDING = 2n;

/**
 * How far end less start may lie from the written mass: each of the three readings is rounded to its step and so off by
 * up to half of it; never less than the coarsest step.
 */
const tolerance = (cells: RowCells, { start, end, written }: Weighing): bigint => {
  const steps = [
    stepOf(cells, 'start_weight', start.unit),
    stepOf(cells, 'end_weight', end.unit),
    stepOf(cells, 'recovered_mass', written.unit),
  ];
  const half = steps.reduce((sum, step) => sum + step, 0n) / 2n;
  const coarsest = steps.reduce((most, step) => (step > most ? step : most), 0n);
  return (half > coarsest ? half : coarsest) + ROUNDING;
};

const inUnit = (micrograms: bigint, unit: MassUnit): string => {
  const kg = Number(micrograms) / 1e9;
  if (unit === 'kg') return `${round(kg)} kg`;
  if (unit === 'g') return `${round(kg * 1000)} g`;
  const pounds = kgToUnit(kg, 'lb');
  return unit === 'oz' ? `${round(pounds * 16)} oz` : `${round(pounds)} lb`;
};

const round = (value: number): string => String(Number(value.toFixed(3)));

/** A sentence with both numbers when the weights and the written mass differ by more than the scale's resolution. */
export const disagreement = (cells: RowCells, weighing: Weighing): string | null => {
  const { start, end, written } = weighing;
  const weighed = end.micrograms - start.micrograms;
  const difference = weighed > written.micrograms ? weighed - written.micrograms : written.micrograms - weighed;
  if (difference <= tolerance(cells, weighing)) return null;
  const unit = written.unit;
  return `By the weights ${inUnit(weighed, unit)} were recovered, by the recovered mass ${inUnit(written.micrograms, unit)}.`;
};
