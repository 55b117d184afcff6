import type { Metadata } from 'next';
import { Wordmark } from '@/components/shell/mark';
import { LinkButton } from '@/components/ui/button';

export const metadata: Metadata = { title: 'Not here' };

export default function NotFound() {
  return (
    <div className="border-t-6 border-shoulder">
      <main className="mx-auto max-w-2xl px-4 py-12 sm:px-8">
        <Wordmark />
        <h1 className="mt-10 text-2xl font-semibold tracking-tight">There is nothing at this address.</h1>
        <p className="mt-3 text-ink-2">
          It may have been removed, belong to another company, or be spelled differently. Nothing was changed.
        </p>
        <LinkButton href="/" tone="primary" className="mt-6">
          Go to the start
        </LinkButton>
      </main>
    </div>
  );
}
