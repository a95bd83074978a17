'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import type { InvitationRowView } from '../read-members';

type Act = (club: string, values: { id: string }) => Promise<ActionAnswer<{ name: string }>>;

interface Props {
  club: string;
  rows: InvitationRowView[];
  resend: Act;
  revoke: Act;
}

const LOST = 'The server could not be reached. Nothing was changed: try again.';

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
            <p className="text-ink-soft text-sm">
              {row.roleWord}
              {row.sponsorName && ` of ${row.sponsorName}`}
              {row.guestText && `, ${row.guestText}`}. Sent {row.sentText};{' '}
              {row.untilText ? `works until ${row.untilText}.` : 'too old now: send it again or revoke it.'}
            </p>
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
    else if (!answer.ok) toast({ title: 'Not sent', text: answer.error.message, level: 'caution' });
    else toast({ title: `A new link is on its way to ${row.name}`, text: 'The old one no longer works.' });
  }
  return (
    <Button onClick={send} pending={pending} pendingLabel="Sending…" aria-label={`Send again to ${row.name}`}>
      Send again
    </Button>
  );
}

function RevokeButton({ club, row, action }: { club: string; row: InvitationRowView; action: Act }) {
  const toast = useToast();
  async function revoke() {
    const answer = await action(club, { id: row.id }).catch(() => null);
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    toast({ title: `The invitation to ${row.name} is revoked` });
  }
  return (
    <ConfirmDialog
      title={`Revoke the invitation to ${row.name}?`}
      confirmLabel="Revoke"
      danger
      trigger={<Button aria-label={`Revoke the invitation to ${row.name}`}>Revoke</Button>}
      onConfirm={revoke}
    >
      The link in the mail stops working. You may invite {row.name} again at any time.
    </ConfirmDialog>
  );
}
