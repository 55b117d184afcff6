'use client';

import Link from 'next/link';
import { useEffect, useState } from 'react';
import type { GlossaryTerm } from '@/lib/glossary/term';
import type { TermId } from '@/lib/glossary/terms';
import { TermSource } from './term-source';

/** What a term means, read when it is asked for: no page carries the whole glossary. */
export const TermMeaning = ({ id }: { id: TermId }) => {
  const [term, setTerm] = useState<GlossaryTerm | undefined>();
  useEffect(() => {
    let wanted = true;
    void import('@/lib/glossary/terms').then(({ TERMS }) => {
      if (wanted) setTerm(TERMS.get(id));
    });
    return () => {
      wanted = false;
    };
  }, [id]);
  return (
    <>
      {term ? (
        <>
          <p className="font-semibold">{term.name}</p>
          {term.unit ? <p className="text-sm text-ink-2">{term.unit}</p> : null}
          <p className="mt-1.5 text-[0.9375rem]">{term.meaning}</p>
          <TermSource source={term.source} />
        </>
      ) : null}
      <p className="mt-3 text-sm">
        <Link href={`/glossary#${id}`} className="link">
          In the glossary
        </Link>
      </p>
    </>
  );
};
