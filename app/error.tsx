'use client';

import { Button, ButtonLink } from '@/components/ui/button';

interface PageErrorProps {
  error: Error & { digest?: string };
  reset: () => void;
}

export default function PageError({ error, reset }: PageErrorProps) {
  return (
    <main className="px-6 py-9 max-md:px-4">
      <h1>This page did not open</h1>
      <p className="max-w-prose py-3">
        The fault is ours and is written down. What you saved before is kept; what was being typed here may be
        lost.
        {error.digest && (
          <span className="block text-quiet">
            Say <span className="num">{error.digest}</span> when you report it.
          </span>
        )}
      </p>
      <div className="flex flex-wrap gap-2.5">
        <Button look="primary" onClick={reset}>
          Open it again
        </Button>
        <ButtonLink href="/">To the tideline</ButtonLink>
      </div>
    </main>
  );
}
