import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { Notice } from '@/components/ui/notice';
import { currentViewer } from '@/lib/auth/current-viewer';
import { safeNextPath } from '@/lib/auth/next-path';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

type Search = { next?: string | string[]; password?: string | string[]; email?: string | string[] };

const one = (value: string | string[] | undefined): string | undefined => (Array.isArray(value) ? value[0] : value);

export default async function SignInPage({ searchParams }: { searchParams: Promise<Search> }) {
  const { next, password, email } = await searchParams;
  const nextPath = safeNextPath(one(next));
  if (await currentViewer()) redirect(nextPath);
  return (
    <>
      <h1 className="text-2xl font-semibold tracking-tight">Sign in</h1>
      {one(password) === 'set' ? (
        <Notice tone="good" announce className="mt-4">
          Your password is set. Sign in with it.
        </Notice>
      ) : null}
      <SignInForm nextPath={nextPath} email={one(email) ?? ''} />
      <p className="mt-6 text-sm text-ink-2">
        Forgotten the password, or new here? The owner of your company makes a link with which you set one.
      </p>
    </>
  );
}
