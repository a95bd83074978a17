import { QUOTA_MET_WORDS, QUOTA_WORDS } from '../words/quotas';
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

/** '1 antlered deer', '5 deer'. */
export function quotaDeerText(deer: QuotaDeer, count: number): string {
  return QUOTA_WORDS.deer[deer](count);
}

/** 'At most 1 antlered deer a member, guests counted on their sponsor'. */
export function quotaText({ deer, per, most }: HarvestQuota): string {
  return QUOTA_WORDS.per[per](quotaDeerText(deer, most));
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

function limitText(per: QuotaPer, owner: CountOwner): string {
  if (per === 'club') return QUOTA_MET_WORDS.club;
  const words = QUOTA_MET_WORDS[per];
  if (owner === 'own' || owner === 'sponsor') return words[owner];
  return owner.guest ? words.guest(owner.name) : words.member(owner.name);
}

/** What a person is told before booking when a quota is met. */
export function metText({ quota, taken }: QuotaState, owner: CountOwner): string {
  return QUOTA_MET_WORDS.met(limitText(quota.per, owner), QUOTA_MET_WORDS.deer[quota.deer](quota.most), taken);
}
