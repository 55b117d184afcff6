'use client';

import Link from 'next/link';
import { TextButton } from '@/components/ui/button';
import { useKeySheet } from './key-sheet';

/** What helps on every screen: the words and the keys. */
export const Foot = () => {
  const askForKeys = useKeySheet();
  return (
    <footer className="mx-auto max-w-page px-4 pt-2 pb-28 text-sm sm:px-8 lg:pb-10 print:hidden">
      <p className="flex flex-wrap items-center gap-x-6 border-t border-rule pt-3 text-ink-2">
        <Link href="/glossary" className="link inline-flex items-center pointer-coarse:min-h-11">
          Glossary
        </Link>
        <TextButton onClick={askForKeys}>Keys</TextButton>
      </p>
    </footer>
  );
};
