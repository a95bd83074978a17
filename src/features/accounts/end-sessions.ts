import { write } from '@/db/client';
import { deleteSessionRow, deleteUserSessions } from '@/db/queries/sessions';
import { notFound } from '@/server/errors';
import { auditAccount } from './audit-account';
import { ACCOUNT_AUDIT } from './words/audit';

interface Owner {
  id: string;
  name: string;
}

/** Ends one of the person's own sessions, by the id shown in the list. */
export async function endOneSession(user: Owner, id: string, now: number): Promise<void> {
  await write(async (tx) => {
    if (!(await deleteSessionRow(tx, user.id, id))) throw notFound();
    await auditAccount(tx, user, 'session_ended', ACCOUNT_AUDIT.browserSignedOut(user.name), now);
  });
}

export async function endAllSessions(user: Owner, now: number): Promise<void> {
  await write(async (tx) => {
    await deleteUserSessions(tx, user.id);
    await auditAccount(tx, user, 'sessions_ended', ACCOUNT_AUDIT.signedOutEverywhere(user.name), now);
  });
}
