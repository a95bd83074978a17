'use client';

import { useRouter } from 'next/navigation';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { resetSchema } from '../account-schema';
import { ACCOUNT_FIELD_WORDS, RESET_WORDS } from '../words/forms';
import { NewPasswordInput } from './account-fields';

interface Props {
  token: string;
  email: string;
  action: (values: { token: string; password: string }) => Promise<ActionAnswer<{ to: string }>>;
}

export function ResetForm({ token, email, action }: Props) {
  const router = useRouter();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: resetSchema,
    defaultValues: { token, password: '' },
    submit: action,
    onDone: ({ to }: { to: string }) => router.push(to),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      {/* Lets a password keeper know whose password this is. */}
      <input type="email" autoComplete="username" defaultValue={email} hidden readOnly />
      <NewPasswordInput label={ACCOUNT_FIELD_WORDS.newPassword} {...register('password')} error={errorOf('password')} />
      <SubmitRow label={RESET_WORDS.set} pending={pending} />
    </form>
  );
}
