'use client';

import Link from 'next/link';
import { useTransition } from 'react';
import { Button, TextButton } from '@/components/ui/button';
import { useViewer } from '@/components/viewer-context';
import { ROLE_NAMES } from '@/lib/wording';
import { useKeySheet } from './key-sheet';
import { ThemeChoice } from './theme-choice';

// next-auth's part for browsers is needed for this alone.
const signOut = async () => {
  const auth = await import('next-auth/react');
  await auth.signOut({ callbackUrl: '/sign-in' });
};

/** What the shell asks the server to do. */
export type AccountActions = { switchCompany: (companyId: string) => Promise<boolean> };

/** Who is signed in, where, and the ways out: another company, another theme, sign out. */
export const AccountPanel = ({ switchCompany }: AccountActions) => {
  const viewer = useViewer();
  const askForKeys = useKeySheet();
  const [switching, startSwitch] = useTransition();
  const others = viewer.memberships.filter((membership) => membership.companyId !== viewer.companyId);
  const switchTo = (companyId: string) =>
    startSwitch(async () => {
      // A full load: nothing that was read for the one company may stay in the page.
      if (await switchCompany(companyId)) window.location.assign('/');
    });
  return (
    <div className="flex flex-col gap-4">
      <p>
        <span className="block font-semibold">{viewer.name}</span>
        <span className="block text-sm text-ink-2">
          {ROLE_NAMES[viewer.role]} at {viewer.companyName}
        </span>
      </p>
      {others.length ? (
        <div className="flex flex-col gap-2">
          <p className="text-sm text-ink-2">Work for another company</p>
          {others.map(({ companyId, companyName }) => (
            <Button key={companyId} disabled={switching} onClick={() => switchTo(companyId)}>
              {companyName}
            </Button>
          ))}
        </div>
      ) : null}
      <ThemeChoice />
      <p className="flex flex-wrap gap-x-6">
        <TextButton onClick={askForKeys}>Keys</TextButton>
        <Link href="/glossary" className="link inline-flex items-center pointer-coarse:min-h-11">
          Glossary
        </Link>
      </p>
      <Button onClick={signOut}>Sign out</Button>
    </div>
  );
};
