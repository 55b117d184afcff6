import { buildChartTheme } from '@visx/xychart';

const READING = 'var(--font-reading), ui-monospace, monospace';
const TEXT = 'var(--font-text), system-ui, sans-serif';

/** The chart's look out of the product's CSS variables, so that light, dark and print follow by themselves. */
export const chartTheme = buildChartTheme({
  backgroundColor: 'transparent',
  colors: [],
  gridColor: 'var(--rule-2)',
  gridColorDark: 'var(--ink)',
  svgLabelSmall: { fill: 'var(--ink-2)', fontFamily: READING, fontSize: 13, fontWeight: 400 },
  svgLabelBig: { fill: 'var(--ink-2)', fontFamily: TEXT, fontSize: 13, fontWeight: 600 },
  tickLength: 4,
});
