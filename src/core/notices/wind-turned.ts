/** What is thought of a booked sit. quiet 0-100; hold: share (0-1) of the sit in the good winds, null: not known. */
export interface Outlook {
  quiet: number;
  hold: number | null;
}

/** A sit is in its good winds while they hold at least half of it. Our choice. */
export const IN_ARC_SHARE = 0.5;

export type Turn = 'same' | 'worse' | 'better';

/** A wind not known yet is taken to be good: nobody has been told otherwise. */
const inArc = ({ hold }: Outlook) => hold === null || hold >= IN_ARC_SHARE;

/**
 * How a sit stands against what was thought when it was booked or its member last told: worse when quiet has fallen by
 * `points` or the wind has left its good winds, better when the opposite has come about, else the same.
 */
export function judgeTurn(before: Outlook, after: Outlook, points: number): Turn {
  const change = after.quiet - before.quiet;
  if (change <= -points || (inArc(before) && !inArc(after))) return 'worse';
  if (change >= points || (!inArc(before) && after.hold !== null && inArc(after))) return 'better';
  return 'same';
}
