'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';

export interface UnsubscribeButtonProps {
  secret: string;
  phrase: string;
  stopped: boolean;
  action: (values: { secret: string }) => Promise<ActionAnswer<{ kind: string }>>;
}

/** Opening the page stops nothing: programs that read mail open links too. */
export function UnsubscribeButton({ secret, phrase, stopped, action }: UnsubscribeButtonProps) {
  const [done, setDone] = useState(stopped);
  const [pending, setPending] = useState(false);
  const [error, setError] = useState<string>();

  async function press() {
    setPending(true);
    const answer = await action({ secret }).catch(() => null);
    setPending(false);
    setError(answer?.ok ? undefined : (answer?.error.message ?? 'The server could not be reached. Try again.'));
    if (answer?.ok) setDone(true);
  }

  return (
    <div className="grid justify-items-start gap-4">
      <p role="status" className="font-semibold">
        {done && `You get no more mail about ${phrase}.`}
      </p>
      {!done && (
        <Button look="primary" pending={pending} pendingLabel="Stopping…" onClick={() => void press()}>
          Stop this mail
        </Button>
      )}
      {error && (
        <Notice level="caution" live title="Not stopped">
          {error}
        </Notice>
      )}
    </div>
  );
}
