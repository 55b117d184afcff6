'use client';

import { useState } from 'react';
import { TextButton } from '@/components/ui/button';
import { useScope } from './use-scope';

const SAID_MS = 3000;

/** Copies the address with the whole scope spelled out, so that a colleague sees the same thing. */
export const CopyLink = () => {
  const { search } = useScope();
  const [said, setSaid] = useState<string | null>(null);
  const copy = async () => {
    const address = `${window.location.origin}${window.location.pathname}${search}`;
    const done = await navigator.clipboard.writeText(address).then(
      () => true,
      () => false,
    );
    setSaid(done ? 'Link copied' : 'Copy it from the address bar');
    window.setTimeout(() => setSaid(null), SAID_MS);
  };
  return (
    <TextButton onClick={copy}>
      <span aria-live="polite">{said ?? 'Copy link'}</span>
    </TextButton>
  );
};
