import type { Dimension } from '@/analytics/dimensions';
import type { StackedMonth, StackLayer } from '@/analytics/monthly-trends/series';
import { choiceName } from '@/components/scope/wording';
import { formatMass, formatMassWithUnit, formatMonth, formatNumber, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

/** How a layer is called: the key in words, or how many others it holds. */
export const layerName = (by: Dimension, layer: StackLayer): string =>
  layer.key === null ? plural(layer.keys, 'other', 'others') : choiceName(by, layer.key);

/** What stands behind a month that is not to be compared. */
export const stateWord = (month: Pick<StackedMonth, 'state'>): string =>
  ({ whole: '', running: 'so far', cut: 'part of the month' })[month.state];

/** A month in words: its mass and recoveries, the year before, and each layer that has any. */
export const monthInWords = (
  month: StackedMonth,
  layers: readonly StackLayer[],
  by: Dimension,
  unit: DisplayUnit,
): string => {
  const state = stateWord(month);
  const head = `${formatMonth(month.month)}${state ? `, ${state}` : ''}: ${formatMassWithUnit(month.recoveredMass, unit)} in ${plural(month.recoveries, 'recovery', 'recoveries')}`;
  const before = month.yearBefore === null ? '' : `, ${formatMassWithUnit(month.yearBefore, unit)} a year before`;
  const parts = layers
    .filter(({ id }) => (month.layers[id] ?? 0) > 0)
    .map((layer) => `${layerName(by, layer)}\u00a0${formatMass(month.layers[layer.id] ?? 0, unit)}`);
  return `${head}${before}${parts.length ? `; ${parts.join(', ')}` : ''}.`;
};

/** A difference of two shares in points of a hundred, its sign always said: `+3.1 points`. */
export const pointsWords = (difference: number): string => {
  const text = formatNumber(difference * 100, 1);
  return `${difference > 0 && /[1-9]/.test(text) ? '+' : ''}${text}\u00a0points`;
};
