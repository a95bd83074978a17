'use client';

import { useRouter } from 'next/navigation';
import { EmailInput, NameInput, NewPasswordInput } from '@/features/accounts/components/account-fields';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { joinNewSchema } from '../join-schema';
import { JOIN_NEW_WORDS } from '../words/members';

interface Values {
  token: string;
  name: string;
  password: string;
}

interface Props {
  token: string;
  /** As the inviter wrote it. */
  name: string;
  email: string;
  clubName: string;
  action: (values: Values) => Promise<ActionAnswer<{ slug: string }>>;
}

/** Name and password, for an invited address without an account. */
export function JoinNewForm({ token, name, email, clubName, action }: Props) {
  const router = useRouter();
  const { register, errorOf, errors, pending, formProps } = useActionForm<Values, { slug: string }>({
    schema: joinNewSchema,
    defaultValues: { token, name, password: '' },
    submit: (values) => action({ ...values, token }),
    onDone: ({ slug }) => router.push(`/clubs/${slug}`),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <NameInput {...register('name')} error={errorOf('name')} />
      <EmailInput hint={JOIN_NEW_WORDS.emailHint} value={email} readOnly required={false} />
      <NewPasswordInput {...register('password')} error={errorOf('password')} />
      <SubmitRow label={JOIN_NEW_WORDS.join(clubName)} pending={pending} pendingLabel={JOIN_NEW_WORDS.joining} />
    </form>
  );
}
