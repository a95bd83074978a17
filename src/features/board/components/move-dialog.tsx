'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { MOVE_CHOICES, type MoveBackByValues, moveBackBySchema } from '@/features/outings/outing-schema';
import { Button } from '@/ui/button';
import { Checkbox, RadioCards } from '@/ui/choices';
import { Dialog, DialogClose } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { boardKey } from '../queries';
import type { BoardSit } from '../reads';
import type { BoardActions } from './board-actions';

const LABELS: Record<(typeof MOVE_CHOICES)[number], string> = {
  '30': 'Half an hour',
  '60': 'An hour',
  '120': 'Two hours',
  '240': 'Four hours',
};

interface Props {
  club: string;
  sit: BoardSit;
  outingId: string;
  move: BoardActions['move'];
}

function MoveForm({ club, sit, outingId, move, onDone }: Props & { onDone: () => void }) {
  const toast = useToast();
  const queries = useQueryClient();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: moveBackBySchema,
    defaultValues: { outingId, minutes: '60', tracking: true },
    submit: (values: MoveBackByValues) => move(club, values),
    onDone: async (saved) => {
      toast({ title: 'Time moved', text: `${saved.memberName} is to be back by ${saved.backByText}.` });
      onDone();
      await queries.invalidateQueries({ queryKey: boardKey(club) });
    },
  });
  return (
    <form {...formProps} className="grid gap-4">
      <FormErrorSummary errors={errors} />
      <p>
        Back by {sit.backByText}. The first time stays on record; the new one counts from now where that has passed.
      </p>
      <RadioCards
        label="Later by"
        across
        choices={MOVE_CHOICES.map((value) => ({ value, label: LABELS[value] }))}
        {...register('minutes')}
        defaultValue="60"
        error={errorOf('minutes')}
      />
      <Checkbox label="Tracking a deer" hint="Said on the board, and to whoever is told." {...register('tracking')} />
      <SubmitRow label="Move the time" pending={pending} pendingLabel="Moving">
        <DialogClose>
          <Button look="quiet">Not now</Button>
        </DialogClose>
      </SubmitRow>
    </form>
  );
}

export function MoveDialog(props: Props) {
  const [open, setOpen] = useState(false);
  const { sit } = props;
  return (
    <Dialog
      title={sit.mine ? 'Back later' : `${sit.memberName} is back later`}
      trigger={<Button aria-label={`Back later: ${sit.memberName}, ${sit.standName}`}>Back later</Button>}
      open={open}
      onOpenChange={setOpen}
    >
      <MoveForm {...props} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
