'use client';

import { useRouter } from 'next/navigation';
import type { ActionResult } from '@/server/doors';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { WorkDayScreen } from '../reads';
import { CREDIT_FORM_WORDS } from '../words/work-days';
import { type CreditForm, creditSchema } from '../work-day-schema';

const words = CREDIT_FORM_WORDS;

export interface CreditFormProps {
  club: string;
  id: string;
  members: WorkDayScreen['members'];
  credit: (club: string, values: CreditForm) => Promise<ActionResult<{ credited: number }>>;
}

/** The hours of a work day, a field a member. */
export function CreditFormView({ club, id, members, credit }: CreditFormProps) {
  const router = useRouter();
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: creditSchema,
    defaultValues: { id, members: members.map(({ memberId, hours }) => ({ memberId, hours })) },
    submit: (typed: CreditForm) => credit(club, typed),
    onDone: ({ credited }) => {
      toast({ title: words.credited(credited) });
      router.push(`/clubs/${club}/chores`);
    },
  });
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      <div className="grid gap-4 sm:grid-cols-2">
        {members.map((member, index) => (
          <TextInput
            key={member.memberId}
            label={member.name}
            hint={member.comes ? words.saidToCome : undefined}
            unit="h"
            inputMode="decimal"
            className="max-w-28"
            {...register(`members.${index}.hours`)}
            error={errorOf(`members.${index}.hours`)}
          />
        ))}
      </div>
      <SubmitRow label={words.credit} pending={pending} pendingLabel={words.saving} />
    </form>
  );
}
