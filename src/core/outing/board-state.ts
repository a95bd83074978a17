/**
 * due: its window has not begun. late: begun, and nobody has signed in. in: on the ground. overdue: on the ground past
 * the back-by time and the club's allowance. out: signed out. unsigned: over, and nobody ever signed in.
 */
export const BOARD_STATES = ['overdue', 'in', 'late', 'due', 'out', 'unsigned'] as const;
export type BoardState = (typeof BOARD_STATES)[number];

export interface StateInput {
  startAt: number;
  endAt: number;
  /** The latest time on the ground for the sit; null: none. */
  outing: { backBy: number; signedOutAt: number | null } | null;
  /** The club's allowance after the back-by time. */
  backByMinutes: number;
  now: number;
}

/** What the board says of a sit at an instant. Instants are UTC ms. */
export function boardState({ startAt, endAt, outing, backByMinutes, now }: StateInput): BoardState {
  if (outing && outing.signedOutAt === null) return now >= overdueAt(outing.backBy, backByMinutes) ? 'overdue' : 'in';
  if (outing) return 'out';
  if (now < startAt) return 'due';
  return now < endAt ? 'late' : 'unsigned';
}

/** The instant from which a person counts as overdue, UTC ms. */
export function overdueAt(backBy: number, backByMinutes: number): number {
  return backBy + backByMinutes * 60_000;
}

/**
 * The instant at which an unsigned claim lapses: so many minutes after the window began, or after the sit was booked or
 * changed where that came later. null: the club lets none lapse.
 */
export function lapsesAt(sit: { startAt: number; updatedAt: number }, holdMinutes: number | null): number | null {
  return holdMinutes === null ? null : Math.max(sit.startAt, sit.updatedAt) + holdMinutes * 60_000;
}
