'use client';

import { useRouter } from 'next/navigation';
import type { ReactNode } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import { REMOVE_WORDS } from '../words/chores';

export interface RemoveButtonProps {
  club: string;
  id: string;
  label: string;
  title: string;
  done: string;
  children: ReactNode;
  remove: (club: string, values: { id: string }) => Promise<ActionResult<{ id: string }>>;
}

/** Takes a chore out, or calls a work day off, after asking once. */
export function RemoveButton({ club, id, label, title, done, children, remove }: RemoveButtonProps) {
  const router = useRouter();
  const toast = useToast();
  async function confirm() {
    const answer = await remove(club, { id }).catch(() => null);
    if (!answer) return REMOVE_WORDS.lost;
    if (!answer.ok) return answer.error.message;
    toast({ title: done });
    router.push(`/clubs/${club}/chores`);
  }
  return (
    <ConfirmDialog
      title={title}
      confirmLabel={label}
      danger
      trigger={<Button look="danger">{label}</Button>}
      onConfirm={confirm}
    >
      {children}
    </ConfirmDialog>
  );
}
