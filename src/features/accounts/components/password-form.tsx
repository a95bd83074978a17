'use client';

import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { changePasswordSchema } from '../account-schema';

interface Props {
  email: string;
  action: (values: { current: string; password: string }) => Promise<ActionAnswer<null>>;
}

export function PasswordForm({ email, action }: Props) {
  const toast = useToast();
  const { form, register, errorOf, errors, pending, formProps } = useActionForm({
    schema: changePasswordSchema,
    defaultValues: { current: '', password: '' },
    submit: action,
    onDone: () => {
      form.reset();
      toast({ title: 'Password changed', text: 'Your other browsers were signed out.' });
    },
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <input type="email" autoComplete="username" defaultValue={email} hidden readOnly />
      <TextInput
        label="Password now"
        type="password"
        autoComplete="current-password"
        {...register('current')}
        error={errorOf('current')}
        required
      />
      <TextInput
        label="New password"
        hint="At least 10 characters. A few plain words do well."
        type="password"
        autoComplete="new-password"
        {...register('password')}
        error={errorOf('password')}
        required
      />
      <SubmitRow label="Change the password" look="plain" pending={pending} />
    </form>
  );
}
