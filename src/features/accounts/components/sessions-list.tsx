'use client';

import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import type { ActionAnswer } from '@/ui/form/use-action-form';
import { Badge } from '@/ui/page-parts';
import type { SessionView } from '../reads';
import { SESSIONS_WORDS } from '../words/forms';

interface Props {
  sessions: SessionView[];
  endAction: (values: { id: string }) => Promise<ActionAnswer<null>>;
}

export function SessionsList({ sessions, endAction }: Props) {
  async function end(id: string) {
    const answer = await endAction({ id }).catch(() => null);
    if (!answer) return SESSIONS_WORDS.lost;
    if (!answer.ok) return answer.error.message;
  }

  return (
    <ul className="divide-y divide-rule border-rule border-y">
      {sessions.map(({ id, browser, address, since, here }) => (
        <li key={id} className="flex flex-wrap items-center justify-between gap-x-4 gap-y-2 py-3">
          <div className="min-w-0">
            <p className="font-semibold">
              {browser} {here && <Badge look="moss">{SESSIONS_WORDS.here}</Badge>}
            </p>
            <p className="break-words text-ink-soft text-sm">{SESSIONS_WORDS.signedIn(since, address)}</p>
          </div>
          {!here && (
            <ConfirmDialog
              title={SESSIONS_WORDS.title(browser)}
              confirmLabel={SESSIONS_WORDS.confirm}
              keepLabel={SESSIONS_WORDS.keep}
              trigger={
                <Button aria-label={SESSIONS_WORDS.signOutLabel(browser, since)}>{SESSIONS_WORDS.signOut}</Button>
              }
              onConfirm={() => end(id)}
            >
              {SESSIONS_WORDS.text}
            </ConfirmDialog>
          )}
        </li>
      ))}
    </ul>
  );
}
