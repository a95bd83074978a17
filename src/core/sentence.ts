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

/** One plain line for a list: "NW holds 84 % until 10; walk in by Creek Gate, in by 6:05". A gate comes first where there is one. */
export function sentence(verdict: Verdict, clock: Clock): string {
  const gate = verdict.gates[0];
  if (gate) return gate.text;
  const way = verdict.approach;
  const walk = way ? `walk in by ${way.approachName}, in by ${clock(way.inBy)}` : 'no way in is drawn for it';
  return `${windPart(verdict, clock)}; ${walk}`;
}
