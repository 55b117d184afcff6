/**
 * Refrigerants that have a colour of their own: those a contractor meets most. The hues follow the former cylinder
 * colours (AHRI Guideline N, withdrawn 2020), deepened for contrast; globals.css holds the values for both themes.
 */
export const COLOURED_REFRIGERANTS = [
  'R-11',
  'R-12',
  'R-22',
  'R-32',
  'R-123',
  'R-134a',
  'R-290',
  'R-404A',
  'R-407A',
  'R-407C',
  'R-410A',
  'R-448A',
  'R-449A',
  'R-454B',
  'R-502',
  'R-507A',
  'R-513A',
  'R-744',
  'R-1233zd(E)',
] as const;

/** Name of a refrigerant's CSS variable: `R-1233zd(E)` is kept as `--refrigerant-r-1233zde`. */
const variableOf = (designation: string): string =>
  `--refrigerant-${designation.toLowerCase().replace(/[^a-z0-9-]/g, '')}`;

const own = new Set<string>(COLOURED_REFRIGERANTS.map((designation) => designation.toLowerCase()));

// FNV-1a, 32 bit (draft-eastlake-fnv): the same name gets the same colour everywhere and for ever.
const hashOf = (text: string): number => {
  let hash = 0x811c9dc5;
  for (const byte of new TextEncoder().encode(text)) hash = Math.imul(hash ^ byte, 0x01000193) >>> 0;
  return hash;
};

/** The CSS colour of a refrigerant, `var(--refrigerant-r-22)`; a rare one borrows a colour, always the same one. */
export const refrigerantColour = (designation: string): string => {
  const name = designation.trim().toLowerCase();
  if (name === 'other' || name === '') return 'var(--refrigerant-other)';
  if (own.has(name)) return `var(${variableOf(name)})`;
  const borrowed = COLOURED_REFRIGERANTS[hashOf(name) % COLOURED_REFRIGERANTS.length] ?? 'other';
  return `var(${variableOf(borrowed)})`;
};
