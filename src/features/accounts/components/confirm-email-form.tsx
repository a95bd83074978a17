'use client';

import { useRouter } from 'next/navigation';
import { TextLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { verifySchema } from '../account-schema';

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
      <FormErrorSummary errors={errors} title="That did not work" />
      <TextInput
        label="Password"
        hint="The one you chose when you made the account."
        type="password"
        autoComplete="current-password"
        {...register('password')}
        error={errorOf('password')}
        required
      />
      <SubmitRow label="Confirm and sign in" pending={pending}>
        <TextLink href="/forgot">Password forgotten</TextLink>
      </SubmitRow>
    </form>
  );
}
