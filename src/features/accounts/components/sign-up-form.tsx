'use client';

import { type ReactNode, useState } from 'react';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { signUpSchema } from '../account-schema';
import { SIGN_UP_WORDS } from '../words/forms';
import { EmailInput, NameInput, NewPasswordInput } from './account-fields';

interface Props {
  /** Where to find the mail, said after the form is sent. */
  mailHint: ReactNode;
  action: (values: { name: string; email: string; password: string }) => Promise<ActionAnswer<{ email: string }>>;
}

export function SignUpForm({ mailHint, action }: Props) {
  const [sentTo, setSentTo] = useState<string>();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: signUpSchema,
    defaultValues: { name: '', email: '', password: '' },
    submit: action,
    onDone: ({ email }: { email: string }) => setSentTo(email),
  });
  if (sentTo) {
    return (
      <Notice title={SIGN_UP_WORDS.sentTitle} live>
        <p>
          {SIGN_UP_WORDS.sentBeforeEmail}
          <strong className="break-words">{sentTo}</strong>
          {SIGN_UP_WORDS.sentAfterEmail}
        </p>
        {mailHint}
      </Notice>
    );
  }
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <NameInput {...register('name')} error={errorOf('name')} />
      <EmailInput {...register('email')} error={errorOf('email')} />
      <NewPasswordInput {...register('password')} error={errorOf('password')} />
      <SubmitRow label={SIGN_UP_WORDS.make} pending={pending} />
    </form>
  );
}
