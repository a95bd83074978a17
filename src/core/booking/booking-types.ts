import type { SitWindow, WindowName } from '../condition-types';
import type { Point, Weapon } from '../ground-types';
import type { Role } from '../permissions';
import type { Units } from '../units';
import type { ClosedDays, ClubRules } from './rules';

export interface BookingStand {
  id: string;
  name: string;
  at: Point;
  /** null: the club's default. */
  restDays: number | null;
  mostSitsSeason: number | null;
  /** A weapon not named is not allowed here. */
  weapons: Weapon[];
  /** Both days are closed; toDay null: until further notice. */
  closures: { fromDay: string; toDay: string | null; reason: string }[];
  /** null: everyone. */
  allowedMemberIds: string[] | null;
  /** The ways in and out, each from its parking place to the stand. */
  approaches: Point[][];
}

export interface BookingMember {
  id: string;
  name: string;
  role: Role;
}

/** A sit that stands (neither cancelled nor lapsed). Several windows of one sit are one record. */
export interface OtherSit {
  sitId: string;
  standId: string;
  standName: string;
  standAt: Point;
  memberId: string;
  memberName: string;
  day: string;
  windows: WindowName[];
  weapon: Weapon | null;
  /** End of its last window. */
  endAt: number;
}

/** A day of this season on which the member brings guests. */
export interface GuestHunt {
  sitId: string;
  day: string;
  windows: WindowName[];
  guests: number;
}

/** Everything the rules of booking look at. */
export interface BookingCheck {
  stand: BookingStand;
  member: BookingMember;
  day: string;
  /** One window, or both for all day. */
  windows: WindowName[];
  /** The instants of those windows on that day, in any order. */
  spans: SitWindow[];
  /** null: not said. */
  weapon: Weapon | null;
  /** Guests who come along. */
  guests: number;
  /** This member's hunts with guests in the season of the day; the sit being changed may be among them. */
  guestHunts: GuestHunt[];
  now: number;
  /** The club's IANA zone. */
  zone: string;
  units: Units;
  rules: ClubRules;
  /** Closures of the whole ground. */
  closedDays: ClosedDays[];
  /**
   * At least: sits at this stand within its rest days of the day on either side, every sit of the day, and this member's
   * sits that have not ended. More does no harm.
   */
  otherSits: OtherSit[];
  /** Sits of the season (hunting-year.ts) that stand, without the one being changed. */
  seasonCounts: { stand: number; member: number };
  /** The sit being changed: it never stands in its own way. */
  exceptSitId: string | null;
}
