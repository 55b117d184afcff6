'use client';

import { useEffect } from 'react';
import './globals.css';

type ErrorProps = { error: Error & { digest?: string }; retry: () => void };

/** Stands in for the whole page when even its frame could not be drawn. */
export default function GlobalError({ error, retry }: ErrorProps) {
  useEffect(() => console.error(error), [error]);
  return (
    <html lang="en">
      <body className="border-t-6 border-shoulder">
        <title>Tarebook: a fault on our side</title>
        <main className="mx-auto max-w-2xl px-4 py-12 sm:px-8">
          <h1 className="text-2xl font-semibold">This page could not be drawn.</h1>
          <p className="mt-3 text-ink-2">
            The fault is on our side and has been logged{error.digest ? ` under ${error.digest}` : ''}. Nothing was
            changed.
          </p>
          <button
            type="button"
            onClick={() => retry()}
            className="mt-6 min-h-11 border border-act bg-act px-4 font-medium text-act-ink"
          >
            Try again
          </button>
        </main>
      </body>
    </html>
  );
}
