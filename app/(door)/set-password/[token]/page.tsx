import type { Metadata } from 'next';
import { LinkButton } from '@/components/ui/button';
import { personOfLink } from '@/lib/auth/password-links';
import { LEAST_PASSWORD_LENGTH } from '@/lib/auth/passwords';
import { setPassword } from './actions';
import { SetPasswordForm } from './set-password-form';

export const metadata: Metadata = { title: 'Set a password', referrer: 'no-referrer' };

export default async function SetPasswordPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const person = await personOfLink(token);
  if (!person) {
    return (
      <>
        <h1 className="text-2xl font-semibold tracking-tight">This link no longer opens.</h1>
        <p className="mt-3 text-ink-2">
          It works once and for seven days. Ask the owner of your company for a new one; if you have set a password
          already, sign in with it.
        </p>
        <LinkButton href="/sign-in" tone="primary" className="mt-6 w-full">
          Go to sign in
        </LinkButton>
      </>
    );
  }
  return (
    <>
      <h1 className="text-2xl font-semibold tracking-tight">Set your password</h1>
      <p className="mt-3 text-ink-2">
        For {person.name}, who signs in as <span className="break-all text-ink">{person.email}</span>.
      </p>
      <SetPasswordForm
        email={person.email}
        leastLength={LEAST_PASSWORD_LENGTH}
        setPassword={setPassword.bind(null, token)}
      />
    </>
  );
}
