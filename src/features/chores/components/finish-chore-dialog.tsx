'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type FinishChoreForm, finishChoreSchema } from '../chore-schema';
import type { ChoreLine } from '../reads';
import { FINISH_WORDS } from '../words/chores';

const words = FINISH_WORDS;

export type FinishAction = (
  club: string,
  values: FinishChoreForm,
) => Promise<ActionResult<{ id: string; title: string }>>;

export interface FinishChoreProps {
  club: string;
  line: ChoreLine;
  today: string;
  finish: FinishAction;
}

/** Asks for the day and the hours, and credits them. */
export function FinishChore({ club, line, today, finish }: FinishChoreProps) {
  const [open, setOpen] = useState(false);
  return (
    <Dialog
      title={words.title(line.title)}
      description={line.place ? words.textAtPlace : words.text}
      open={open}
      onOpenChange={setOpen}
      trigger={
        <Button look={line.mine ? 'primary' : 'plain'}>
          {words.mark}
          <span className="sr-only">{words.of(line.title)}</span>
        </Button>
      }
    >
      <FinishForm club={club} line={line} today={today} finish={finish} close={() => setOpen(false)} />
    </Dialog>
  );
}

function FinishForm({ club, line, today, finish, close }: FinishChoreProps & { close: () => void }) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: finishChoreSchema,
    defaultValues: { id: line.id, doneOn: today, hours: '' },
    submit: (typed: FinishChoreForm) => finish(club, typed),
    onDone: ({ title }) => {
      toast({ title: words.done, text: title });
      close();
    },
  });
  return (
    <form {...formProps} className="grid gap-5">
      <FormErrorSummary errors={errors} />
      <DateInput label={words.doneOn} max={today} {...register('doneOn')} error={errorOf('doneOn')} />
      <TextInput
        label={words.hours}
        unit="h"
        inputMode="decimal"
        className="max-w-28"
        {...register('hours')}
        error={errorOf('hours')}
      />
      <SubmitRow label={words.mark} pending={pending} pendingLabel={words.saving} />
    </form>
  );
}
