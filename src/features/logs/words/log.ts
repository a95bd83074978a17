import type { FollowUp, HitPlace, Shot } from '@/core/log/follow-up';

export const SHOT_WORDS: Record<Shot, string> = { none: 'No shot', missed: 'Missed', hit: 'Hit a deer' };

export const HIT_WORDS: Record<HitPlace, string> = {
  heart_lungs: 'Heart or lungs',
  elsewhere: 'Elsewhere',
  unsure: 'Not sure',
};

export const FOLLOW_WORDS: Record<FollowUp, string> = {
  waiting: 'Waiting or tracking',
  recovered: 'Recovered',
  not_found: 'Not found',
};

/** After state hunter education. */
export const WAIT_ADVICE =
  'Mark where the deer stood and where you last saw it. Wait 30 minutes after a hit in heart or lungs, 4 to 6 hours after any other, and the longer time when you are not sure (state hunter education).';

export interface Counts {
  antleredBucks: number;
  does: number;
  fawns: number;
  unknown: number;
}

const plural = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** '1 buck, 2 does', or 'No deer'. */
export function countsText({ antleredBucks, does, fawns, unknown }: Counts): string {
  const parts = [
    antleredBucks > 0 && plural(antleredBucks, 'buck', 'bucks'),
    does > 0 && plural(does, 'doe', 'does'),
    fawns > 0 && plural(fawns, 'fawn', 'fawns'),
    unknown > 0 && `${unknown} unknown`,
  ].filter((part) => part !== false);
  return parts.length === 0 ? 'No deer' : parts.join(', ');
}

export interface Bumps {
  bumpedIn: number;
  bumpedSitting: number;
  bumpedOut: number;
  bumpedWhere: string;
}

/** '2 on the way in, 1 on the way out (by the creek)'; empty when none were. */
export function bumpsText({ bumpedIn, bumpedSitting, bumpedOut, bumpedWhere }: Bumps): string {
  const parts = [
    bumpedIn > 0 && `${bumpedIn} on the way in`,
    bumpedSitting > 0 && `${bumpedSitting} from the seat`,
    bumpedOut > 0 && `${bumpedOut} on the way out`,
  ].filter((part) => part !== false);
  if (parts.length === 0) return '';
  return parts.join(', ') + (bumpedWhere === '' ? '' : ` (${bumpedWhere})`);
}

/** 'Missed'; 'Hit, heart or lungs: recovered'; empty without a shot. */
export function shotText(log: { shot: Shot; hitPlace: HitPlace | null; followUp: FollowUp | null }): string {
  if (log.shot === 'none') return '';
  if (log.shot === 'missed') return 'Missed';
  const place = log.hitPlace === null ? '' : `, ${HIT_WORDS[log.hitPlace].toLowerCase()}`;
  const follow = log.followUp === null ? '' : `: ${FOLLOW_WORDS[log.followUp].toLowerCase()}`;
  return `Hit${place}${follow}`;
}
