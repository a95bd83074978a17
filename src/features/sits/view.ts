import { arcsFor } from '@/core/arcs';
import { type ScoredStand, WEAPONS, type Weapon } from '@/core/ground-types';
import { sentence } from '@/core/sentence';
import type { Caution, Gate, Verdict } from '@/core/verdict-types';
import type { GroundRows } from '@/features/ground/data';
import type { BlockedRow, CautionView, GateView, OpenRow, SitRow, WayBrief } from './view-types';
import { type ClubClock, endsText, shortClock } from './words/terms';

/** Figures as exact as a screen needs them: the list travels over poor signal. */
export const round1 = (value: number) => Math.round(value * 10) / 10;
export const round3 = (value: number) => Math.round(value * 1000) / 1000;
export const orNull = (value: number | null, round: (value: number) => number) =>
  value === null ? null : round(value);

/** Cautions true of every seat or of none; they are said once, or in the opened row. */
const SAID_ELSEWHERE: ReadonlySet<Caution['code']> = new Set(['no_forecast', 'stale_forecast']);

export function cautionView({ code, text, level }: Caution): CautionView {
  return { code, text, level };
}

export function weaponsOf(stand: Pick<ScoredStand, 'shotRangeM'>): Weapon[] {
  return WEAPONS.filter((weapon) => stand.shotRangeM[weapon] !== undefined);
}

/** What is true of all the verdicts alike, said once above the list. */
export function sharedCautions(verdicts: Verdict[]): CautionView[] {
  const [first, ...rest] = verdicts;
  if (!first) return [];
  return first.cautions
    .filter((caution) => !SAID_ELSEWHERE.has(caution.code) && caution.level !== 'note')
    .filter((caution) => rest.every((verdict) => verdict.cautions.some((other) => other.text === caution.text)))
    .map(cautionView);
}

function wayBrief(verdict: Verdict): WayBrief | null {
  const way = verdict.approach;
  if (!way) return null;
  const { approachId, approachName: name, parkingName, leaveBy, inBy, walkSeconds } = way;
  return { approachId, name, parkingName, leaveBy, inBy, walkSeconds: Math.round(walkSeconds) };
}

/** A wind likeliest to leave in the first half hour holds until no time worth naming. */
function withoutEarlyLeave(verdict: Verdict, startAt: number): Verdict {
  const hold = verdict.arcHold;
  if (!hold || hold.likeliestLeavingAt === null || hold.likeliestLeavingAt > startAt) return verdict;
  return { ...verdict, arcHold: { ...hold, likeliestLeavingAt: null } };
}

export interface RowContext {
  club: ClubClock;
  window: { startAt: number; endAt: number };
  now: number;
  stands: ReadonlyMap<string, ScoredStand>;
  rows: Pick<GroundRows, 'stands' | 'approaches'>;
  shared: CautionView[];
}

function sitRow(verdict: Verdict, stand: ScoredStand, context: RowContext): SitRow {
  const { club, rows, shared, window, now } = context;
  const known = new Set(shared.map((caution) => caution.text));
  return {
    standId: stand.id,
    name: stand.name,
    kind: stand.kind,
    word: verdict.word,
    score: round1(verdict.score),
    quiet: round1(verdict.quiet),
    promise: round1(verdict.promise),
    arcs: arcsFor(stand.arcs, verdict.window),
    shares: verdict.directionShares?.map(round3) ?? null,
    hold: orNull(verdict.arcHold?.shareOfTime ?? null, round3),
    sentence: sentence(
      { ...withoutEarlyLeave(verdict, window.startAt), gates: [] },
      (at) => shortClock(at, club),
      window.endAt > now ? now : null,
    ),
    confidence: verdict.confidence.level,
    cautions: verdict.cautions
      .filter(({ code, text }) => !SAID_ELSEWHERE.has(code) && !known.has(text))
      .map(cautionView),
    weapons: weaponsOf(stand),
    seats: rows.stands.find((row) => row.id === stand.id)?.seats ?? 1,
    way: wayBrief(verdict),
    waysIn: rows.approaches
      .filter((way) => way.standId === stand.id && way.direction !== 'out')
      .map(({ id, name }) => ({ id, name })),
  };
}

export function gateView(gate: Gate): GateView {
  return { code: gate.code, text: gate.text, ends: endsText(gate.endsOn) };
}

/** Ranked rows and those not open, from verdicts in their order. */
export function shapeRows(
  verdicts: Verdict[],
  ownStandId: string | null,
  context: RowContext,
): { open: OpenRow[]; blocked: BlockedRow[] } {
  const open: OpenRow[] = [];
  const blocked: BlockedRow[] = [];
  for (const verdict of verdicts) {
    const stand = context.stands.get(verdict.standId);
    if (!stand) continue;
    const row = sitRow(verdict, stand, context);
    if (verdict.status === 'open') open.push({ ...row, rank: open.length + 1, mine: stand.id === ownStandId });
    else blocked.push({ ...row, gates: verdict.gates.map(gateView) });
  }
  return { open, blocked };
}
