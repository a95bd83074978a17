'use client';

import { useRouter } from 'next/navigation';
import type { ReactNode } from 'react';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import type { Removed } from '../removal';

const LOST = 'The server could not be reached. Nothing was changed: try again.';

interface Props {
  club: string;
  member: { id: string; name: string };
  action: (club: string, values: { memberId: string }) => Promise<ActionAnswer<Removed>>;
  /** What goes with the member. */
  children: ReactNode;
}

export function RemoveMember({ club, member, action, children }: Props) {
  const router = useRouter();
  const toast = useToast();
  async function remove() {
    const answer = await action(club, { memberId: member.id }).catch(() => null);
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    const { cancelledSits } = answer.data;
    toast({ title: `${member.name} was removed`, text: `Sits cancelled: ${cancelledSits}.` });
    router.push(`/clubs/${club}/club/members`);
  }
  return (
    <ConfirmDialog
      title={`Remove ${member.name}?`}
      confirmLabel="Remove"
      danger
      trigger={<Button look="danger">Remove {member.name}</Button>}
      onConfirm={remove}
    >
      {children}
    </ConfirmDialog>
  );
}

interface LeaveProps {
  club: string;
  clubName: string;
  action: (club: string, values: Record<string, never>) => Promise<ActionAnswer<Removed>>;
  children: ReactNode;
}

export function LeaveClub({ club, clubName, action, children }: LeaveProps) {
  const router = useRouter();
  async function leave() {
    const answer = await action(club, {}).catch(() => null);
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    router.push('/clubs');
  }
  return (
    <ConfirmDialog
      title={`Leave ${clubName}?`}
      confirmLabel="Leave the club"
      keepLabel="Stay"
      danger
      trigger={<Button>Leave the club</Button>}
      onConfirm={leave}
    >
      {children}
    </ConfirmDialog>
  );
}
