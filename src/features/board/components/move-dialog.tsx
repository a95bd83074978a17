'use client';

import { MOVE_CHOICES, type MoveBackByValues, moveBackBySchema } from '@/features/outings/outing-schema';
import { Button } from '@/ui/button';
import { Checkbox, RadioCards } from '@/ui/choices';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import type { Closes } from '@/ui/lazy-part';
import { useToast } from '@/ui/toast';
import type { BoardSit } from '../reads';
import { MOVE_WORDS } from '../words/dialogs';
import type { BoardActions } from './board-actions';

export interface MoveDialogProps {
  club: string;
  sit: BoardSit;
  outingId: string;
  move: BoardActions['move'];
}

function MoveForm({ club, sit, outingId, move, onClose }: MoveDialogProps & Closes) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: moveBackBySchema,
    defaultValues: { outingId, minutes: '60', tracking: true },
    submit: (values: MoveBackByValues) => move(club, values),
    onDone: (saved) => {
      toast({ title: MOVE_WORDS.done, text: MOVE_WORDS.doneText(saved.memberName, saved.backByText) });
      onClose();
    },
  });
  return (
    <form {...formProps} className="grid gap-4">
      <FormErrorSummary errors={errors} />
      <p>{MOVE_WORDS.now(sit.backByText ?? '')}</p>
      <RadioCards
        label={MOVE_WORDS.laterBy}
        across
        choices={MOVE_CHOICES.map((value) => ({ value, label: MOVE_WORDS.choices[value] }))}
        {...register('minutes')}
        defaultValue="60"
        error={errorOf('minutes')}
      />
      <Checkbox label={MOVE_WORDS.tracking} hint={MOVE_WORDS.trackingHint} {...register('tracking')} />
      <SubmitRow label={MOVE_WORDS.move} pending={pending} pendingLabel={MOVE_WORDS.moving}>
        <Button look="quiet" onClick={onClose}>
          {MOVE_WORDS.notNow}
        </Button>
      </SubmitRow>
    </form>
  );
}

export function MoveDialog(props: MoveDialogProps & Closes) {
  const { sit, onClose } = props;
  return (
    <Dialog title={MOVE_WORDS.title(sit.mine ? null : sit.memberName)} open onOpenChange={(open) => !open && onClose()}>
      <MoveForm {...props} />
    </Dialog>
  );
}
