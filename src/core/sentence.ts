import { sectorName } from './sectors';
import type { Verdict } from './types';

/** How an instant is written on a club's clock: '6:05'. */
export type Clock = (at: number) => string;

function windPart(verdict: Verdict, clock: Clock): string {
  const hold = verdict.arcHold;
  const from = verdict.meanFromDeg ?? null;
  if (hold === null) {
    if (verdict.confidence.level === 'none') return 'No forecast';
    return from === null ? 'Wind light and variable' : `${sectorName(from)} wind, no good winds set`;
  }
  const share = `${Math.round(hold.shareOfTime * 100)} %`;
  const leaves = hold.likeliestLeavingAt;
  // A wind that is as likely out of its arcs from the start does not hold until anything.
  const holds = leaves !== null && hold.shareOfTime >= 0.6 && leaves > (verdict.timeline[0]?.at ?? 0);
  const until = holds ? ` until ${clock(leaves)}` : '';
  if (from === null) return `Wind light and variable, ${share} in its arcs`;
  if (hold.shareOfTime < 0.25) return `${sectorName(from)} is the wrong wind (${share})`;
  return `${sectorName(from)} holds ${share}${until}`;
}

/**
 * One plain line for a list: "NW holds 84 % until 10; walk in by Creek Gate, in by 6:05". A gate comes first where there is
 * one. `now` (UTC ms) is given while the sit can still be walked to: a way whose time has passed is then called too late.
 */
export function sentence(verdict: Verdict, clock: Clock, now: number | null = null): string {
  const gate = verdict.gates[0];
  if (gate) return gate.text;
  const way = verdict.approach;
  let walk = 'no way in is drawn for it';
  if (way) walk = `walk in by ${way.approachName}, in by ${clock(way.inBy)}`;
  if (way && now !== null && way.leaveBy < now) walk = `too late to walk in, it was to be in by ${clock(way.inBy)}`;
  return `${windPart(verdict, clock)}; ${walk}`;
}
