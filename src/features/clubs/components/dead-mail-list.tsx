'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { DEAD_MAIL_WORDS } from '../words/records';

export interface DeadMailLine {
  id: string;
  subject: string;
  to: string;
  /** 'Given up Sat 7 Nov 2026, 6:05 AM after 8 tries.' */
  when: string;
  error: string;
}

type Retry = (club: string, values: { id: string }) => Promise<ActionAnswer<{ toName: string }>>;

interface Props {
  club: string;
  lines: DeadMailLine[];
  action: Retry;
}

export function DeadMailList({ club, lines, action }: Props) {
  return (
    <ul className="divide-y divide-rule border-rule border-y">
      {lines.map((line) => (
        <li key={line.id} className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2 py-3">
          <div className="min-w-0">
            <p className="break-words font-semibold">{line.subject}</p>
            <p className="break-words">{DEAD_MAIL_WORDS.to(line.to)}</p>
            <p className="text-ink-soft text-sm">{line.when}</p>
            <p className="break-words text-sm">{line.error}</p>
          </div>
          <RetryButton club={club} line={line} action={action} />
        </li>
      ))}
    </ul>
  );
}

function RetryButton({ club, line, action }: { club: string; line: DeadMailLine; action: Retry }) {
  const toast = useToast();
  const [pending, setPending] = useState(false);
  async function retry() {
    setPending(true);
    const answer = await action(club, { id: line.id }).catch(() => null);
    setPending(false);
    if (!answer) toast({ title: DEAD_MAIL_WORDS.lost, level: 'caution' });
    else if (!answer.ok) toast({ title: DEAD_MAIL_WORDS.notSent, text: answer.error.message, level: 'caution' });
    else toast({ title: DEAD_MAIL_WORDS.again(answer.data.toName) });
  }
  return (
    <Button
      onClick={retry}
      pending={pending}
      pendingLabel={DEAD_MAIL_WORDS.working}
      aria-label={DEAD_MAIL_WORDS.sendLabel(line.subject)}
    >
      {DEAD_MAIL_WORDS.send}
    </Button>
  );
}
