import { type SitWindow, WINDOW_NAMES } from '@/core/condition-types';
import { rankSits } from '@/core/rank';
import type { Detail } from '@/core/rank-input';
import type { Gate, Verdict } from '@/core/verdict-types';
import { sitWindow } from '@/core/windows';
import type { SitRow } from '@/features/bookings/data';
import { windowsHeld } from '@/features/bookings/words/sits';
import { loadOpenStands } from '@/features/sits/load-open';
import { loadScoring } from '@/features/sits/load-scoring';
import type { KeptForecast } from '@/features/weather/get-forecast';
import type { ClubScope } from '@/server/scope';

export type JudgedSit = Pick<SitRow, 'standId' | 'day' | 'windows' | 'weapon' | 'memberId' | 'guests'>;

function spansOf(scope: ClubScope, sit: Pick<SitRow, 'day' | 'windows'>): SitWindow[] {
  const { club } = scope;
  const held = windowsHeld(sit.windows);
  return WINDOW_NAMES.filter((name) => held.includes(name)).map((name) => sitWindow(sit.day, name, club.rules, club));
}

const NO_GATES: ReadonlyMap<string, Gate[]> = new Map();

/** A booked sit's own verdict, one a window it holds. */
export async function judgeSit(
  scope: ClubScope,
  sit: JudgedSit,
  kept: KeptForecast,
  now: number,
  detail: Detail = 'list',
): Promise<Verdict[]> {
  const spans = spansOf(scope, sit);
  const verdicts: Verdict[] = [];
  for (const window of spans) {
    const ask = { day: sit.day, until: window.startAt, weapon: sit.weapon };
    const { input } = await loadScoring(scope, ask, now);
    const stands = input.stands.filter(({ id }) => id === sit.standId);
    const { forecast } = kept;
    verdicts.push(...rankSits({ ...input, stands, window, forecast, gatesByStand: NO_GATES, now, detail }));
  }
  return verdicts;
}

/** What a sit of one or two windows is worth: as quiet as its louder window, held as long as its worse one. */
export interface SitWorth {
  quiet: number;
  score: number;
  hold: number | null;
  windFromDeg: number | null;
}

export function worthOf(verdicts: Verdict[]): SitWorth | null {
  if (verdicts.length === 0) return null;
  const known = verdicts.filter(({ arcHold }) => arcHold !== null);
  const worst = [...known].sort((a, b) => (a.arcHold?.shareOfTime ?? 0) - (b.arcHold?.shareOfTime ?? 0))[0];
  return {
    quiet: Math.min(...verdicts.map(({ quiet }) => quiet)),
    score: Math.min(...verdicts.map(({ score }) => score)),
    hold: worst?.arcHold?.shareOfTime ?? null,
    windFromDeg: (worst ?? verdicts[0])?.meanFromDeg ?? null,
  };
}

export interface Alternative extends SitWorth {
  standId: string;
  name: string;
  /** The best way in by the core; null: none is drawn. */
  approachId: string | null;
  approachName: string | null;
}

/** Stands that are free to this member for the whole sit and quieter than it is now, the best first. */
export async function findAlternatives(
  scope: ClubScope,
  sit: JudgedSit,
  quietNow: number,
  kept: KeptForecast,
  now: number,
): Promise<Alternative[]> {
  const byStand = new Map<string, Verdict[]>();
  const spans = spansOf(scope, sit);
  const names = new Map<string, string>();
  const seats = new Map<string, number>();
  for (const window of spans) {
    const { input, rows } = await loadScoring(scope, { day: sit.day, until: window.startAt, weapon: sit.weapon }, now);
    const { gatesByStand } = await loadOpenStands(scope, { window, memberId: sit.memberId, weapon: sit.weapon, now });
    for (const stand of rows.stands) {
      names.set(stand.id, stand.name);
      seats.set(stand.id, stand.seats);
    }
    const verdicts = rankSits({ ...input, window, forecast: kept.forecast, gatesByStand, now, detail: 'list' });
    for (const verdict of verdicts) {
      if (verdict.status === 'open') byStand.set(verdict.standId, [...(byStand.get(verdict.standId) ?? []), verdict]);
    }
  }
  const people = sit.guests.length + 1;
  return [...byStand]
    .filter(
      ([id, verdicts]) => id !== sit.standId && verdicts.length === spans.length && (seats.get(id) ?? 1) >= people,
    )
    .flatMap(([standId, verdicts]) => {
      const worth = worthOf(verdicts);
      const way = verdicts[0]?.approach ?? null;
      if (!worth || worth.quiet <= quietNow) return [];
      const approach = { approachId: way?.approachId ?? null, approachName: way?.approachName ?? null };
      return [{ ...worth, standId, name: names.get(standId) ?? '', ...approach }];
    })
    .sort((a, b) => b.score - a.score || a.name.localeCompare(b.name));
}
