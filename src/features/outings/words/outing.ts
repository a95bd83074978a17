import { dayOf, formatDay } from '@/core/day-time';
import type { BoardState } from '@/core/outing/board-state';
import { clockText } from '@/features/bookings/words/sits';

export const STATE_WORDS: Record<BoardState, string> = {
  due: 'Due',
  late: 'Late: not signed in',
  in: 'In',
  overdue: 'Overdue',
  out: 'Out',
  unsigned: 'Never signed in',
};

interface Club {
  zone: string;
  units: 'us' | 'metric';
}

/** '6:40 PM', and with the day where it is another than that of `beside`: '1:30 AM, Sun 8 Nov'. */
export function clockBeside(at: number, beside: number, club: Club): string {
  const day = dayOf(at, club.zone);
  const clock = clockText(at, club);
  return day === dayOf(beside, club.zone) ? clock : `${clock}, ${formatDay(day)}`;
}

/** '6:40 PM, Sat 7 Nov': what a mail that may be read days later says. */
export function clockAndDay(at: number, club: Club): string {
  return `${clockText(at, club)}, ${formatDay(dayOf(at, club.zone))}`;
}

/** The last word from the person. */
export function lastSignText(
  outing: { signedInAt: number; lastSignAt: number; moves: number },
  say: (at: number) => string,
): string {
  return outing.moves === 0 ? `Signed in at ${say(outing.signedInAt)}` : `Moved the time at ${say(outing.lastSignAt)}`;
}

/** '8:40 PM (first said 6:40 PM; tracking a deer)' */
export function backByText(
  outing: { backBy: number; firstBackBy: number; tracking: boolean },
  say: (at: number) => string,
): string {
  const notes = [
    ...(outing.firstBackBy === outing.backBy ? [] : [`first said ${say(outing.firstBackBy)}`]),
    ...(outing.tracking ? ['tracking a deer'] : []),
  ];
  return notes.length === 0 ? say(outing.backBy) : `${say(outing.backBy)} (${notes.join('; ')})`;
}
