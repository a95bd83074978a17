'use client';

import { useRouter } from 'next/navigation';
import { TextLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { signInSchema } from '../account-schema';

interface Props {
  next: string | undefined;
  action: (values: { email: string; password: string; next?: string }) => Promise<ActionAnswer<{ to: string }>>;
}

export function SignInForm({ next, action }: Props) {
  const router = useRouter();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: signInSchema,
    defaultValues: { email: '', password: '', ...(next ? { next } : {}) },
    submit: action,
    onDone: ({ to }: { to: string }) => router.push(to),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} title="You are not signed in yet" />
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
        type="password"
        autoComplete="current-password"
        {...register('password')}
        error={errorOf('password')}
        required
      />
      <SubmitRow label="Sign in" pending={pending} pendingLabel="Signing in…">
        <TextLink href="/forgot">Forgot your password?</TextLink>
      </SubmitRow>
    </form>
  );
}
