import type { FIGURE_MARKS } from '@/db/schema/refrigerants';

type Mark = (typeof FIGURE_MARKS)[number];

/**
 * GWP (100 years) and ODP of the pure fluids that blends are made of. GWP: IPCC AR4 values as adopted by 42 USC 7675(c)
 * and 40 CFR part 98 Table A-1; AR4 has none for HFOs and hydrocarbons, for which conventional figures stand, marked
 * `memory`. ODP: 42 USC 7671a(e).
 */
export const COMPONENTS: Record<string, { gwpAr4: number; gwpMark: Mark; odp: number; odpMark: Mark }> = {
  'R-11': { gwpAr4: 4750, gwpMark: 'read', odp: 1, odpMark: 'read' },
  'R-12': { gwpAr4: 10900, gwpMark: 'read', odp: 1, odpMark: 'read' },
  'R-22': { gwpAr4: 1810, gwpMark: 'read', odp: 0.05, odpMark: 'read' },
  'R-23': { gwpAr4: 14800, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-32': { gwpAr4: 675, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-115': { gwpAr4: 7370, gwpMark: 'read', odp: 0.6, odpMark: 'read' },
  'R-116': { gwpAr4: 12200, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-123': { gwpAr4: 77, gwpMark: 'read', odp: 0.02, odpMark: 'read' },
  'R-124': { gwpAr4: 609, gwpMark: 'read', odp: 0.02, odpMark: 'read' },
  'R-125': { gwpAr4: 3500, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-290': { gwpAr4: 3.3, gwpMark: 'memory', odp: 0, odpMark: 'read' },
  'R-600': { gwpAr4: 4, gwpMark: 'memory', odp: 0, odpMark: 'read' },
  'R-744': { gwpAr4: 1, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-134a': { gwpAr4: 1430, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-142b': { gwpAr4: 2310, gwpMark: 'read', odp: 0.06, odpMark: 'read' },
  'R-143a': { gwpAr4: 4470, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-152a': { gwpAr4: 124, gwpMark: 'read', odp: 0, odpMark: 'read' },
  'R-600a': { gwpAr4: 3, gwpMark: 'memory', odp: 0, odpMark: 'read' },
  'R-601a': { gwpAr4: 5, gwpMark: 'memory', odp: 0, odpMark: 'read' },
  'R-1234yf': { gwpAr4: 4, gwpMark: 'memory', odp: 0, odpMark: 'read' },
  'R-1130(E)': { gwpAr4: 0, gwpMark: 'memory', odp: 0, odpMark: 'read' },
  'R-1233zd(E)': { gwpAr4: 1, gwpMark: 'memory', odp: 0.0003, odpMark: 'memory' },
  'R-1234ze(E)': { gwpAr4: 6, gwpMark: 'memory', odp: 0, odpMark: 'read' },
  'R-1336mzz(Z)': { gwpAr4: 9, gwpMark: 'memory', odp: 0, odpMark: 'read' },
};
