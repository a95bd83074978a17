'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Textarea } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { FindingView } from '../reads';
import { type AcceptFinding, type DismissFinding, dismissFindingSchema } from '../setup-schema';

export interface AnswerProps {
  club: string;
  finding: Pick<FindingView, 'key' | 'print' | 'text' | 'acts'>;
  accept: (club: string, values: AcceptFinding) => Promise<ActionResult<{ choreId: string }>>;
  dismiss: (club: string, values: DismissFinding) => Promise<ActionResult<{ key: string }>>;
}

const LOST = 'The server could not be reached. Try again.';

/** Makes a chore of the finding, or leaves it with a reason. */
export function AnswerFinding(props: AnswerProps) {
  return (
    <>
      <AcceptDialog {...props} />
      <DismissDialog {...props} />
    </>
  );
}

function AcceptDialog({ club, finding, accept }: AnswerProps) {
  const [chosen, setChosen] = useState('0');
  const toast = useToast();
  async function confirm() {
    const values = { key: finding.key, print: finding.print, act: Number(chosen) };
    const answer = await accept(club, values).catch(() => null);
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    toast({ title: 'A chore was made', text: finding.acts[Number(chosen)] ?? '' });
  }
  return (
    <ConfirmDialog
      title="Make a chore of it"
      confirmLabel="Make the chore"
      trigger={
        <Button>
          Make a chore<span className="sr-only">: {finding.text}</span>
        </Button>
      }
      onConfirm={confirm}
    >
      <RadioCards
        label="What is to be done"
        name={`act-${finding.key}`}
        choices={finding.acts.map((label, index) => ({ value: String(index), label }))}
        value={chosen}
        onChange={(event) => setChosen(event.currentTarget.value)}
      />
    </ConfirmDialog>
  );
}

function DismissDialog(props: AnswerProps) {
  const [open, setOpen] = useState(false);
  return (
    <Dialog
      title="Leave it as it is"
      description="It comes back when the ground it rests on changes."
      open={open}
      onOpenChange={setOpen}
      trigger={
        <Button look="quiet">
          Leave it<span className="sr-only">: {props.finding.text}</span>
        </Button>
      }
    >
      <DismissForm {...props} close={() => setOpen(false)} />
    </Dialog>
  );
}

function DismissForm({ club, finding, dismiss, close }: AnswerProps & { close: () => void }) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: dismissFindingSchema,
    defaultValues: { key: finding.key, print: finding.print, reason: '' },
    submit: (typed: DismissFinding) => dismiss(club, typed),
    onDone: () => {
      toast({ title: 'Left as it is' });
      close();
    },
  });
  return (
    <form {...formProps} className="grid gap-5">
      <FormErrorSummary errors={errors} />
      <Textarea label="Why it can stay" {...register('reason')} error={errorOf('reason')} />
      <SubmitRow label="Leave it" pending={pending} pendingLabel="Saving…" />
    </form>
  );
}

export interface ReopenProps {
  club: string;
  finding: Pick<FindingView, 'key' | 'text'>;
  reopen: (club: string, values: { key: string }) => Promise<ActionResult<{ key: string }>>;
}

export function ReopenFinding({ club, finding, reopen }: ReopenProps) {
  const [pending, setPending] = useState(false);
  const toast = useToast();
  async function run() {
    setPending(true);
    const answer = await reopen(club, { key: finding.key }).catch(() => null);
    setPending(false);
    toast(answer?.ok ? { title: 'Back on the list' } : { title: answer?.error.message ?? LOST, level: 'caution' });
  }
  return (
    <Button look="quiet" pending={pending} onClick={() => void run()}>
      Take it up again<span className="sr-only">: {finding.text}</span>
    </Button>
  );
}
