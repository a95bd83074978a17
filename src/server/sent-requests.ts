import type { Tx } from '@/db/client';
import { findSentRequest, insertSentRequest } from '@/db/queries/sent-requests';
import type { Sent } from '@/lib/sent-schema';
import { SERVER_ERRORS } from '@/server/words';
import { AppError } from './errors';
import type { ClubScope } from './scope';

const DAY_MS = 86_400_000;

export type SentKind = 'sign_in' | 'sign_out' | 'log' | 'visit';

const idOf = (scope: ClubScope, sent: Sent) => `${scope.member.id}:${sent.key}`;

/** What the first sending under this key made; null: this is the first. */
export async function foundSent(
  tx: Tx,
  scope: ClubScope,
  sent: Sent | undefined,
  kind: SentKind,
): Promise<string | null> {
  const before = sent && (await findSentRequest(tx, idOf(scope, sent)));
  return before?.kind === kind ? before.subjectId : null;
}

export async function noteSent(
  tx: Tx,
  scope: ClubScope,
  sent: Sent | undefined,
  what: { kind: SentKind; subjectId: string },
  now: number,
): Promise<void> {
  if (sent) await insertSentRequest(tx, { ...what, id: idOf(scope, sent), clubId: scope.club.id, at: now });
}

/** When a thing was meant: at the press, where there was no signal, and never in the time to come. */
export function pressedAt(sent: Sent | undefined, now: number): number {
  if (!sent) return now;
  if (sent.at < now - DAY_MS) {
    throw new AppError('conflict', SERVER_ERRORS.pressedLongAgo);
  }
  return Math.min(sent.at, now);
}
