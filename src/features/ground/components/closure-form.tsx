'use client';

import { useState } from 'react';
import { formatDay } from '@/core/day-time';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { queryClient } from '@/ui/query';
import { DateInput, Select, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type ClosureForm, closureSchema } from '../closure-schema';
import type { BookedSit } from '../people-data';
import { touchedSitsQuery } from '../queries';
import type { ClubCall } from './form-types';

const WINDOW_WORDS = { morning: 'morning', evening: 'evening', all_day: 'all day' } as const;

interface Question {
  touched: BookedSit[];
  answer: (goOn: boolean) => void;
}

export interface ClosureFormProps {
  club: string;
  today: string;
  /** Empty for somebody who closes the whole ground only. */
  stands: { id: string; name: string }[];
  standId: string;
  close: ClubCall<ClosureForm, { id: string; touched: BookedSit[] }>;
}

/** Closes days; booked sits that they fall on are shown before anything is saved. */
export function ClosureFormView({ club, today, stands, standId, close }: ClosureFormProps) {
  const toast = useToast();
  const [question, setQuestion] = useState<Question | null>(null);

  async function agreed(typed: ClosureForm): Promise<boolean> {
    const { standId, fromDay, toDay } = typed;
    const touched = await queryClient().fetchQuery(touchedSitsQuery(club, { standId, fromDay, toDay }));
    if (touched.length === 0) return true;
    return new Promise((answer) => setQuestion({ touched, answer }));
  }

  function settle(goOn: boolean) {
    question?.answer(goOn);
    setQuestion(null);
  }

  const fields = useActionForm<ClosureForm, { id: string; touched: BookedSit[] }>({
    schema: closureSchema,
    defaultValues: { standId, fromDay: today, toDay: '', reason: '' },
    submit: async (typed) =>
      (await agreed(typed)) ? close(club, typed) : { ok: false, error: { message: 'Nothing was closed.' } },
    onDone: () => {
      toast({ title: 'Closed' });
      fields.form.reset({ standId: '', fromDay: today, toDay: '', reason: '' });
      fields.form.setFocus('fromDay');
    },
  });
  const { register, errorOf } = fields;

  return (
    <form {...fields.formProps} className="flex max-w-2xl flex-col gap-4">
      <FormErrorSummary errors={fields.errors} />
      {stands.length > 0 && (
        <Select
          label="What is closed"
          options={[
            { value: '', label: 'The whole ground' },
            ...stands.map(({ id, name }) => ({ value: id, label: name })),
          ]}
          error={errorOf('standId')}
          {...register('standId')}
        />
      )}
      <div className="grid gap-4 sm:grid-cols-2">
        <DateInput label="First closed day" error={errorOf('fromDay')} {...register('fromDay')} />
        <DateInput
          label="Last closed day"
          hint={stands.length > 0 ? 'A stand may be left without one: closed until opened again' : undefined}
          error={errorOf('toDay')}
          {...register('toDay')}
        />
      </div>
      <TextInput label="Reason" hint="Members read it" error={errorOf('reason')} {...register('reason')} />
      <SubmitRow label="Close" pending={fields.pending} pendingLabel="Closing…" />
      <ConfirmDialog
        open={question !== null}
        onOpenChange={(open) => !open && settle(false)}
        title="Sits are booked on these days"
        confirmLabel="Close all the same"
        keepLabel="Do not close"
        onConfirm={() => settle(true)}
      >
        <p>
          They stay booked until the member or an admin cancels them. No new sit can be booked. These members are told
          by mail, and so are the officers:
        </p>
        <ul className="mt-2 list-disc pl-5">
          {question?.touched.map((sit) => (
            <li key={sit.id}>
              {formatDay(sit.day)} {WINDOW_WORDS[sit.windows]}: {sit.memberName}, {sit.standName}
            </li>
          ))}
        </ul>
      </ConfirmDialog>
    </form>
  );
}
