'use client';

import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { Badge } from '@/ui/page-parts';
import type { SessionView } from '../reads';

interface Props {
  sessions: SessionView[];
  endAction: (values: { id: string }) => Promise<ActionAnswer<null>>;
}

export function SessionsList({ sessions, endAction }: Props) {
  async function end(id: string) {
    const answer = await endAction({ id }).catch(() => null);
    if (!answer) return 'The server could not be reached. Try again.';
    if (!answer.ok) return answer.error.message;
  }

  return (
    <ul className="divide-y divide-rule border-rule border-y">
      {sessions.map(({ id, browser, address, since, here }) => (
        <li key={id} className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 py-3">
          <div className="min-w-0">
            <p className="font-semibold">
              {browser} {here && <Badge look="moss">This one</Badge>}
            </p>
            <p className="break-words text-ink-soft text-sm">
              Signed in {since}, from {address}
            </p>
          </div>
          {!here && (
            <ConfirmDialog
              title={`Sign ${browser} out?`}
              confirmLabel="Sign it out"
              keepLabel="Leave it"
              trigger={<Button aria-label={`Sign out ${browser}, signed in ${since}`}>Sign out</Button>}
              onConfirm={() => end(id)}
            >
              Whoever uses it has to sign in again with the password.
            </ConfirmDialog>
          )}
        </li>
      ))}
    </ul>
  );
}
