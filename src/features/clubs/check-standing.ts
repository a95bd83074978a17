import { dayOf } from '@/core/day-time';
import { can, type Role } from '@/core/permissions';
import type { ReadFrom } from '@/db/client';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { findMember } from './data';
import { CLUB_ERRORS } from './words/errors';

/** Whether a role may answer for guests: hunts, and is no guest. */
export function maySponsor(role: Role): boolean {
  return role !== 'guest' && can(role, 'sits.book');
}

interface Standing {
  role: Role;
  sponsorId: string | null;
  guestTo: string | null;
}

/** A guest's sponsor must be a hunting member of this club, and the guest's days must not be over. */
export async function requireStanding(
  scope: ClubScope,
  from: ReadFrom,
  standing: Standing,
  now: number,
): Promise<{ sponsorName: string | null }> {
  if (standing.role !== 'guest') return { sponsorName: null };
  const sponsor = standing.sponsorId === null ? null : await findMember(scope, standing.sponsorId, from);
  if (!sponsor || !maySponsor(sponsor.role)) {
    const message = CLUB_ERRORS.sponsor;
    throw new AppError('invalid', message, { fields: { sponsorId: message } });
  }
  if (standing.guestTo !== null && standing.guestTo < dayOf(now, scope.club.zone)) {
    const message = CLUB_ERRORS.daysPast;
    throw new AppError('invalid', message, { fields: { guestTo: message } });
  }
  return { sponsorName: sponsor.name };
}
