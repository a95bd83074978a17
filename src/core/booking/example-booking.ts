import type { WindowName } from '../condition-types';
import { localToUtc } from '../day-time';
import { sitWindow } from '../windows';
import type { BookingCheck, BookingStand, OtherSit } from './check-booking';
import { type ClubRules, DEFAULT_CLUB_RULES } from './rules';

/** An invented booking that breaks no rule, for tests to change one thing at a time. */
export const PLACE = { lat: 34.1, lon: -84, zone: 'America/New_York' };

/** A rested stand at the club's centre, without limits. */
export const STAND: BookingStand = {
  id: 'std_creek',
  name: 'Creek Ladder',
  at: { eastM: 0, northM: 0 },
  restDays: 3,
  mostSitsSeason: null,
  weapons: ['bow', 'rifle'],
  closures: [],
  allowedMemberIds: null,
  approaches: [],
};

export function rulesWith(change: Partial<ClubRules>): ClubRules {
  return { ...DEFAULT_CLUB_RULES, ...change };
}

/** Somebody else's sit, a mile off unless it is said otherwise. */
export function otherSit(change: Partial<OtherSit> = {}): OtherSit {
  const day = change.day ?? '2026-11-10';
  const windows: WindowName[] = change.windows ?? ['morning'];
  return {
    sitId: 'sit_other',
    standId: 'std_ridge',
    standName: 'Ridge Box',
    standAt: { eastM: 1609, northM: 0 },
    memberId: 'mem_odell',
    memberName: 'Odell Pruitt',
    day,
    windows,
    weapon: 'bow',
    endAt: sitWindow(day, windows.at(-1) ?? 'morning', DEFAULT_CLUB_RULES, PLACE).endAt,
    ...change,
  };
}

/** Mae Tolliver asks for the Creek Ladder on Tuesday 10 November 2026, in the morning, at noon of the Sunday before. */
export function bookingCheck(change: Partial<BookingCheck> = {}): BookingCheck {
  const day = change.day ?? '2026-11-10';
  const windows: WindowName[] = change.windows ?? ['morning'];
  return {
    stand: STAND,
    member: { id: 'mem_mae', name: 'Mae Tolliver', role: 'member' },
    day,
    windows,
    spans: windows.map((w) => sitWindow(day, w, DEFAULT_CLUB_RULES, PLACE)),
    weapon: 'bow',
    guests: 0,
    guestHunts: [],
    now: localToUtc('2026-11-08', '12:00', PLACE.zone),
    zone: PLACE.zone,
    units: 'us',
    rules: DEFAULT_CLUB_RULES,
    closedDays: [],
    otherSits: [],
    seasonCounts: { stand: 0, member: 0 },
    exceptSitId: null,
    ...change,
  };
}
