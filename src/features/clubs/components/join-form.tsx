'use client';

import { useRouter } from 'next/navigation';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { joinSchema } from '../join-schema';

interface Props {
  token: string;
  clubName: string;
  action: (values: { token: string }) => Promise<ActionAnswer<{ slug: string }>>;
}

/** One button, for a person who is signed in. */
export function JoinForm({ token, clubName, action }: Props) {
  const router = useRouter();
  const { errors, pending, formProps } = useActionForm<{ token: string }, { slug: string }>({
    schema: joinSchema,
    defaultValues: { token },
    submit: () => action({ token }),
    onDone: ({ slug }) => router.push(`/clubs/${slug}`),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary title="You have not joined" errors={errors.map(({ message }) => ({ message }))} />
      <SubmitRow label={`Join ${clubName}`} pending={pending} pendingLabel="Joining…" />
    </form>
  );
}
