'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { type SignInSitValues, signInSitSchema } from '@/features/outings/outing-schema';
import { Button } from '@/ui/button';
import { Dialog, DialogClose } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { KEPT_TOAST, useSendOrKeep } from '@/ui/offline/use-offline';
import { useToast } from '@/ui/toast';
import { boardKey } from '../queries';
import type { Board, BoardSit, SignInStart } from '../reads';
import type { SavedOuting } from '../saved-outing';
import type { BoardActions } from './board-actions';
import { EMPTY_IS_NULL, GroundFields } from './ground-fields';

interface Props {
  club: string;
  sit: BoardSit;
  start: SignInStart;
  board: Pick<Board, 'parkings' | 'contactName'>;
  signIn: BoardActions['signIn'];
}

function SignInForm({ club, sit, start, board, signIn, onDone }: Props & { onDone: () => void }) {
  const toast = useToast();
  const queries = useQueryClient();
  const sendOrKeep = useSendOrKeep();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: signInSitSchema,
    defaultValues: {
      sitId: sit.id,
      approachId: start.approachId,
      parkingId: start.parkingId,
      vehicle: start.vehicle,
      backBy: start.backBy,
      contactOff: false,
    },
    submit: (values: SignInSitValues) => {
      const label = sit.mine ? `Sign in at ${sit.standName}` : `Sign in ${sit.memberName} at ${sit.standName}`;
      return sendOrKeep({ kind: 'sign_in', club, label, values, send: (all) => signIn(club, all) });
    },
    onDone: async (saved: SavedOuting | null) => {
      const text = saved && `${saved.memberName} at ${saved.standName}, back by ${saved.backByText}.`;
      toast(text ? { title: 'Signed in', text } : KEPT_TOAST);
      onDone();
      if (saved) await queries.invalidateQueries({ queryKey: boardKey(club) });
    },
  });
  return (
    <form {...formProps} className="grid gap-4">
      <FormErrorSummary errors={errors} />
      <GroundFields
        register={(name) => (name.endsWith('Id') ? register(name, EMPTY_IS_NULL) : register(name))}
        errorOf={errorOf}
        waysIn={start.waysIn}
        parkings={board.parkings}
        own={sit.mine}
        contactName={board.contactName}
      />
      <SubmitRow label="Sign in" pending={pending} pendingLabel="Signing in">
        <DialogClose>
          <Button look="quiet">Not now</Button>
        </DialogClose>
      </SubmitRow>
    </form>
  );
}

/** One tap opens it with everything filled in, the second signs in. */
export function SignInDialog(props: Props) {
  const [open, setOpen] = useState(false);
  const { sit } = props;
  return (
    <Dialog
      title={sit.mine ? `Sign in: ${sit.standName}` : `Sign in ${sit.memberName}`}
      description={`${sit.standName}, ${sit.windowText}, ${sit.timeText}.`}
      trigger={
        <Button look="primary" aria-label={`Sign in: ${sit.memberName}, ${sit.standName}`}>
          Sign in
        </Button>
      }
      open={open}
      onOpenChange={setOpen}
    >
      <SignInForm {...props} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
