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

/** Whose count is meant when a person is told: their own, or, told to a guest, their sponsor's. */
export type CountOwner = 'own' | 'sponsor';

const OWNER_WORDS: Record<Exclude<QuotaPer, 'club'>, Record<CountOwner, string>> = {
  member: { own: 'Your limit', sponsor: 'Your deer count on your sponsor, whose limit' },
  member_guests: { own: 'The limit for your guests', sponsor: "The limit for your sponsor's guests" },
};

/** What a person is told before booking when a quota is met. */
export function metText({ quota, taken }: QuotaState, owner: CountOwner): string {
  const { deer, per, most } = quota;
  const limit = per === 'club' ? "The club's limit" : OWNER_WORDS[per][owner];
  const kind = deer === 'any' ? '' : ` ${DEER_WORDS[deer]}`;
  return `${limit} of ${most}${kind} deer this season is met (${taken} taken).`;
}
