import type { ChartLayer, ChartMonth } from './layer';
import { type ChartModel, shownValue } from './model';

/** What the picture of a model draws: layers with their colours, and bars in the viewer's unit. */
export const modelPicture = ({
  series,
  months,
  total,
  overlays,
  unit,
}: ChartModel): { layers: ChartLayer[]; months: ChartMonth[] } => ({
  layers: series.map(({ key, label, colour }) => ({ id: key, name: label, colour })),
  months: months.map(({ month, state }, index) => ({
    month,
    values: Object.fromEntries(
      series.map(({ key, kind, values }) => [key, shownValue(values[index] ?? 0, kind, unit) ?? 0]),
    ),
    total: shownValue(total.values[index] ?? 0, total.kind, unit) ?? 0,
    yearBefore: state === 'whole' ? shownValue(overlays[0]?.values[index] ?? null, 'mass', unit) : null,
    unfinished: state !== 'whole',
  })),
});
