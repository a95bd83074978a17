'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';

export type AnswerAction = (values: {
  secret: string;
  answer: 'yes' | 'no';
}) => Promise<ActionAnswer<{ agreed: boolean }>>;

const LOST = 'The server could not be reached. Try again.';

interface Props {
  secret: string;
  memberName: string;
  answered: 'yes' | 'no' | null;
  action: AnswerAction;
  /** Only to stop: on the page of an overdue mail. */
  onlyStop?: boolean;
}

/** The contact's own yes or no, changed as often as they like. Nothing happens by opening the page. */
export function ContactAnswer({ secret, memberName, answered, action, onlyStop }: Props) {
  const [answer, setAnswer] = useState(answered);
  const [pending, setPending] = useState(false);
  const [error, setError] = useState<string>();

  async function say(next: 'yes' | 'no') {
    setPending(true);
    const result = await action({ secret, answer: next }).catch(() => null);
    setPending(false);
    setError(result?.ok ? undefined : (result?.error.message ?? LOST));
    if (result?.ok) setAnswer(next);
  }

  return (
    <div className="grid gap-4">
      <p role="status" className="font-semibold">
        {answer === 'yes' && `You are the safety contact of ${memberName}.`}
        {answer === 'no' && `You said no. You hear nothing more about ${memberName} from here.`}
      </p>
      <div className="flex flex-wrap gap-3">
        {answer !== 'yes' && !onlyStop && (
          <Button look="primary" pending={pending} onClick={() => say('yes')}>
            Yes, tell me
          </Button>
        )}
        {answer !== 'no' && (
          <Button pending={pending} onClick={() => say('no')}>
            {answer === 'yes' ? 'Stop being the contact' : 'No'}
          </Button>
        )}
      </div>
      {error && (
        <Notice level="caution" live title="Not saved">
          {error}
        </Notice>
      )}
    </div>
  );
}
