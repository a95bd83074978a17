import { localToUtc } from '@/core/day-time';
import { write } from '@/db/client';
import { momentText } from '@/features/clubs/words/audit-text';
import { newId } from '@/lib/ids';
import type { Sent } from '@/lib/sent-schema';
import { audit } from '@/server/audit';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { foundSent, noteSent } from '@/server/sent-requests';
import { resolvePlace } from './visit-places';
import type { VisitInput } from './visit-schema';
import { findSameVisit, insertVisit } from './visits-data';
import { VISIT_AUDIT, VISIT_ERRORS } from './words/visits';

const DAY_MS = 86_400_000;
const AHEAD_MS = 15 * 60_000;
/** An older visit weighs nothing any more and is more likely a slip. */
const OLDEST_MS = 366 * DAY_MS;

const wrong = (field: string, message: string) => new AppError('invalid', message, { fields: { [field]: message } });

/** Writes down a visit; the same one sent twice is kept once. */
export async function addVisit(
  scope: ClubScope,
  input: VisitInput,
  now: number,
  sent?: Sent,
): Promise<{ id: string; name: string }> {
  const { kind, bumped, notes } = input;
  const at = localToUtc(input.day, input.clock, scope.club.zone);
  if (at > now + AHEAD_MS) throw wrong('day', VISIT_ERRORS.toCome);
  if (at < now - OLDEST_MS) throw wrong('day', VISIT_ERRORS.old);
  return write(async (tx) => {
    const place = await resolvePlace(scope, input.place, tx);
    if (!place) throw wrong('place', VISIT_ERRORS.gone);
    const { lat, lon, standId, name } = place;
    const row = { kind, at, lat, lon, standId, memberId: scope.member.id, bumped, notes };
    const before = await foundSent(tx, scope, sent, 'visit');
    if (before) return { id: before, name };
    const same = await findSameVisit(scope, row, tx);
    if (same) return { id: same.id, name };
    const id = newId('visit');
    await insertVisit(tx, { ...row, id, clubId: scope.club.id, createdAt: now });
    await noteSent(tx, scope, sent, { kind: 'visit', subjectId: id }, now);
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'visit.added',
        subjectType: 'visit',
        subjectId: id,
        summary: VISIT_AUDIT.added(kind, name, momentText(at, scope.club)),
        detail: { kind, standId, bumped },
      },
      now,
    );
    return { id, name };
  });
}
