'use client';

import { useRouter } from 'next/navigation';
import type { ReactNode } from 'react';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
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
      title={`Remove ${name}?`}
      confirmLabel={`Remove ${name}`}
      danger
      trigger={<Button>Remove</Button>}
      onConfirm={async () => {
        const answer = await remove(club, at).catch(() => null);
        if (!answer) return 'The server could not be reached. Try again.';
        if (!answer.ok) return answer.error.message;
        toast({ title: `${answer.data.name} is removed` });
        router.push(to);
      }}
    >
      {children}
    </ConfirmDialog>
  );
}
