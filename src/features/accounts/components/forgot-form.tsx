'use client';

import { type ReactNode, useState } from 'react';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { TextInput } from '@/ui/text-inputs';
import { forgotSchema } from '../account-schema';

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
      <Notice title="Check your mail" live>
        <p>
          If there is an account with <strong className="break-words">{sentTo}</strong>, a link to choose a new password
          is on its way. It works once, for one hour.
        </p>
        {mailHint}
      </Notice>
    );
  }
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <TextInput
        label="E-mail of your account"
        type="email"
        autoComplete="username"
        {...register('email')}
        error={errorOf('email')}
        required
      />
      <SubmitRow label="Send the link" pending={pending} />
    </form>
  );
}
