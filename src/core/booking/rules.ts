import { WEAPONS, type Weapon } from '../ground-types';
import type { GroundWork } from '../ground-work';
import type { HarvestQuota } from '../harvest/harvest-types';
import { ydToM } from '../units';

/** Hours in which the club allows a shot, counted from the sun. The club states it; nothing here says what is legal. */
export interface LegalLightRule {
  name: string;
  minutesBeforeSunrise: number;
  minutesAfterSunset: number;
  source: string;
  /** Day on which an officer stated it, YYYY-MM-DD. */
  statedOn: string;
}

export interface WindowHours {
  morning: { startMinutesFromSunrise: number; endClock: string };
  evening: { startClock: string; endMinutesFromSunset: number };
}

export interface Season {
  id: string;
  name: string;
  weapons: Weapon[];
  /** Both days are in the season. */
  fromDay: string;
  toDay: string;
  /** Name of one of the club's legal-light rules. */
  legalLightName?: string | null;
}

/** 'hunt_time': only within so many hours of the window's start, and one stand at a time. */
export type ClaimAhead = { kind: 'days'; days: number } | { kind: 'hunt_time'; hours: number };

/** Days on which the whole ground is closed, both inside. They stand beside the rules: stewards and landowners set them. */
export interface ClosedDays {
  fromDay: string;
  toDay: string;
  reason: string;
}

export const SIGHTINGS_SEEN_BY = ['all', 'officers', 'after_season'] as const;
export type SightingsSeenBy = (typeof SIGHTINGS_SEEN_BY)[number];

export const CALENDAR_PRIVACY = ['names_and_stands', 'names_only', 'busy_only'] as const;
export type CalendarPrivacy = (typeof CALENDAR_PRIVACY)[number];

export interface OrangeRule {
  text: string;
  source: string;
  statedOn: string;
}

/** What the state or the landowner says of a kind of work on the ground, in the club's own words. */
export type WorkRule = OrangeRule;

/** What the state allows of deer, in the club's own words. */
export type StateHarvestRule = OrangeRule;

/** Minutes after a person counts as overdue at which each is told. */
export interface OverdueSteps {
  memberMinutes: number;
  officersMinutes: number;
  contactMinutes: number;
}

/** Everything a club decides for itself about booking. null: the club sets no such limit. */
export interface ClubRules {
  legalLight: LegalLightRule[];
  windowHours: WindowHours;
  /** Empty: no season dates are set and every day is open. */
  seasons: Season[];
  claimAhead: ClaimAhead;
  maxLiveClaims: number | null;
  /** Minutes after a window's start at which an unsigned claim lapses. */
  holdMinutes: number | null;
  restDaysDefault: number;
  mostSitsPerMemberSeason: number | null;
  /** Least distance between two occupied stands; of two weapons the wider one counts. 0: none. */
  spacingM: Record<Weapon, number>;
  /** No walking within this of an occupied stand. 0: none. */
  passThroughM: number;
  guestDaysPerSeason: number | null;
  guestsAtOnce: number;
  /** After the back-by time, before a person counts as overdue. */
  backByMinutes: number;
  overdueSteps: OverdueSteps;
  /** Whether the page a safety contact opens shows the stand's position. */
  overdueShowsPlace: boolean;
  sightingsSeenBy: SightingsSeenBy;
  calendarPrivacy: CalendarPrivacy;
  /** A member at the gate may take a free stand whose window has begun. */
  walkUpSits: boolean;
  orangeRule: OrangeRule | null;
  /** Most deer a season, 1 July to 30 June. They caution and never refuse. */
  harvestQuotas: HarvestQuota[];
  stateHarvestRule: StateHarvestRule | null;
  workRules: Record<GroundWork, WorkRule | null>;
}

/** 300 yd is the spacing found most often in clubs' posted rules, whatever the weapon (practice). */
const DEFAULT_SPACING_M = ydToM(300);

/** Where clubs differ these follow the commonest posted rule; the rest are our choice. Three rest days: practice. */
export const DEFAULT_CLUB_RULES: ClubRules = {
  legalLight: [],
  windowHours: {
    morning: { startMinutesFromSunrise: -30, endClock: '11:00' },
    evening: { startClock: '14:30', endMinutesFromSunset: 30 },
  },
  seasons: [],
  claimAhead: { kind: 'days', days: 14 },
  maxLiveClaims: null,
  holdMinutes: null,
  restDaysDefault: 3,
  mostSitsPerMemberSeason: null,
  spacingM: {
    bow: DEFAULT_SPACING_M,
    crossbow: DEFAULT_SPACING_M,
    muzzleloader: DEFAULT_SPACING_M,
    shotgun: DEFAULT_SPACING_M,
    rifle: DEFAULT_SPACING_M,
  },
  passThroughM: ydToM(100),
  guestDaysPerSeason: 5,
  guestsAtOnce: 1,
  backByMinutes: 60,
  overdueSteps: { memberMinutes: 0, officersMinutes: 15, contactMinutes: 30 },
  overdueShowsPlace: false,
  sightingsSeenBy: 'all',
  calendarPrivacy: 'names_and_stands',
  walkUpSits: true,
  orangeRule: null,
  harvestQuotas: [],
  stateHarvestRule: null,
  workRules: { mock_scrape: null, water: null, bait: null, cutting: null, planting: null },
};

/** Rules as they were saved, with the default of each that came later. */
export function completeRules(saved: Partial<ClubRules>): ClubRules {
  return { ...DEFAULT_CLUB_RULES, ...saved };
}

/** The spacing that holds between two sits; a weapon not said is taken as the one with the widest. */
export function spacingBetweenM(rules: ClubRules, a: Weapon | null, b: Weapon | null): number {
  const of = (weapon: Weapon | null) =>
    weapon === null ? Math.max(...WEAPONS.map((w) => rules.spacingM[w])) : rules.spacingM[weapon];
  return Math.max(of(a), of(b));
}
