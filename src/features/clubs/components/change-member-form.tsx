'use client';

import { FormProvider } from 'react-hook-form';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { type ChangeMemberForm as ChangeValues, changeMemberSchema } from '../member-schema';
import type { SponsorChoice } from '../read-members';
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
      toast({ title: changed ? `Saved: ${name}` : 'Nothing was different, so nothing was saved.' }),
  });
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex max-w-2xl flex-col gap-5">
        <FormErrorSummary title="This was not saved" errors={errors} />
        <StandingFields sponsors={sponsors} />
        <SubmitRow label="Save" pending={pending} />
      </form>
    </FormProvider>
  );
}
