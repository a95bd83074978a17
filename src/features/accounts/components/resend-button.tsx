'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import type { ActionAnswer } from '@/ui/form/use-action-form';

interface Props {
  action: (values: Record<string, never>) => Promise<ActionAnswer<{ email: string }>>;
}

export function ResendButton({ action }: Props) {
  const [pending, setPending] = useState(false);
  const [said, setSaid] = useState('');

  async function send() {
    setPending(true);
    const answer = await action({}).catch(() => null);
    setPending(false);
    if (!answer) setSaid('The server could not be reached. Try again.');
    else setSaid(answer.ok ? `Sent to ${answer.data.email}. Only the newest link works.` : answer.error.message);
  }

  return (
    <div className="flex flex-wrap items-center gap-3">
      <Button onClick={send} pending={pending} pendingLabel="Sending…">
        Send the link again
      </Button>
      <p role="status">{said}</p>
    </div>
  );
}
