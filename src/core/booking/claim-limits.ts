import { addDays, formatDay } from '../day-time';
import type { Gate } from '../verdict-types';
import { GATE_WORDS } from '../words/gates';
import type { BookingMember, BookingStand, OtherSit } from './booking-types';
import { huntingYear } from './hunting-year';
import type { ClubRules } from './rules';

/** Most live claims a member may hold. At hunt time it is never more than one. */
export function mostLiveClaims(rules: Pick<ClubRules, 'maxLiveClaims' | 'claimAhead'>): number | null {
  if (rules.claimAhead.kind === 'days') return rules.maxLiveClaims;
  return Math.min(rules.maxLiveClaims ?? 1, 1);
}

/** Live claims: sits of the member that have not ended. An all-day sit is one. */
export function liveClaimGates(input: {
  rules: Pick<ClubRules, 'maxLiveClaims' | 'claimAhead'>;
  member: Pick<BookingMember, 'id' | 'name'>;
  sits: readonly OtherSit[];
  now: number;
}): Gate[] {
  const most = mostLiveClaims(input.rules);
  if (most === null) return [];
  const live = input.sits
    .filter((sit) => sit.memberId === input.member.id && sit.endAt > input.now)
    .sort((a, b) => a.endAt - b.endAt || a.sitId.localeCompare(b.sitId));
  if (live.length < most) return [];
  const held = live.map((sit) => `${sit.standName} (${formatDay(sit.day)})`).join(', ');
  const text = live.length === 0 ? GATE_WORDS.clubClaims(most) : GATE_WORDS.memberClaims(most, input.member.name, held);
  // The claim whose end brings the count under the most.
  const frees = live[live.length - most];
  return [{ code: 'claim_limit', text, endsOn: frees ? new Date(frees.endAt).toISOString() : null }];
}

/** Most sits a season, of the stand and of the member. */
export function seasonLimitGates(input: {
  rules: Pick<ClubRules, 'mostSitsPerMemberSeason'>;
  stand: Pick<BookingStand, 'name' | 'mostSitsSeason'>;
  member: Pick<BookingMember, 'name'>;
  day: string;
  counts: { stand: number; member: number };
}): Gate[] {
  const gates: Gate[] = [];
  const endsOn = addDays(huntingYear(input.day).toDay, 1);
  const { mostSitsSeason } = input.stand;
  if (mostSitsSeason !== null && input.counts.stand >= mostSitsSeason) {
    const text = GATE_WORDS.standSeason(input.stand.name, input.counts.stand, mostSitsSeason);
    gates.push({ code: 'season_limit', text, endsOn });
  }
  const most = input.rules.mostSitsPerMemberSeason;
  if (most !== null && input.counts.member >= most) {
    const text = GATE_WORDS.memberSeason(input.member.name, input.counts.member, most);
    gates.push({ code: 'season_limit', text, endsOn });
  }
  return gates;
}
