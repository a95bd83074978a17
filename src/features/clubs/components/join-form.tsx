'use client';

import { useRouter } from 'next/navigation';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { joinSchema } from '../join-schema';
import { JOIN_WORDS } from '../words/members';

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
      <FormErrorSummary title={JOIN_WORDS.notJoined} errors={errors.map(({ message }) => ({ message }))} />
      <SubmitRow label={JOIN_WORDS.join(clubName)} pending={pending} pendingLabel={JOIN_WORDS.joining} />
    </form>
  );
}
