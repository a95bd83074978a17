'use client';

import { useQueryClient } from '@tanstack/react-query';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { KEPT_TOAST, useSendOrKeep } from '@/ui/offline/use-offline';
import { useToast } from '@/ui/toast';
import { boardKey } from '../queries';
import type { BoardSit } from '../reads';
import type { BoardActions } from './board-actions';

const LOST = 'The server could not be reached. Try again, or call an officer.';

interface Props {
  club: string;
  sit: BoardSit;
  /** null: signed in without signal and not sent yet. */
  outingId: string | null;
  signOut: BoardActions['signOut'];
}

export function SignOutButton({ club, sit, outingId, signOut }: Props) {
  const toast = useToast();
  const queries = useQueryClient();
  const sendOrKeep = useSendOrKeep();
  const label = sit.mine ? `Sign out from ${sit.standName}` : `Sign out ${sit.memberName} from ${sit.standName}`;
  return (
    <ConfirmDialog
      title={sit.mine ? `Sign out from ${sit.standName}?` : `Sign out ${sit.memberName}?`}
      confirmLabel="Sign out"
      keepLabel="Stay signed in"
      trigger={
        <Button look="primary" aria-label={`Sign out: ${sit.memberName}, ${sit.standName}`}>
          Sign out
        </Button>
      }
      onConfirm={async () => {
        const values = outingId === null ? { sitId: sit.id } : { outingId };
        const press = { kind: 'sign_out', club, label, values: { ...values, sitId: sit.id } };
        const answer = await sendOrKeep({ ...press, send: (all) => signOut(club, all) }).catch(() => null);
        if (!answer) return LOST;
        if (!answer.ok) return answer.error.message;
        if (!answer.data) return toast(KEPT_TOAST);
        toast({ title: 'Signed out', text: `${sit.memberName}, ${sit.standName}.` });
        await queries.invalidateQueries({ queryKey: boardKey(club) });
      }}
    >
      <p>
        {sit.mine
          ? 'You are out of the woods and nobody needs to look for you.'
          : `Only when you know that ${sit.memberName} is out and safe. Your name goes on record.`}
      </p>
    </ConfirmDialog>
  );
}
