'use client';

import { useRouter } from 'next/navigation';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { resetSchema } from '../account-schema';

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
      <TextInput
        label="New password"
        hint="At least 10 characters. A few plain words do well."
        type="password"
        autoComplete="new-password"
        {...register('password')}
        error={errorOf('password')}
        required
      />
      <SubmitRow label="Set it and sign in" pending={pending} />
    </form>
  );
}
