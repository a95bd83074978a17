'use client';

import { useRouter } from 'next/navigation';
import type { ActionResult } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, Textarea, TextInput, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { WORK_DAY_FORM_WORDS } from '../words/work-days';
import { type WorkDayForm, workDaySchema } from '../work-day-schema';

const words = WORK_DAY_FORM_WORDS;

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
      toast({ title: at ? words.changed : words.set });
      router.push(back);
    },
  });
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      <TextInput label={words.name} {...register('title')} error={errorOf('title')} />
      <DateInput label={words.day} {...register('day')} error={errorOf('day')} />
      <div className="grid grid-cols-2 gap-4">
        <TimeInput label={words.from} {...register('startClock')} error={errorOf('startClock')} />
        <TimeInput label={words.to} {...register('endClock')} error={errorOf('endClock')} />
      </div>
      <TextInput label={words.meet} optional {...register('meet')} error={errorOf('meet')} />
      <Textarea label={words.notes} optional rows={3} {...register('notes')} error={errorOf('notes')} />
      <SubmitRow label={at ? words.save : words.add} pending={pending} pendingLabel={words.saving}>
        <ButtonLink href={back} look="quiet">
          {words.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
