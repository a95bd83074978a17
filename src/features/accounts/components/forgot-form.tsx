'use client';

import { type ReactNode, useState } from 'react';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { forgotSchema } from '../account-schema';
import { FORGOT_WORDS } from '../words/forms';
import { EmailInput } from './account-fields';

interface Props {
  mailHint: ReactNode;
  action: (values: { email: string }) => Promise<ActionAnswer<{ email: string }>>;
}

export function ForgotForm({ mailHint, action }: Props) {
  const [sentTo, setSentTo] = useState<string>();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: forgotSchema,
    defaultValues: { email: '' },
    submit: action,
    onDone: ({ email }: { email: string }) => setSentTo(email),
  });
  if (sentTo) {
    return (
      <Notice title={FORGOT_WORDS.sentTitle} live>
        <p>
          {FORGOT_WORDS.sentBeforeEmail}
          <strong className="break-words">{sentTo}</strong>
          {FORGOT_WORDS.sentAfterEmail}
        </p>
        {mailHint}
      </Notice>
    );
  }
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <EmailInput label={FORGOT_WORDS.email} {...register('email')} error={errorOf('email')} />
      <SubmitRow label={FORGOT_WORDS.send} pending={pending} />
    </form>
  );
}
