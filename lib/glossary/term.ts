/** How far a source carries: a rule or a standard to be looked up, a published work, the product's own rule, or less. */
export const STANDINGS = [
  'rule',
  'standard',
  'published work',
  'rule of this product',
  'common practice',
  'from memory',
] as const;

/** A word of the trade or of the screens. The browser reads this too: no imports. */
export type GlossaryTerm = {
  /** Its address on the page of the glossary: `#full-charge`. */
  id: string;
  name: string;
  /** Other names that people look for. */
  also?: readonly string[];
  /** What it is measured in, where it is measured. */
  unit?: string;
  meaning: string;
  source: { standing: (typeof STANDINGS)[number]; text: string };
};
