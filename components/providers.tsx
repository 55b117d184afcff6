'use client';

import { QueryCache, QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { ThemeProvider } from 'next-themes';
import { NuqsAdapter } from 'nuqs/adapters/next/app';
import { type ReactNode, useState } from 'react';
import { ApiError } from '@/lib/api/client';

const MOST_TRIES = 2;

// A refusal stays one however often it is asked; a lost connection or a fault of the server may pass.
const mayPass = (error: Error) => !(error instanceof ApiError) || error.status === 0 || error.status >= 500;

// A session that was ended elsewhere: the door leads back here.
const leaveWhenSignedOut = (error: Error) => {
  if (!(error instanceof ApiError) || error.status !== 401) return;
  const here = `${window.location.pathname}${window.location.search}`;
  window.location.assign(`/sign-in?next=${encodeURIComponent(here)}`);
};

const makeQueryClient = () =>
  new QueryClient({
    queryCache: new QueryCache({ onError: leaveWhenSignedOut }),
    defaultOptions: {
      queries: {
        staleTime: 30_000,
        retry: (failures, error) => failures < MOST_TRIES && mayPass(error),
      },
    },
  });

/** What every screen stands in: data, address and theme. */
export const Providers = ({ nonce, children }: { nonce: string | undefined; children: ReactNode }) => {
  const [queryClient] = useState(makeQueryClient);
  return (
    <ThemeProvider
      attribute="data-theme"
      defaultTheme="system"
      enableColorScheme={false}
      disableTransitionOnChange
      {...(nonce ? { nonce } : {})}
    >
      <QueryClientProvider client={queryClient}>
        <NuqsAdapter>{children}</NuqsAdapter>
      </QueryClientProvider>
    </ThemeProvider>
  );
};
