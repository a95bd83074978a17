import { type Tx, write } from '@/db/client';
import { env } from '@/env';
import { newId } from '@/lib/ids';
import { hashSecret, newSecret } from '@/lib/secrets';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { auditOuting } from './audit-outing';
import { findOuting, type OutingDetail } from './data';
import { insertSitLink, revokeLinksOf } from './links-data';
import type { SitLinkInput } from './outing-schema';
import { refuseStranger } from './sign-in';
import { LINK_ERRORS, OUTING_AUDIT, STRANGER_ERRORS } from './words/sign';

const LASTS_MS = 72 * 3_600_000;

async function makeLink(tx: Tx, outing: OutingDetail, kind: 'contact' | 'shared', now: number): Promise<string> {
  const secret = newSecret();
  await insertSitLink(tx, {
    id: newId('sitLink'),
    clubId: outing.clubId,
    outingId: outing.id,
    kind,
    secretHash: hashSecret(secret),
    createdAt: now,
    expiresAt: Math.max(now, outing.backBy) + LASTS_MS,
  });
  return `${env.appUrl}/overdue/${secret}`;
}

/** The address mailed to a safety contact. */
export function contactLink(tx: Tx, outing: OutingDetail, now: number): Promise<string> {
  return makeLink(tx, outing, 'contact', now);
}

/** An address to give to somebody at home: shown once, good until three days after the back-by time. One's own only. */
export async function shareSit(scope: ClubScope, input: SitLinkInput, now: number): Promise<{ url: string }> {
  return write(async (tx) => {
    const outing = await findOuting(scope, input.outingId, tx);
    if (!outing) throw notFound();
    if (outing.memberId !== scope.member.id) {
      throw new AppError('forbidden', LINK_ERRORS.notYours(outing.memberName));
    }
    if (outing.signedOutAt !== null) throw new AppError('conflict', LINK_ERRORS.signedOut);
    const url = await makeLink(tx, outing, 'shared', now);
    const summary = OUTING_AUDIT.linked(scope.actor.name, outing.standName);
    await auditOuting(tx, scope, 'linked', { id: outing.id, summary }, now);
    return { url };
  });
}

/** Turns off every link to the page of an outing, for good. */
export async function revokeSitLinks(scope: ClubScope, input: SitLinkInput, now: number): Promise<{ revoked: number }> {
  return write(async (tx) => {
    const outing = await findOuting(scope, input.outingId, tx);
    if (!outing) throw notFound();
    refuseStranger(scope, outing, STRANGER_ERRORS.revoke);
    const revoked = await revokeLinksOf(scope, tx, outing.id, now);
    if (revoked > 0) {
      const summary = OUTING_AUDIT.unlinked(revoked, outing.memberName, outing.standName);
      await auditOuting(tx, scope, 'unlinked', { id: outing.id, summary }, now);
    }
    return { revoked };
  });
}
