import type { HarvestQuota, QuotaDeer, QuotaPer } from './harvest-types';

/** A deer as quotas count it. */
export interface CountedDeer {
  /** The member whose count it goes on: of a guest's deer the sponsor. */
  memberId: string;
  byGuest: boolean;
  antlered: boolean;
}

export interface QuotaState {
  quota: HarvestQuota;
  taken: number;
  /** Never below 0. */
  left: number;
  met: boolean;
}

const DEER_WORDS: Record<QuotaDeer, string> = { any: 'deer', antlered: 'antlered', antlerless: 'antlerless' };

/** '1 antlered deer', '5 deer'. */
export function quotaDeerText(deer: QuotaDeer, count: number): string {
  return deer === 'any' ? `${count} deer` : `${count} ${DEER_WORDS[deer]} deer`;
}

const PER_WORDS: Record<QuotaPer, string> = {
  club: 'in the whole club',
  member: 'a member, guests counted on their sponsor',
  member_guests: 'for all guests of a member together',
};

/** 'At most 1 antlered deer a member, guests counted on their sponsor'. */
export function quotaText({ deer, per, most }: HarvestQuota): string {
  return `At most ${quotaDeerText(deer, most)} ${PER_WORDS[per]}`;
}

function counts(quota: HarvestQuota, deer: CountedDeer, memberId: string | null): boolean {
  if (quota.deer !== 'any' && deer.antlered !== (quota.deer === 'antlered')) return false;
  if (quota.per === 'club') return true;
  return deer.memberId === memberId && (quota.per === 'member' || deer.byGuest);
}

/**
 * How each quota stands with the deer of one season, for one member; without a member (null) only the club's own quotas.
 * A quota of 0 is met from the start. Guests' deer count on their sponsor (practice: posted club rules).
 */
export function quotaStates(
  quotas: readonly HarvestQuota[],
  taken: readonly CountedDeer[],
  memberId: string | null,
): QuotaState[] {
  return quotas
    .filter((quota) => quota.per === 'club' || memberId !== null)
    .map((quota) => {
      const count = taken.filter((deer) => counts(quota, deer, memberId)).length;
      return { quota, taken: count, left: Math.max(0, quota.most - count), met: count >= quota.most };
    });
}

/** Whose count is meant: the reader's own, to a guest their sponsor's, or that of somebody the reader books for. */
export type CountOwner = 'own' | 'sponsor' | { name: string; guest: boolean };

function ownerText(per: Exclude<QuotaPer, 'club'>, owner: CountOwner): string {
  const guests = per === 'member_guests';
  if (owner === 'own') return guests ? 'The limit for your guests' : 'Your limit';
  if (owner === 'sponsor') {
    return guests ? "The limit for your sponsor's guests" : 'Your deer count on your sponsor, whose limit';
  }
  const { name, guest } = owner;
  if (guest) {
    return guests
      ? `The limit for the guests of ${name}'s sponsor`
      : `The deer of ${name} count on their sponsor, whose limit`;
  }
  return guests ? `The limit for the guests of ${name}` : `${name}'s limit`;
}

/** What a person is told before booking when a quota is met. */
export function metText({ quota, taken }: QuotaState, owner: CountOwner): string {
  const { deer, per, most } = quota;
  const limit = per === 'club' ? "The club's limit" : ownerText(per, owner);
  const kind = deer === 'any' ? '' : ` ${DEER_WORDS[deer]}`;
  return `${limit} of ${most}${kind} deer this season is met (${taken} taken).`;
}
