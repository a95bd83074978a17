'use client';

import { Button, ButtonLink } from '@/ui/button';
import { ErrorState } from '@/ui/notices';

interface Props {
  error: Error & { digest?: string };
  reset: () => void;
}

export default function ErrorPage({ error, reset }: Props) {
  return (
    <main id="main" className="mx-auto w-full max-w-lg px-5 py-10">
      <h1 className="sr-only">Something went wrong</h1>
      <ErrorState
        title="Something went wrong on our side"
        reference={error.digest}
        action={
          <>
            <Button look="primary" onClick={reset}>
              Try again
            </Button>
            <ButtonLink href="/">First page</ButtonLink>
          </>
        }
      >
        Nothing you had saved is lost. Try again; if it stays, tell your club’s admin the reference below.
      </ErrorState>
    </main>
  );
}
