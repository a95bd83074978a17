import { sectorName } from './sectors';
import type { Verdict } from './verdict-types';
import { percentText, SENTENCE_WORDS } from './words/sit';

/** How an instant is written on a club's clock: '6:05'. */
export type Clock = (at: number) => string;

function windPart(verdict: Verdict, clock: Clock): string {
  const hold = verdict.arcHold;
  const from = verdict.meanFromDeg ?? null;
  if (hold === null) {
    if (verdict.confidence.level === 'none') return SENTENCE_WORDS.noForecast;
    return from === null ? SENTENCE_WORDS.variable : SENTENCE_WORDS.noGoodWinds(sectorName(from));
  }
  const share = percentText(hold.shareOfTime);
  const leaves = hold.likeliestLeavingAt;
  // A wind that is as likely out of its arcs from the start does not hold until anything.
  const holds = leaves !== null && hold.shareOfTime >= 0.6 && leaves > (verdict.timeline[0]?.at ?? 0);
  if (from === null) return SENTENCE_WORDS.variableShare(share);
  if (hold.shareOfTime < 0.25) return SENTENCE_WORDS.wrongWind(sectorName(from), share);
  return SENTENCE_WORDS.holds(sectorName(from), share, holds ? clock(leaves) : null);
}

/**
 * One plain line for a list: "NW holds 84 % until 10; walk in by Creek Gate, in by 6:05". A gate comes first where there is
 * one. `now` (UTC ms) is given while the sit can still be walked to: a way whose time has passed is then called too late.
 */
export function sentence(verdict: Verdict, clock: Clock, now: number | null = null): string {
  const gate = verdict.gates[0];
  if (gate) return gate.text;
  const way = verdict.approach;
  let walk: string = SENTENCE_WORDS.noWay;
  if (way) walk = SENTENCE_WORDS.walk(way.approachName, clock(way.inBy));
  if (way && now !== null && way.leaveBy < now) walk = SENTENCE_WORDS.tooLate(clock(way.inBy));
  return SENTENCE_WORDS.line(windPart(verdict, clock), walk);
}
