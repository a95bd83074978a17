'use client';

import { useRouter } from 'next/navigation';
import type { ActionResult } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, Textarea, TextInput, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type WorkDayForm, workDaySchema } from '../work-day-schema';

export interface WorkDayFormProps {
  club: string;
  values: WorkDayForm;
  /** Set: changes that work day in place of adding one. */
  at: { id: string; sequence: number } | null;
  add: (club: string, values: WorkDayForm) => Promise<ActionResult<{ id: string }>>;
  change: (
    club: string,
    values: WorkDayForm & { id: string; sequence: number },
  ) => Promise<ActionResult<{ id: string }>>;
}

export function WorkDayFormView({ club, values, at, add, change }: WorkDayFormProps) {
  const router = useRouter();
  const toast = useToast();
  const back = `/clubs/${club}/chores`;
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: workDaySchema,
    defaultValues: values,
    submit: (typed: WorkDayForm) => (at ? change(club, { ...typed, ...at }) : add(club, typed)),
    onDone: () => {
      toast({ title: at ? 'Work day changed' : 'Work day set' });
      router.push(back);
    },
  });
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      <TextInput label="Name" {...register('title')} error={errorOf('title')} />
      <DateInput label="Day" {...register('day')} error={errorOf('day')} />
      <div className="grid grid-cols-2 gap-4">
        <TimeInput label="From" {...register('startClock')} error={errorOf('startClock')} />
        <TimeInput label="To" {...register('endClock')} error={errorOf('endClock')} />
      </div>
      <TextInput label="Meet at" optional {...register('meet')} error={errorOf('meet')} />
      <Textarea label="Notes" optional rows={3} {...register('notes')} error={errorOf('notes')} />
      <SubmitRow label={at ? 'Save work day' : 'Set work day'} pending={pending} pendingLabel="Saving…">
        <ButtonLink href={back} look="quiet">
          Back without saving
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
