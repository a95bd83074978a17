'use client';

import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import type { ClubCall } from './form-types';

export interface OpenAgainButtonProps {
  club: string;
  id: string;
  /** 'Creek Bend' or 'the whole ground'. */
  what: string;
  openAgain: ClubCall<{ id: string }, { id: string }>;
}

export function OpenAgainButton({ club, id, what, openAgain }: OpenAgainButtonProps) {
  const toast = useToast();
  return (
    <ConfirmDialog
      title={`Open ${what} again?`}
      confirmLabel="Open again"
      keepLabel="Keep closed"
      trigger={<Button>Open again</Button>}
      onConfirm={async () => {
        const answer = await openAgain(club, { id }).catch(() => null);
        if (!answer) return 'The server could not be reached. Try again.';
        if (!answer.ok) return answer.error.message;
        toast({ title: 'Open again' });
      }}
    >
      <p>Members can book from today on. Closed days that are past stay on record.</p>
    </ConfirmDialog>
  );
}
