'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { Badge } from '@/ui/page-parts';
import { TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { saveContactSchema } from '../contact-schema';
import type { ContactView } from '../read-contact';
import { CONTACT_FORM_WORDS, CONTACT_STATES } from '../words/contact';

export interface ContactActions {
  save: (values: { name: string; email: string }) => Promise<ActionAnswer<{ asked: boolean }>>;
  switchOff: (values: { off: boolean }) => Promise<ActionAnswer<null>>;
  remove: (values: Record<string, never>) => Promise<ActionAnswer<null>>;
}

const words = CONTACT_FORM_WORDS;

function Standing({ contact, actions }: { contact: ContactView; actions: ContactActions }) {
  const toast = useToast();
  const [pending, setPending] = useState(false);
  const [error, setError] = useState<string>();

  async function flip() {
    setPending(true);
    const answer = await actions.switchOff({ off: !contact.off }).catch(() => null);
    setPending(false);
    setError(answer?.ok ? undefined : (answer?.error.message ?? words.lost));
    if (answer?.ok) toast({ title: contact.off ? words.switchedOn : words.switchedOff });
  }

  return (
    <div className="mb-5 grid gap-3">
      <p>
        {contact.name} ({contact.email}){' '}
        <Badge look={contact.state === 'agreed' ? 'moss' : 'plain'}>{CONTACT_STATES[contact.state]}</Badge>{' '}
        {contact.off && <Badge look="clay">{words.off}</Badge>}
      </p>
      {contact.state === 'expired' && <p>{words.askAgain}</p>}
      <div className="flex flex-wrap gap-3">
        <Button pending={pending} onClick={flip}>
          {contact.off ? words.switchOn : words.switchOff}
        </Button>
        <ConfirmDialog
          title={words.removeTitle}
          confirmLabel={words.remove}
          danger
          trigger={<Button look="quiet">{words.remove}</Button>}
          onConfirm={async () => {
            const answer = await actions.remove({}).catch(() => null);
            if (!answer?.ok) return answer?.error.message ?? words.lost;
            toast({ title: words.removed });
          }}
        >
          <p>{words.removeText}</p>
        </ConfirmDialog>
      </div>
      {error && (
        <Notice level="caution" live title={words.notSaved}>
          {error}
        </Notice>
      )}
    </div>
  );
}

/** Names who is told when the reader is overdue in any of their clubs. */
export function ContactForm({ contact, actions }: { contact: ContactView | null; actions: ContactActions }) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: saveContactSchema,
    defaultValues: { name: contact?.name ?? '', email: contact?.email ?? '' },
    submit: actions.save,
    onDone: ({ asked }) => toast(asked ? { title: words.asked, text: words.askedText } : { title: words.saved }),
  });
  return (
    <>
      {contact && <Standing contact={contact} actions={actions} />}
      <form {...formProps} className="flex flex-col gap-5">
        <FormErrorSummary errors={errors} />
        <TextInput label={words.name} {...register('name')} error={errorOf('name')} autoComplete="off" required />
        <TextInput
          label={words.email}
          hint={words.emailHint}
          type="email"
          {...register('email')}
          error={errorOf('email')}
          autoComplete="off"
          required
        />
        <SubmitRow label={contact ? words.save : words.ask} look="plain" pending={pending} />
      </form>
    </>
  );
}
