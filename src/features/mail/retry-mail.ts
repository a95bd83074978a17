import { write } from '@/db/client';
import { audit } from '@/server/audit';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { reviveDead } from './data';
import type { RetryMailInput } from './retry-mail-schema';
import { MAIL_AUDIT } from './words';

/** Puts a mail that was given up back in the line, as new. */
export async function retryMail(scope: ClubScope, input: RetryMailInput, now: number): Promise<{ toName: string }> {
  return write(async (tx) => {
    const row = await reviveDead(scope, tx, input.id, now);
    if (!row) throw notFound();
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'mail.retried',
        subjectType: 'mail',
        subjectId: input.id,
        summary: MAIL_AUDIT.retried(scope.actor.name, row.subject, row.toName),
      },
      now,
    );
    return { toName: row.toName };
  });
}
