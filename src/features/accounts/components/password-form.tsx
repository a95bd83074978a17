'use client';

import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { changePasswordSchema } from '../account-schema';
import { ACCOUNT_FIELD_WORDS, PASSWORD_WORDS } from '../words/forms';
import { CurrentPasswordInput, NewPasswordInput } from './account-fields';

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
      toast({ title: PASSWORD_WORDS.changed, text: PASSWORD_WORDS.changedText });
    },
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <input type="email" autoComplete="username" defaultValue={email} hidden readOnly />
      <CurrentPasswordInput label={PASSWORD_WORDS.current} {...register('current')} error={errorOf('current')} />
      <NewPasswordInput label={ACCOUNT_FIELD_WORDS.newPassword} {...register('password')} error={errorOf('password')} />
      <SubmitRow label={PASSWORD_WORDS.change} look="plain" pending={pending} />
    </form>
  );
}
