import { weaponWord } from '@/core/booking/seasons';
import { addDays, dayOf, formatDay } from '@/core/day-time';
import { listBookedSits, type SitDetail } from '@/features/bookings/data';
import { SIT_WINDOW_WORDS, spanText } from '@/features/bookings/sit-words';
import type { ClubScope } from '@/server/scope';

/** By the clock alone: nobody has said that they are in or out. */
export type SitPhase = 'to_come' | 'now' | 'over';

/** No positions and no addresses: a landowner reads this too. */
export interface BoardSit {
  id: string;
  memberName: string;
  mine: boolean;
  standName: string;
  windowText: string;
  timeText: string;
  phase: SitPhase;
  weaponText: string;
  guests: string[];
  wayIn: string | null;
  parking: string | null;
}

export interface BoardDay {
  day: string;
  /** 'Today' or 'Tomorrow'. */
  title: string;
  dayText: string;
  sits: BoardSit[];
}

export interface Board {
  days: BoardDay[];
}

function phaseOf(sit: SitDetail, now: number): SitPhase {
  if (now < sit.startAt) return 'to_come';
  return now < sit.endAt ? 'now' : 'over';
}

function boardSit(scope: ClubScope, sit: SitDetail, now: number): BoardSit {
  return {
    id: sit.id,
    memberName: sit.memberName,
    mine: sit.memberId === scope.member.id,
    standName: sit.standName,
    windowText: SIT_WINDOW_WORDS[sit.windows],
    timeText: spanText(sit.startAt, sit.endAt, scope.club),
    phase: phaseOf(sit, now),
    weaponText: weaponWord(sit.weapon),
    guests: sit.guests.map((guest) => guest.name),
    wayIn: sit.approachName,
    parking: sit.parkingName,
  };
}

/** Who is booked where, today and tomorrow by the club's clock. */
export async function readBoard(scope: ClubScope, now: number): Promise<Board> {
  const today = dayOf(now, scope.club.zone);
  const tomorrow = addDays(today, 1);
  const sits = await listBookedSits(scope, { fromDay: today, toDay: tomorrow });
  return {
    days: [
      { day: today, title: 'Today' },
      { day: tomorrow, title: 'Tomorrow' },
    ].map(({ day, title }) => ({
      day,
      title,
      dayText: formatDay(day, true),
      sits: sits.filter((sit) => sit.day === day).map((sit) => boardSit(scope, sit, now)),
    })),
  };
}
