'use client';

import { FormProvider } from 'react-hook-form';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { type ChangeMemberForm as ChangeValues, changeMemberSchema } from '../member-schema';
import type { SponsorChoice } from '../read-members';
import { CHANGE_MEMBER_WORDS } from '../words/members';
import { StandingFields } from './standing-fields';

interface Changed {
  name: string;
  changed: boolean;
}

interface Props {
  club: string;
  member: ChangeValues;
  sponsors: SponsorChoice[];
  action: (club: string, values: ChangeValues) => Promise<ActionAnswer<Changed>>;
}

export function ChangeMemberForm({ club, member, sponsors, action }: Props) {
  const toast = useToast();
  const { form, errors, pending, formProps } = useActionForm<ChangeValues, Changed>({
    schema: changeMemberSchema,
    defaultValues: member,
    submit: (values) => action(club, values),
    onDone: ({ name, changed }) =>
      toast({ title: changed ? CHANGE_MEMBER_WORDS.saved(name) : CHANGE_MEMBER_WORDS.nothing }),
  });
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex max-w-2xl flex-col gap-5">
        <FormErrorSummary title={CHANGE_MEMBER_WORDS.notSaved} errors={errors} />
        <StandingFields sponsors={sponsors} />
        <SubmitRow label={CHANGE_MEMBER_WORDS.save} pending={pending} />
      </form>
    </FormProvider>
  );
}
