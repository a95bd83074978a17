'use client';

import { useRouter } from 'next/navigation';
import { FormProvider } from 'react-hook-form';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type InviteForm as InviteValues, inviteSchema } from '../member-schema';
import type { SponsorChoice } from '../read-members';
import { INVITE_WORDS } from '../words/members';
import { StandingFields } from './standing-fields';

interface Props {
  club: string;
  sponsors: SponsorChoice[];
  action: (club: string, values: InviteValues) => Promise<ActionAnswer<{ name: string }>>;
}

export function InviteForm({ club, sponsors, action }: Props) {
  const router = useRouter();
  const toast = useToast();
  const back = `/clubs/${club}/club/members`;
  const { form, register, errorOf, errors, pending, formProps } = useActionForm<InviteValues, { name: string }>({
    schema: inviteSchema,
    defaultValues: { name: '', email: '', role: 'member', sponsorId: '', guestFrom: '', guestTo: '' },
    submit: (values) => action(club, values),
    onDone: ({ name }) => {
      toast({ title: INVITE_WORDS.sent(name) });
      router.push(back);
    },
  });
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex max-w-2xl flex-col gap-5">
        <FormErrorSummary errors={errors} />
        <TextInput
          label={INVITE_WORDS.name}
          autoComplete="off"
          {...register('name')}
          error={errorOf('name')}
          required
        />
        <TextInput
          label={INVITE_WORDS.email}
          hint={INVITE_WORDS.emailHint}
          type="email"
          autoComplete="off"
          {...register('email')}
          error={errorOf('email')}
          required
        />
        <StandingFields sponsors={sponsors} />
        <SubmitRow label={INVITE_WORDS.send} pending={pending} pendingLabel={INVITE_WORDS.sending}>
          <ButtonLink href={back} look="quiet">
            {INVITE_WORDS.back}
          </ButtonLink>
        </SubmitRow>
      </form>
    </FormProvider>
  );
}
