'use client';

import { useEffect } from 'react';
import { AppHeader } from '@/components/site/app-header';
import { ErrorState } from '@/components/ui/states';

export default function PageError({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  useEffect(() => console.error(error), [error]);
  return (
    <>
      <AppHeader />
      <main id="main">
        <ErrorState level={1} title="This page broke" onRetry={reset}>
          <p>What was saved is safe. Try again; if it breaks once more, reload the page.</p>
          {error.digest ? <p className="figure text-base">Code {error.digest}</p> : null}
        </ErrorState>
      </main>
    </>
  );
}
