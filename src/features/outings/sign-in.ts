import { nextClock } from '@/core/outing/back-by';
import { type Tx, write } from '@/db/client';
import { findSit, type SitDetail } from '@/features/bookings/data';
import { clockText, dayAndWindow } from '@/features/bookings/words/sits';
import { listApproachesOf } from '@/features/ground/approaches-data';
import { getParking } from '@/features/ground/parkings-data';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { foundSent, noteSent, pressedAt } from '@/server/sent-requests';
import { auditOuting } from './audit-outing';
import { findOpenOuting, findOuting, insertOuting, type OutingDetail } from './data';
import type { SignInSitInput } from './outing-schema';
import { OUTING_AUDIT, SIGN_IN_ERRORS, STRANGER_ERRORS } from './words/sign';

/** Nobody signs in earlier than this before the window: a sit of tomorrow is not somebody on the ground. Our choice. */
export const OPENS_BEFORE_MS = 6 * 3_600_000;

const invalid = (field: string, message: string) => new AppError('invalid', message, { fields: { [field]: message } });

/** Why nobody may sign in for a sit now; null: they may. */
export function signInProblem(scope: ClubScope, sit: SitDetail, now: number): string | null {
  const { club } = scope;
  if (sit.status === 'cancelled') return SIGN_IN_ERRORS.cancelled;
  if (sit.status === 'lapsed') return SIGN_IN_ERRORS.lapsed;
  if (sit.endAt <= now) return SIGN_IN_ERRORS.ended(clockText(sit.endAt, club));
  const opensAt = sit.startAt - OPENS_BEFORE_MS;
  return now < opensAt ? SIGN_IN_ERRORS.early(clockText(opensAt, club)) : null;
}

const SOON_MS = 2 * 60_000;

/** For the audit log: when it was pressed, where there was no signal to send it; null: it was sent at once. */
export function sentLater(scope: ClubScope, at: number, now: number): string | null {
  return now - at < SOON_MS ? null : clockText(at, scope.club);
}

async function checkPlaces(
  scope: ClubScope,
  tx: Tx,
  standId: string,
  input: Pick<SignInSitInput, 'approachId' | 'parkingId'>,
) {
  if (input.approachId !== null) {
    const way = (await listApproachesOf(scope, standId, tx)).find(({ id }) => id === input.approachId);
    if (!way || way.direction === 'out') throw invalid('approachId', SIGN_IN_ERRORS.way);
  }
  if (input.parkingId !== null && !(await getParking(scope, input.parkingId, tx))) {
    throw invalid('parkingId', SIGN_IN_ERRORS.parking);
  }
}

/**
 * Signs in for a sit inside a change of which it is a part. A second press gives the first one's outing. `at` is when it was
 * pressed: earlier than now where there was no signal at the gate.
 */
export async function signInIn(
  tx: Tx,
  scope: ClubScope,
  sit: SitDetail,
  input: Omit<SignInSitInput, 'sitId' | 'sent'>,
  now: number,
  at = now,
): Promise<OutingDetail> {
  const before = await findOpenOuting(scope, sit.memberId, tx);
  if (before?.sitId === sit.id) return before;
  if (before) {
    const { stillIn } = SIGN_IN_ERRORS;
    const own = sit.memberId === scope.member.id;
    throw new AppError(
      'conflict',
      own ? stillIn.you(before.standName) : stillIn.member(sit.memberName, before.standName),
    );
  }
  const problem = signInProblem(scope, sit, at);
  if (problem) throw new AppError('conflict', problem);
  await checkPlaces(scope, tx, sit.standId, input);
  const id = newId('outing');
  const backBy = nextClock(input.backBy, at, scope.club.zone);
  await insertOuting(tx, {
    id,
    clubId: scope.club.id,
    sitId: sit.id,
    memberId: sit.memberId,
    approachId: input.approachId,
    parkingId: input.parkingId,
    vehicle: input.vehicle,
    contactOff: input.contactOff,
    signedInAt: at,
    signedInBy: scope.member.id,
    backBy,
    firstBackBy: backBy,
    lastSignAt: at,
  });
  const summary = OUTING_AUDIT.signedIn({
    member: sit.memberName,
    stand: sit.standName,
    when: dayAndWindow(sit.day, sit.windows, true),
    back: clockText(backBy, scope.club),
    later: sentLater(scope, at, now),
  });
  await auditOuting(tx, scope, 'signed_in', { id, summary, detail: { ...input, sitId: sit.id, backBy } }, now);
  const made = await findOuting(scope, id, tx);
  if (!made) throw new AppError('internal', SIGN_IN_ERRORS.notSaved, { log: `no row for ${id}` });
  return made;
}

/** One's own, or with the permission anybody's. */
export function refuseStranger(
  scope: ClubScope,
  of: { memberId: string; memberName: string },
  error: (member: string) => string,
): void {
  if (of.memberId === scope.member.id || scope.can('board.sign_for_others')) return;
  throw new AppError('forbidden', error(of.memberName));
}

export async function signIn(scope: ClubScope, input: SignInSitInput, now: number): Promise<OutingDetail> {
  const { sitId, sent, ...given } = input;
  return write(async (tx) => {
    const sit = await findSit(scope, sitId, tx);
    if (!sit) throw notFound();
    refuseStranger(scope, sit, STRANGER_ERRORS.signIn);
    const before = await foundSent(tx, scope, sent, 'sign_in');
    const known = before && (await findOuting(scope, before, tx));
    if (known) return known;
    const outing = await signInIn(tx, scope, sit, given, now, pressedAt(sent, now));
    await noteSent(tx, scope, sent, { kind: 'sign_in', subjectId: outing.id }, now);
    return outing;
  });
}
