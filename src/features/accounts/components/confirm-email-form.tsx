'use client';

import { useRouter } from 'next/navigation';
import { TextLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { verifySchema } from '../account-schema';
import { CONFIRM_EMAIL_WORDS } from '../words/forms';
import { CurrentPasswordInput } from './account-fields';

interface Props {
  token: string;
  action: (values: { token: string; password: string }) => Promise<ActionAnswer<{ to: string }>>;
}

/** A press, not the opening of the page, uses the link up: mail scanners open links too. */
export function ConfirmEmailForm({ token, action }: Props) {
  const router = useRouter();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: verifySchema,
    defaultValues: { token, password: '' },
    submit: action,
    onDone: ({ to }: { to: string }) => router.push(to),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} title={CONFIRM_EMAIL_WORDS.failed} />
      <CurrentPasswordInput
        hint={CONFIRM_EMAIL_WORDS.passwordHint}
        {...register('password')}
        error={errorOf('password')}
      />
      <SubmitRow label={CONFIRM_EMAIL_WORDS.confirm} pending={pending}>
        <TextLink href="/forgot">{CONFIRM_EMAIL_WORDS.passwordForgotten}</TextLink>
      </SubmitRow>
    </form>
  );
}
