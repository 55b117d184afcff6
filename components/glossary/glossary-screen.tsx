'use client';

import { parseAsString, useQueryState } from 'nuqs';
import { Field, TextInput } from '@/components/ui/field';
import { PageHead } from '@/components/ui/page-head';
import type { GlossaryTerm } from '@/lib/glossary/term';
import { GLOSSARY, says } from '@/lib/glossary/terms';
import { TermSource } from './term-source';

const Entry = ({ term }: { term: GlossaryTerm }) => (
  <div
    id={term.id}
    className="grid scroll-mt-6 gap-x-8 gap-y-1 border-b border-rule py-4 target:border-l-6 target:border-l-shoulder target:pl-4 md:grid-cols-[16rem_minmax(0,1fr)] print:break-inside-avoid"
  >
    <dt>
      <a
        href={`#${term.id}`}
        className="text-lg font-semibold text-inherit no-underline hover:text-act hover:underline"
      >
        {term.name}
      </a>
      {term.also ? <span className="block text-sm text-ink-2">{term.also.join(', ')}</span> : null}
    </dt>
    <dd className="max-w-prose">
      <p>{term.meaning}</p>
      {term.unit ? <p className="mt-1.5 text-sm text-ink-2">Unit: {term.unit}</p> : null}
      <TermSource source={term.source} />
    </dd>
  </div>
);

/** The words of the trade as they are meant here, each with an address of its own. */
export const GlossaryScreen = () => {
  const [q, setQ] = useQueryState('q', parseAsString.withDefault('').withOptions({ history: 'replace' }));
  const parts = GLOSSARY.map(({ title, terms }) => ({ title, terms: terms.filter((term) => says(term, q)) })).filter(
    ({ terms }) => terms.length,
  );
  return (
    <>
      <PageHead
        title="The words, as they are meant here."
        sub="Each with its unit and where its meaning comes from. The rule’s own text goes before anything written here; local codes and licensed practice decide."
      />
      <search className="mt-6 mb-2 block max-w-md print:hidden">
        <Field label="Find a word">
          <TextInput type="search" value={q} maxLength={100} onChange={(event) => setQ(event.target.value || null)} />
        </Field>
      </search>
      {parts.map(({ title, terms }) => (
        <section key={title} aria-label={title} className="mt-8">
          <h2 className="border-b-2 border-ink pb-1.5 text-xl font-semibold">{title}</h2>
          <dl>
            {terms.map((term) => (
              <Entry key={term.id} term={term} />
            ))}
          </dl>
        </section>
      ))}
      <p role="status" className="mt-6 text-ink-2">
        {parts.length ? '' : `“${q}” stands in no word and no meaning here.`}
      </p>
    </>
  );
};
