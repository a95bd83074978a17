import { formatDay } from '@/core/day-time';
import { SIT_AUDIT } from '@/features/bookings/words/audit';
import { dayAndWindow } from '@/features/bookings/words/sits';
import { CLUB_AUDIT } from '@/features/clubs/words/audit';
import { aRole } from '@/features/clubs/words/roles';
import { GROUND_AUDIT } from '@/features/ground/words/audit';
import { WHOLE_GROUND } from '@/features/ground/words/closures';
import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import type { DemoDay } from './demo-day';
import type { DemoRows } from './demo-rows';
import type { SitRow } from './sit-planner';

type AuditRow = DemoRows['auditLog'][number];

interface Told {
  at: number;
  actorId: string;
  action: string;
  subjectId: string;
  summary: string;
  detail?: Record<string, unknown>;
}

/** What the club's record would hold had all this been done by hand. */
export function buildAudit(
  day: DemoDay,
  club: MadeClub,
  made: { ground: MadeGround; closures: DemoRows['closures']; sits: readonly SitRow[] },
): AuditRow[] {
  const { row, members, memberships } = club;
  const founder = members[0];
  const steward = members.find(({ role }) => role === 'steward') ?? founder;
  if (!founder || !steward) throw new Error('The demo club has nobody in it.');
  const names = new Map(made.ground.stands.map(({ id, name }) => [id, name]));
  const memberName = (id: string) => members.find((member) => member.id === id)?.name ?? '';
  const standName = (id: string | null | undefined) => (id ? (names.get(id) ?? '') : WHOLE_GROUND);

  const told: Told[] = [
    {
      at: row.createdAt,
      actorId: founder.id,
      action: 'club.created',
      subjectId: row.id,
      summary: CLUB_AUDIT.started(founder.name, row.name),
    },
    ...memberships.slice(1).map(({ id, role, joinedAt }) => ({
      at: joinedAt,
      actorId: id,
      action: 'member.joined',
      subjectId: id,
      summary: CLUB_AUDIT.joined(memberName(id), aRole(role), memberName(id)),
    })),
    ...made.ground.stands.map(({ id, name, createdAt }) => ({
      at: createdAt,
      actorId: steward.id,
      action: 'stand.added',
      subjectId: id,
      summary: GROUND_AUDIT.standAdded(name),
    })),
    ...made.closures.map(({ id, standId, fromDay, toDay, reason, byMemberId, createdAt }) => ({
      at: createdAt,
      actorId: byMemberId,
      action: 'closure.added',
      subjectId: id,
      summary: GROUND_AUDIT.closed(
        standName(standId),
        formatDay(fromDay, true),
        toDay ? formatDay(toDay, true) : null,
        reason,
      ),
    })),
    ...made.sits.flatMap((sit): Told[] => {
      const [stand, member] = [standName(sit.standId), memberName(sit.memberId)];
      const when = dayAndWindow(sit.day, sit.windows, true);
      const by = { actorId: sit.memberId, subjectId: sit.id };
      const booked = {
        ...by,
        at: sit.createdAt,
        action: 'sit.booked',
        summary: SIT_AUDIT.booked(stand, member, when),
      };
      if (!sit.cancelledAt) return [booked];
      const cancelled = {
        ...by,
        at: sit.cancelledAt,
        action: 'sit.cancelled',
        summary: SIT_AUDIT.cancelled(member, stand, when),
        detail: { reason: sit.cancelReason },
      };
      return [booked, cancelled];
    }),
  ];
  return told
    .toSorted((a, b) => a.at - b.at)
    .map(({ at, actorId, action, subjectId, summary, detail = {} }) => {
      const actor = members.find(({ id }) => id === actorId) ?? founder;
      return {
        id: day.dice.id('audit'),
        clubId: row.id,
        at,
        actorUserId: actor.userId,
        actorName: actor.name,
        action,
        subjectType: action.split('.')[0] ?? '',
        subjectId,
        summary,
        detail,
      };
    });
}
