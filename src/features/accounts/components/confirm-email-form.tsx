'use client';

import { useRouter } from 'next/navigation';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { verifySchema } from '../account-schema';

interface Props {
  token: string;
  action: (values: { token: string }) => Promise<ActionAnswer<{ to: string }>>;
}

/** A press, not the opening of the page, uses the link up: mail scanners open links too. */
export function ConfirmEmailForm({ token, action }: Props) {
  const router = useRouter();
  const { errors, pending, formProps } = useActionForm({
    schema: verifySchema,
    defaultValues: { token },
    submit: action,
    onDone: ({ to }: { to: string }) => router.push(to),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} title="That did not work" />
      <SubmitRow label="Confirm and sign in" pending={pending} />
    </form>
  );
}
