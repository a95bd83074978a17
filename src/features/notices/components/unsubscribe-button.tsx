'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { UNSUBSCRIBE_BUTTON_WORDS } from '../words/choices';

const words = UNSUBSCRIBE_BUTTON_WORDS;

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
    setError(answer?.ok ? undefined : (answer?.error.message ?? words.lost));
    if (answer?.ok) setDone(true);
  }

  return (
    <div className="grid justify-items-start gap-4">
      <p role="status" className="font-semibold">
        {done && words.stopped(phrase)}
      </p>
      {!done && (
        <Button look="primary" pending={pending} pendingLabel={words.stopping} onClick={() => void press()}>
          {words.stop}
        </Button>
      )}
      {error && (
        <Notice level="caution" live title={words.notStopped}>
          {error}
        </Notice>
      )}
    </div>
  );
}
