'use client';

import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import { OPEN_AGAIN_WORDS } from '../words/forms';
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
      title={OPEN_AGAIN_WORDS.title(what)}
      confirmLabel={OPEN_AGAIN_WORDS.openAgain}
      keepLabel={OPEN_AGAIN_WORDS.keepClosed}
      trigger={<Button>{OPEN_AGAIN_WORDS.openAgain}</Button>}
      onConfirm={async () => {
        const answer = await openAgain(club, { id }).catch(() => null);
        if (!answer) return OPEN_AGAIN_WORDS.lost;
        if (!answer.ok) return answer.error.message;
        toast({ title: OPEN_AGAIN_WORDS.openAgain });
      }}
    >
      <p>{OPEN_AGAIN_WORDS.text}</p>
    </ConfirmDialog>
  );
}
