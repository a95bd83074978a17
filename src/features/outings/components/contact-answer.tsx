'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { CONTACT_ANSWER_WORDS } from '../words/contact';

export type AnswerAction = (values: {
  secret: string;
  answer: 'yes' | 'no';
}) => Promise<ActionAnswer<{ agreed: boolean }>>;

const words = CONTACT_ANSWER_WORDS;

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
    setError(result?.ok ? undefined : (result?.error.message ?? words.lost));
    if (result?.ok) setAnswer(next);
  }

  return (
    <div className="grid gap-4">
      <p role="status" className="font-semibold">
        {answer === 'yes' && words.agreed(memberName)}
        {answer === 'no' && words.declined(memberName)}
      </p>
      <div className="flex flex-wrap gap-3">
        {answer !== 'yes' && !onlyStop && (
          <Button look="primary" pending={pending} onClick={() => say('yes')}>
            {words.yes}
          </Button>
        )}
        {answer !== 'no' && (
          <Button pending={pending} onClick={() => say('no')}>
            {answer === 'yes' ? words.stop : words.no}
          </Button>
        )}
      </div>
      {error && (
        <Notice level="caution" live title={words.notSaved}>
          {error}
        </Notice>
      )}
    </div>
  );
}
