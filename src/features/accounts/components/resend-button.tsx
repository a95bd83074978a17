'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { RESEND_WORDS } from '../words/resend';

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
    if (!answer) setSaid(RESEND_WORDS.lost);
    else setSaid(answer.ok ? RESEND_WORDS.sent(answer.data.email) : answer.error.message);
  }

  return (
    <div className="flex flex-wrap items-center gap-3">
      <Button onClick={send} pending={pending} pendingLabel={RESEND_WORDS.sending}>
        {RESEND_WORDS.send}
      </Button>
      <p role="status">{said}</p>
    </div>
  );
}
