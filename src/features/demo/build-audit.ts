import { formatDay } from '@/core/day-time';
import { dayAndWindow } from '@/features/bookings/words/sits';
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
  const standName = (id: string | null | undefined) => (id ? (names.get(id) ?? '') : 'The whole ground');

  const told: Told[] = [
    {
      at: row.createdAt,
      actorId: founder.id,
      action: 'club.created',
      subjectId: row.id,
      summary: `${founder.name} started ${row.name}.`,
    },
    ...memberships.slice(1).map(({ id, role, joinedAt }) => ({
      at: joinedAt,
      actorId: id,
      action: 'member.joined',
      subjectId: id,
      summary: `${memberName(id)} joined as ${role}.`,
    })),
    ...made.ground.stands.map(({ id, name, createdAt }) => ({
      at: createdAt,
      actorId: steward.id,
      action: 'stand.added',
      subjectId: id,
      summary: `Added stand ${name}.`,
    })),
    ...made.closures.map(({ id, standId, fromDay, toDay, reason, byMemberId, createdAt }) => ({
      at: createdAt,
      actorId: byMemberId,
      action: 'closure.added',
      subjectId: id,
      summary: `Closed ${standName(standId)} from ${formatDay(fromDay, true)}${toDay ? ` to ${formatDay(toDay, true)}` : ''}: ${reason}.`,
    })),
    ...made.sits.flatMap((sit): Told[] => {
      const what = `${standName(sit.standId)} for ${memberName(sit.memberId)}: ${dayAndWindow(sit.day, sit.windows, true)}.`;
      const by = { actorId: sit.memberId, subjectId: sit.id };
      const booked = { ...by, at: sit.createdAt, action: 'sit.booked', summary: `Booked ${what}` };
      if (!sit.cancelledAt) return [booked];
      const detail = { reason: sit.cancelReason };
      return [booked, { ...by, at: sit.cancelledAt, action: 'sit.cancelled', summary: `Cancelled ${what}`, detail }];
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
