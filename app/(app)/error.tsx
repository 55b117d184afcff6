'use client';

import { useEffect } from 'react';
import { Failed } from '@/components/ui/states';

type ErrorProps = { error: Error & { digest?: string }; retry: () => void };

export default function ScreenError({ error, retry }: ErrorProps) {
  useEffect(() => console.error(error), [error]);
  return (
    <Failed
      title="This screen could not be drawn."
      error={
        new Error(
          `The fault is on our side and has been logged${error.digest ? ` under ${error.digest}` : ''}. Nothing was changed.`,
        )
      }
      onRetry={retry}
    />
  );
}
