import type { GlossaryTerm } from '@/lib/glossary/term';

const STANDING_WORDS: Record<GlossaryTerm['source']['standing'], string> = {
  rule: 'Rule',
  standard: 'Standard',
  'published work': 'Published',
  'rule of this product': 'Rule of Tarebook',
  'common practice': 'Common practice',
  'from memory': 'From memory, not looked up',
};

/** Where a meaning comes from, and how far that carries. */
export const TermSource = ({ source }: { source: GlossaryTerm['source'] }) => (
  <p className="mt-1.5 text-sm text-ink-2">
    <span className="font-medium">{STANDING_WORDS[source.standing]}:</span> {source.text}
  </p>
);
