import { type ClubRules, completeRules } from '@/core/booking/rules';
import { dayOf } from '@/core/day-time';
import { can, type Permission, type Role } from '@/core/permissions';
import type { Units } from '@/core/units';
import { type ClubRow, findClubById, findClubBySlug, findMembership } from '@/db/queries/memberships';
import type { Actor } from './audit';
import { now } from './clock';
import { notFound } from './errors';

declare const brand: unique symbol;

export interface ScopeClub {
  id: string;
  slug: string;
  name: string;
  lat: number;
  lon: number;
  zone: string;
  /** What this reader sees: their own choice, else the club's. Forms show and read the same. */
  units: Units;
  /** The club's own setting. */
  clubUnits: Units;
  rules: ClubRules;
  version: number;
}

export interface ScopeMember {
  /** Membership id. */
  id: string;
  userId: string | null;
  name: string;
  email: string;
  role: Role;
  sponsorId: string | null;
  guestFrom: string | null;
  guestTo: string | null;
}

/** Proof that a door has let this person into this club. Every data function takes it first. */
export interface ClubScope {
  readonly [brand]: true;
  club: ScopeClub;
  member: ScopeMember;
  actor: Actor;
  can(permission: Permission): boolean;
}

function clubOf(row: ClubRow, units: Units | null = null): ScopeClub {
  const { id, slug, name, lat, lon, zone, units: clubUnits, rules, version } = row;
  return { id, slug, name, lat, lon, zone, units: units ?? clubUnits, clubUnits, rules: completeRules(rules), version };
}

function makeScope(club: ScopeClub, member: ScopeMember): ClubScope {
  const scope = {
    club,
    member,
    actor: { userId: member.userId, name: member.name },
    can: (permission: Permission) => can(member.role, permission),
  };
  return scope as ClubScope;
}

/** The scope of a signed-in person in a club; null for a stranger, a removed member and a guest whose last day is over. */
export async function findScope(slug: string, userId: string): Promise<ClubScope | null> {
  const row = await findMembership(slug, userId);
  if (!row) return null;
  const { club, membership, user } = row;
  if (membership.role === 'guest' && membership.guestTo && dayOf(now(), club.zone) > membership.guestTo) return null;
  return makeScope(clubOf(club, user.units), {
    id: membership.id,
    userId,
    name: user.name,
    email: user.email,
    role: membership.role,
    sponsorId: membership.sponsorId,
    guestFrom: membership.guestFrom,
    guestTo: membership.guestTo,
  });
}

/** For jobs, tools and links that carry their own secret: acts for the club itself. */
function systemScope(row: ClubRow): ClubScope {
  return makeScope(clubOf(row), {
    id: 'system',
    userId: null,
    name: 'Windrest',
    email: '',
    role: 'admin',
    sponsorId: null,
    guestFrom: null,
    guestTo: null,
  });
}

export async function systemScopeBySlug(slug: string): Promise<ClubScope> {
  const row = await findClubBySlug(slug);
  if (!row) throw notFound();
  return systemScope(row);
}

export async function systemScopeById(id: string): Promise<ClubScope> {
  const row = await findClubById(id);
  if (!row) throw notFound();
  return systemScope(row);
}
