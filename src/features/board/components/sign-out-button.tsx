'use client';

import { useQueryClient } from '@tanstack/react-query';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import { boardKey } from '../queries';
import type { BoardSit } from '../reads';
import type { BoardActions } from './board-actions';

const LOST = 'The server could not be reached. Try again, or call an officer.';

interface Props {
  club: string;
  sit: BoardSit;
  outingId: string;
  signOut: BoardActions['signOut'];
}

export function SignOutButton({ club, sit, outingId, signOut }: Props) {
  const toast = useToast();
  const queries = useQueryClient();
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
        const answer = await signOut(club, { outingId }).catch(() => null);
        if (!answer) return LOST;
        if (!answer.ok) return answer.error.message;
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
