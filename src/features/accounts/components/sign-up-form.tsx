'use client';

import { type ReactNode, useState } from 'react';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { TextInput } from '@/ui/text-inputs';
import { signUpSchema } from '../account-schema';

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
      <Notice title="Check your mail" live>
        <p>
          We wrote to <strong className="break-words">{sentTo}</strong>. Open the link in that mail to finish and sign
          in.
        </p>
        {mailHint}
      </Notice>
    );
  }
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <TextInput
        label="Your name"
        hint="As the club knows you. Members see it on the board."
        autoComplete="name"
        {...register('name')}
        error={errorOf('name')}
        required
      />
      <TextInput
        label="E-mail"
        type="email"
        autoComplete="username"
        {...register('email')}
        error={errorOf('email')}
        required
      />
      <TextInput
        label="Password"
        hint="At least 10 characters. A few plain words do well."
        type="password"
        autoComplete="new-password"
        {...register('password')}
        error={errorOf('password')}
        required
      />
      <SubmitRow label="Make the account" pending={pending} />
    </form>
  );
}
