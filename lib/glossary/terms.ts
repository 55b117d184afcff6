import { APPLIANCES } from './appliances';
import { CYLINDERS } from './cylinders';
import { LEAKS } from './leaks';
import { STATISTICS } from './statistics';
import type { GlossaryTerm } from './term';
import { UNITS } from './units';
import { WORK } from './work';

const PARTS = [
  { title: 'The work', terms: WORK },
  { title: 'The appliance', terms: APPLIANCES },
  { title: 'Leaks', terms: LEAKS },
  { title: 'The cylinder and what comes after', terms: CYLINDERS },
  { title: 'How figures are judged', terms: STATISTICS },
  { title: 'Units', terms: UNITS },
] as const;

/** The id of a term that there is. */
export type TermId = (typeof PARTS)[number]['terms'][number]['id'];

/** The glossary in its parts, in the order of the work. */
export const GLOSSARY: readonly { title: string; terms: readonly GlossaryTerm[] }[] = PARTS;

/** Every term by its id. */
export const TERMS: ReadonlyMap<string, GlossaryTerm> = new Map(
  GLOSSARY.flatMap(({ terms }) => terms.map((term) => [term.id, term])),
);

const folded = (text: string): string => text.normalize('NFKD').toLowerCase();

/** Whether a term says a text: in its name, its other names or its meaning. An empty text fits all. */
export const says = ({ name, also = [], meaning }: GlossaryTerm, text: string): boolean => {
  const wanted = folded(text.trim());
  return [name, ...also, meaning].some((part) => folded(part).includes(wanted));
};
