import { nextClock } from '@/core/outing/back-by';
import { type Tx, write } from '@/db/client';
import { findSit, type SitDetail } from '@/features/bookings/data';
import { clockText, dayAndWindow } from '@/features/bookings/sit-words';
import { listApproachesOf } from '@/features/ground/approaches-data';
import { getParking } from '@/features/ground/parkings-data';
import { newId } from '@/lib/ids';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { foundSent, noteSent, pressedAt } from '@/server/sent-requests';
import { auditOuting } from './audit-outing';
import { findOpenOuting, findOuting, insertOuting, type OutingDetail } from './data';
import type { SignInSitInput } from './outing-schema';

/** Nobody signs in earlier than this before the window: a sit of tomorrow is not somebody on the ground. Our choice. */
export const OPENS_BEFORE_MS = 6 * 3_600_000;

const invalid = (field: string, message: string) => new AppError('invalid', message, { fields: { [field]: message } });

/** Why nobody may sign in for a sit now; null: they may. */
export function signInProblem(scope: ClubScope, sit: SitDetail, now: number): string | null {
  const { club } = scope;
  if (sit.status === 'cancelled') return 'This sit was cancelled. Book it anew.';
  if (sit.status === 'lapsed') return 'This sit has lapsed, unsigned. Take the stand as a walk-up if it is still free.';
  if (sit.endAt <= now) return `This sit ended at ${clockText(sit.endAt, club)}.`;
  const opensAt = sit.startAt - OPENS_BEFORE_MS;
  return now < opensAt ? `Signing in opens at ${clockText(opensAt, club)}: sign in when you come to the gate.` : null;
}

const SOON_MS = 2 * 60_000;

/** For the audit log: that it was pressed without signal. */
export function sentLater(scope: ClubScope, at: number, now: number): string {
  return now - at < SOON_MS ? '' : ` Pressed at ${clockText(at, scope.club)} and sent later.`;
}

async function checkPlaces(
  scope: ClubScope,
  tx: Tx,
  standId: string,
  input: Pick<SignInSitInput, 'approachId' | 'parkingId'>,
) {
  if (input.approachId !== null) {
    const way = (await listApproachesOf(scope, standId, tx)).find(({ id }) => id === input.approachId);
    if (!way || way.direction === 'out') throw invalid('approachId', 'This is no way in to the stand. Choose another.');
  }
  if (input.parkingId !== null && !(await getParking(scope, input.parkingId, tx))) {
    throw invalid('parkingId', 'This parking place is no longer there. Choose another.');
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
    const who = sit.memberId === scope.member.id ? 'You are' : `${sit.memberName} is`;
    throw new AppError('conflict', `${who} still signed in at ${before.standName}. Sign out there first.`);
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
  const when = dayAndWindow(sit.day, sit.windows, true);
  const back = clockText(backBy, scope.club);
  const summary = `Signed in ${sit.memberName} at ${sit.standName}, ${when}; back by ${back}.${sentLater(scope, at, now)}`;
  await auditOuting(tx, scope, 'signed_in', { id, summary, detail: { ...input, sitId: sit.id, backBy } }, now);
  const made = await findOuting(scope, id, tx);
  if (!made) throw new AppError('internal', 'Signing in was not saved. Try again.', { log: `no row for ${id}` });
  return made;
}

/** One's own, or with the permission anybody's. */
export function refuseStranger(scope: ClubScope, of: { memberId: string; memberName: string }, what: string): void {
  if (of.memberId === scope.member.id || scope.can('board.sign_for_others')) return;
  throw new AppError('forbidden', `Only ${of.memberName} or an officer can ${what}.`);
}

export async function signIn(scope: ClubScope, input: SignInSitInput, now: number): Promise<OutingDetail> {
  const { sitId, sent, ...given } = input;
  return write(async (tx) => {
    const sit = await findSit(scope, sitId, tx);
    if (!sit) throw notFound();
    refuseStranger(scope, sit, 'sign in for this sit');
    const before = await foundSent(tx, scope, sent, 'sign_in');
    const known = before && (await findOuting(scope, before, tx));
    if (known) return known;
    const outing = await signInIn(tx, scope, sit, given, now, pressedAt(sent, now));
    await noteSent(tx, scope, sent, { kind: 'sign_in', subjectId: outing.id }, now);
    return outing;
  });
}
