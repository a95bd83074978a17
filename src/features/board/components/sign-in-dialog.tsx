'use client';

import { type SignInSitValues, signInSitSchema } from '@/features/outings/outing-schema';
import { Button } from '@/ui/button';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import type { Closes } from '@/ui/lazy-part';
import { KEPT_TOAST, useSendOrKeep } from '@/ui/offline/use-send-or-keep';
import { useToast } from '@/ui/toast';
import type { Board, BoardSit, SignInStart } from '../reads';
import type { SavedOuting } from '../saved-outing';
import { SIGN_IN_WORDS } from '../words/dialogs';
import type { BoardActions } from './board-actions';
import { EMPTY_IS_NULL, GroundFields } from './ground-fields';

export interface SignInDialogProps {
  club: string;
  sit: BoardSit;
  start: SignInStart;
  board: Pick<Board, 'parkings' | 'contactName'>;
  signIn: BoardActions['signIn'];
}

function SignInForm({ club, sit, start, board, signIn, onClose }: SignInDialogProps & Closes) {
  const toast = useToast();
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
      const label = SIGN_IN_WORDS.kept(sit.standName, sit.mine ? null : sit.memberName);
      return sendOrKeep({ kind: 'sign_in', club, label, values, send: (all) => signIn(club, all) });
    },
    onDone: (saved: SavedOuting | null) => {
      const text = saved && SIGN_IN_WORDS.doneText(saved.memberName, saved.standName, saved.backByText);
      toast(text ? { title: SIGN_IN_WORDS.done, text } : KEPT_TOAST);
      onClose();
    },
  });
  return (
    <form {...formProps} className="grid gap-4">
      <FormErrorSummary errors={errors} />
      <GroundFields
        register={(name) => (/Id$/.test(name) ? register(name, EMPTY_IS_NULL) : register(name))}
        errorOf={errorOf}
        waysIn={start.waysIn}
        parkings={board.parkings}
        own={sit.mine}
        contactName={board.contactName}
      />
      <SubmitRow label={SIGN_IN_WORDS.signIn} pending={pending} pendingLabel={SIGN_IN_WORDS.signingIn}>
        <Button look="quiet" onClick={onClose}>
          {SIGN_IN_WORDS.notNow}
        </Button>
      </SubmitRow>
    </form>
  );
}

/** One tap opens it with everything filled in, the second signs in. */
export function SignInDialog(props: SignInDialogProps & Closes) {
  const { sit, onClose } = props;
  return (
    <Dialog
      title={SIGN_IN_WORDS.title(sit.standName, sit.mine ? null : sit.memberName)}
      description={SIGN_IN_WORDS.about(sit.standName, sit.windowText, sit.timeText)}
      open
      onOpenChange={(open) => !open && onClose()}
    >
      <SignInForm {...props} />
    </Dialog>
  );
}
