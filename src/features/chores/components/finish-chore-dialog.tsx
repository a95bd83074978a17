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
      title={`Done: ${line.title}`}
      description={
        line.place
          ? 'The hours are credited. Work at a place is also written down as a visit, so that the list of stands knows of it.'
          : 'The hours are credited.'
      }
      open={open}
      onOpenChange={setOpen}
      trigger={
        <Button look={line.mine ? 'primary' : 'plain'}>
          Mark done<span className="sr-only">: {line.title}</span>
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
      toast({ title: 'Done', text: title });
      close();
    },
  });
  return (
    <form {...formProps} className="grid gap-5">
      <FormErrorSummary errors={errors} />
      <DateInput label="Done on" max={today} {...register('doneOn')} error={errorOf('doneOn')} />
      <TextInput
        label="Hours"
        unit="h"
        inputMode="decimal"
        className="max-w-28"
        {...register('hours')}
        error={errorOf('hours')}
      />
      <SubmitRow label="Mark done" pending={pending} pendingLabel="Saving…" />
    </form>
  );
}
