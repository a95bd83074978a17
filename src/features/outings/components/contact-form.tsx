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
import type { ContactState, ContactView } from '../read-contact';

export interface ContactActions {
  save: (values: { name: string; email: string }) => Promise<ActionAnswer<{ asked: boolean }>>;
  switchOff: (values: { off: boolean }) => Promise<ActionAnswer<null>>;
  remove: (values: Record<string, never>) => Promise<ActionAnswer<null>>;
}

const LOST = 'The server could not be reached. Try again.';

const STATES: Record<ContactState, string> = {
  asked: 'Asked, no answer yet',
  expired: 'Did not answer in 14 days',
  agreed: 'Agreed',
  declined: 'Said no',
};

function Standing({ contact, actions }: { contact: ContactView; actions: ContactActions }) {
  const toast = useToast();
  const [pending, setPending] = useState(false);
  const [error, setError] = useState<string>();

  async function flip() {
    setPending(true);
    const answer = await actions.switchOff({ off: !contact.off }).catch(() => null);
    setPending(false);
    setError(answer?.ok ? undefined : (answer?.error.message ?? LOST));
    if (answer?.ok) toast({ title: contact.off ? 'They are told again' : 'They are not told any more' });
  }

  return (
    <div className="mb-5 grid gap-3">
      <p>
        {contact.name} ({contact.email}){' '}
        <Badge look={contact.state === 'agreed' ? 'moss' : 'plain'}>{STATES[contact.state]}</Badge>{' '}
        {contact.off && <Badge look="clay">Switched off</Badge>}
      </p>
      {contact.state === 'expired' && <p>Save them again to ask once more.</p>}
      <div className="flex flex-wrap gap-3">
        <Button pending={pending} onClick={flip}>
          {contact.off ? 'Switch on again' : 'Switch off for now'}
        </Button>
        <ConfirmDialog
          title="Remove your safety contact?"
          confirmLabel="Remove"
          danger
          trigger={<Button look="quiet">Remove</Button>}
          onConfirm={async () => {
            const answer = await actions.remove({}).catch(() => null);
            if (!answer?.ok) return answer?.error.message ?? LOST;
            toast({ title: 'Safety contact removed' });
          }}
        >
          <p>Nobody at home is told when you are overdue, until you name somebody who agrees.</p>
        </ConfirmDialog>
      </div>
      {error && (
        <Notice level="caution" live title="Not saved">
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
    onDone: ({ asked }) =>
      toast(asked ? { title: 'Asked', text: 'They get a mail and answer there.' } : { title: 'Saved' }),
  });
  return (
    <>
      {contact && <Standing contact={contact} actions={actions} />}
      <form {...formProps} className="flex flex-col gap-5">
        <FormErrorSummary errors={errors} />
        <TextInput label="Their name" {...register('name')} error={errorOf('name')} autoComplete="off" required />
        <TextInput
          label="Their e-mail address"
          hint="They are asked first, and told nothing until they agree."
          type="email"
          {...register('email')}
          error={errorOf('email')}
          autoComplete="off"
          required
        />
        <SubmitRow label={contact ? 'Save the contact' : 'Ask them'} look="plain" pending={pending} />
      </form>
    </>
  );
}
