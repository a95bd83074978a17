import type { ClubRules } from '@/core/booking/rules';
import { type DemoDay, daysFrom, momentOf } from './demo-day';
import type { DemoRows } from './demo-rows';
import { type DemoMember, PEOPLE } from './people';

export type UserRow = DemoRows['users'][number];
export type MembershipRow = DemoRows['memberships'][number];

/** A member with what the rest of the demo needs to name them. */
export interface MadeMember extends DemoMember {
  id: string;
  userId: string;
  name: string;
}

export interface MadeClub {
  row: DemoRows['clubs'][number];
  members: MadeMember[];
  memberships: MembershipRow[];
}

const LONGEST_AGO = 1400;
const GUEST_DAYS = { before: 20, after: 20 };

export function buildUsers(day: DemoDay, passwordHash: string): UserRow[] {
  return PEOPLE.map(({ name, email, joined }) => {
    const createdAt = momentOf(day, -joined, '19:00');
    return { id: day.dice.id('user'), email, name, passwordHash, emailVerifiedAt: createdAt, createdAt };
  });
}

function personOf(key: string, users: readonly UserRow[]) {
  const at = PEOPLE.findIndex((person) => person.key === key);
  const [person, user] = [PEOPLE[at], users[at]];
  if (!person || !user) throw new Error(`The demo has nobody called ${key}.`);
  return { person, user };
}

export function buildClub(
  day: DemoDay,
  club: { slug: string; name: string; lat: number; lon: number; zone: string; rules: ClubRules; daysOld?: number },
  who: readonly DemoMember[],
  users: readonly UserRow[],
): MadeClub {
  const { daysOld = LONGEST_AGO, ...values } = club;
  const clubId = day.dice.id('club');
  const members = who.map((member): MadeMember => {
    const { user } = personOf(member.key, users);
    return { ...member, id: day.dice.id('membership'), userId: user.id, name: user.name };
  });
  const memberships = members.map((member): MembershipRow => {
    const { person } = personOf(member.key, users);
    const guest = member.role === 'guest';
    return {
      id: member.id,
      clubId,
      userId: member.userId,
      role: member.role,
      sponsorId: members.find(({ key }) => key === member.sponsor)?.id ?? null,
      guestFrom: guest ? daysFrom(day, -GUEST_DAYS.before) : null,
      guestTo: guest ? daysFrom(day, GUEST_DAYS.after) : null,
      joinedAt: momentOf(day, -Math.min(person.joined, daysOld), '19:30'),
    };
  });
  return {
    row: { ...values, id: clubId, units: 'us', createdAt: momentOf(day, -daysOld, '19:00') },
    members,
    memberships,
  };
}
