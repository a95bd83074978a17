'use client';

import { useRouter } from 'next/navigation';
import type { ReactNode } from 'react';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import { REMOVE_WORDS } from '../words/forms';
import type { ClubCall } from './form-types';

export interface RemoveButtonProps {
  club: string;
  at: { id: string; version: number };
  name: string;
  /** What goes with it, said first. */
  children: ReactNode;
  remove: ClubCall<{ id: string; version: number }, { name: string }>;
  /** Where to go once it is gone. */
  to: string;
}

export function RemoveButton({ club, at, name, children, remove, to }: RemoveButtonProps) {
  const router = useRouter();
  const toast = useToast();
  return (
    <ConfirmDialog
      title={REMOVE_WORDS.title(name)}
      confirmLabel={REMOVE_WORDS.removeLabel(name)}
      danger
      trigger={<Button>{REMOVE_WORDS.remove}</Button>}
      onConfirm={async () => {
        const answer = await remove(club, at).catch(() => null);
        if (!answer) return REMOVE_WORDS.lost;
        if (!answer.ok) return answer.error.message;
        toast({ title: REMOVE_WORDS.removed(answer.data.name) });
        router.push(to);
      }}
    >
      {children}
    </ConfirmDialog>
  );
}
