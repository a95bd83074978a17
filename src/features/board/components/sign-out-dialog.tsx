'use client';

import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { Closes } from '@/ui/lazy-part';
import { KEPT_TOAST, useSendOrKeep } from '@/ui/offline/use-send-or-keep';
import { useToast } from '@/ui/toast';
import type { BoardSit } from '../reads';
import { SIGN_OUT_WORDS } from '../words/dialogs';
import type { BoardActions } from './board-actions';

export interface SignOutDialogProps {
  club: string;
  sit: BoardSit;
  /** null: signed in without signal and not sent yet. */
  outingId: string | null;
  signOut: BoardActions['signOut'];
}

export function SignOutDialog({ club, sit, outingId, signOut, onClose }: SignOutDialogProps & Closes) {
  const toast = useToast();
  const sendOrKeep = useSendOrKeep();
  const who = sit.mine ? null : sit.memberName;
  return (
    <ConfirmDialog
      title={SIGN_OUT_WORDS.title(sit.standName, who)}
      confirmLabel={SIGN_OUT_WORDS.signOut}
      keepLabel={SIGN_OUT_WORDS.stay}
      open
      onOpenChange={(open) => !open && onClose()}
      onConfirm={async () => {
        const values = outingId === null ? { sitId: sit.id } : { outingId };
        const label = SIGN_OUT_WORDS.kept(sit.standName, who);
        const press = { kind: 'sign_out', club, label, values: { ...values, sitId: sit.id } };
        const answer = await sendOrKeep({ ...press, send: (all) => signOut(club, all) }).catch(() => null);
        if (!answer) return SIGN_OUT_WORDS.lost;
        if (!answer.ok) return answer.error.message;
        if (!answer.data) return toast(KEPT_TOAST);
        toast({ title: SIGN_OUT_WORDS.done, text: SIGN_OUT_WORDS.doneText(sit.memberName, sit.standName) });
      }}
    >
      <p>{who === null ? SIGN_OUT_WORDS.own : SIGN_OUT_WORDS.other(who)}</p>
    </ConfirmDialog>
  );
}
