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
import { ACCEPT_WORDS as A, DISMISS_WORDS as D, ANSWER_WORDS as W } from '../words/answers';

export interface AnswerProps {
  club: string;
  finding: Pick<FindingView, 'key' | 'print' | 'text' | 'acts'>;
  accept: (club: string, values: AcceptFinding) => Promise<ActionResult<{ choreId: string }>>;
  dismiss: (club: string, values: DismissFinding) => Promise<ActionResult<{ key: string }>>;
}

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
    if (!answer) return W.lost;
    if (!answer.ok) return answer.error.message;
    toast({ title: A.made, text: finding.acts[Number(chosen)]?.text ?? '' });
  }
  return (
    <ConfirmDialog
      title={A.title}
      confirmLabel={A.confirm}
      trigger={
        <Button>
          {A.open}
          <span className="sr-only">: {finding.text}</span>
        </Button>
      }
      onConfirm={confirm}
    >
      <RadioCards
        label={A.what}
        name={`act-${finding.key}`}
        choices={finding.acts.map(({ text, rule }, index) => ({
          value: String(index),
          label: text,
          note: rule || undefined,
        }))}
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
      title={D.title}
      description={D.text}
      open={open}
      onOpenChange={setOpen}
      trigger={
        <Button look="quiet">
          {D.open}
          <span className="sr-only">: {props.finding.text}</span>
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
      toast({ title: D.done });
      close();
    },
  });
  return (
    <form {...formProps} className="grid gap-5">
      <FormErrorSummary errors={errors} />
      <Textarea label={D.why} {...register('reason')} error={errorOf('reason')} />
      <SubmitRow label={D.save} pending={pending} pendingLabel={D.saving} />
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
    toast(answer?.ok ? { title: W.back } : { title: answer?.error.message ?? W.lost, level: 'caution' });
  }
  return (
    <Button look="quiet" pending={pending} onClick={() => void run()}>
      {W.takeUp}
      <span className="sr-only">: {finding.text}</span>
    </Button>
  );
}
