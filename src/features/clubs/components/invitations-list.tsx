'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import type { InvitationRowView } from '../read-members';
import { INVITATIONS_WORDS } from '../words/members';

type Act = (club: string, values: { id: string }) => Promise<ActionAnswer<{ name: string }>>;

interface Props {
  club: string;
  rows: InvitationRowView[];
  resend: Act;
  revoke: Act;
}

const LOST = INVITATIONS_WORDS.lost;

export function InvitationsList({ club, rows, resend, revoke }: Props) {
  return (
    <ul className="divide-y divide-rule border-rule border-y">
      {rows.map((row) => (
        <li key={row.id} className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 py-3">
          <div className="min-w-0">
            <p className="font-semibold">
              {row.name}
              <span className="break-all font-normal text-ink-soft"> {row.email}</span>
            </p>
            <p className="text-ink-soft text-sm">{INVITATIONS_WORDS.facts(row)}</p>
          </div>
          <div className="flex flex-wrap gap-2">
            <ResendButton club={club} row={row} action={resend} />
            <RevokeButton club={club} row={row} action={revoke} />
          </div>
        </li>
      ))}
    </ul>
  );
}

function ResendButton({ club, row, action }: { club: string; row: InvitationRowView; action: Act }) {
  const toast = useToast();
  const [pending, setPending] = useState(false);
  async function send() {
    setPending(true);
    const answer = await action(club, { id: row.id }).catch(() => null);
    setPending(false);
    if (!answer) toast({ title: LOST, level: 'caution' });
    else if (!answer.ok) toast({ title: INVITATIONS_WORDS.notSent, text: answer.error.message, level: 'caution' });
    else toast({ title: INVITATIONS_WORDS.resent(row.name), text: INVITATIONS_WORDS.resentText });
  }
  return (
    <Button
      onClick={send}
      pending={pending}
      pendingLabel={INVITATIONS_WORDS.sending}
      aria-label={INVITATIONS_WORDS.resendLabel(row.name)}
    >
      {INVITATIONS_WORDS.resend}
    </Button>
  );
}

function RevokeButton({ club, row, action }: { club: string; row: InvitationRowView; action: Act }) {
  const toast = useToast();
  async function revoke() {
    const answer = await action(club, { id: row.id }).catch(() => null);
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    toast({ title: INVITATIONS_WORDS.revoked(row.name) });
  }
  return (
    <ConfirmDialog
      title={INVITATIONS_WORDS.revokeTitle(row.name)}
      confirmLabel={INVITATIONS_WORDS.revoke}
      danger
      trigger={<Button aria-label={INVITATIONS_WORDS.revokeLabel(row.name)}>{INVITATIONS_WORDS.revoke}</Button>}
      onConfirm={revoke}
    >
      {INVITATIONS_WORDS.revokeText(row.name)}
    </ConfirmDialog>
  );
}
