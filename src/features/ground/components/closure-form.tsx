'use client';

import { useState } from 'react';
import { formatDay } from '@/core/day-time';
import { SIT_WINDOW_WORDS } from '@/core/words/windows';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { queryClient } from '@/ui/query';
import { DateInput, Select, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type ClosureForm, closureSchema } from '../closure-schema';
import type { BookedSit } from '../people-data';
import { touchedSitsQuery } from '../queries';
import { CLOSURE_WORDS } from '../words/closures';
import type { ClubCall } from './form-types';

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
      (await agreed(typed)) ? close(club, typed) : { ok: false, error: { message: CLOSURE_WORDS.nothing } },
    onDone: () => {
      toast({ title: CLOSURE_WORDS.closed });
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
          label={CLOSURE_WORDS.standId}
          options={[
            { value: '', label: CLOSURE_WORDS.theWholeGround },
            ...stands.map(({ id, name }) => ({ value: id, label: name })),
          ]}
          error={errorOf('standId')}
          {...register('standId')}
        />
      )}
      <div className="grid gap-4 sm:grid-cols-2">
        <DateInput label={CLOSURE_WORDS.fromDay} error={errorOf('fromDay')} {...register('fromDay')} />
        <DateInput
          label={CLOSURE_WORDS.toDay}
          hint={stands.length > 0 ? CLOSURE_WORDS.toDayHint : undefined}
          error={errorOf('toDay')}
          {...register('toDay')}
        />
      </div>
      <TextInput
        label={CLOSURE_WORDS.reason}
        hint={CLOSURE_WORDS.reasonHint}
        error={errorOf('reason')}
        {...register('reason')}
      />
      <SubmitRow label={CLOSURE_WORDS.close} pending={fields.pending} pendingLabel={CLOSURE_WORDS.closing} />
      <ConfirmDialog
        open={question !== null}
        onOpenChange={(open) => !open && settle(false)}
        title={CLOSURE_WORDS.bookedTitle}
        confirmLabel={CLOSURE_WORDS.closeAllSame}
        keepLabel={CLOSURE_WORDS.keep}
        onConfirm={() => settle(true)}
      >
        <p>{CLOSURE_WORDS.bookedText}</p>
        <ul className="mt-2 list-disc pl-5">
          {question?.touched.map((sit) => (
            <li key={sit.id}>
              {formatDay(sit.day)} {SIT_WINDOW_WORDS[sit.windows]}: {sit.memberName}, {sit.standName}
            </li>
          ))}
        </ul>
      </ConfirmDialog>
    </form>
  );
}
