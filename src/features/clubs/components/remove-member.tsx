'use client';

import { useRouter } from 'next/navigation';
import type { ReactNode } from 'react';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import type { Removed } from '../removal';
import { REMOVE_MEMBER_WORDS } from '../words/members';

const LOST = REMOVE_MEMBER_WORDS.lost;

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
    toast({ title: REMOVE_MEMBER_WORDS.removed(member.name), text: REMOVE_MEMBER_WORDS.sitsCancelled(cancelledSits) });
    router.push(`/clubs/${club}/club/members`);
  }
  return (
    <ConfirmDialog
      title={REMOVE_MEMBER_WORDS.removeTitle(member.name)}
      confirmLabel={REMOVE_MEMBER_WORDS.remove}
      danger
      trigger={<Button look="danger">{REMOVE_MEMBER_WORDS.removeLabel(member.name)}</Button>}
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
      title={REMOVE_MEMBER_WORDS.leaveTitle(clubName)}
      confirmLabel={REMOVE_MEMBER_WORDS.leave}
      keepLabel={REMOVE_MEMBER_WORDS.stay}
      danger
      trigger={<Button>{REMOVE_MEMBER_WORDS.leave}</Button>}
      onConfirm={leave}
    >
      {children}
    </ConfirmDialog>
  );
}
