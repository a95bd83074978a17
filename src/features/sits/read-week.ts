import { arcsFor } from '@/core/arcs';
import type { SitWindow } from '@/core/condition-types';
import { formatDay } from '@/core/day-time';
import { WEAPONS } from '@/core/ground-types';
import type { Verdict } from '@/core/verdict-types';
import { rankWeek } from '@/core/week';
import { windowsFrom } from '@/core/windows';
import { readQuotaCautions } from '@/features/harvest/quota-cautions';
import type { ClubScope } from '@/server/scope';
import { drawBars, drawShades } from './draw-mini-strip';
import { forecastReaches, forecastView, loadForecast } from './load-forecast';
import { loadOpenWeek, type OpenStands, readerOf, windowKey } from './load-open';
import { loadScoring } from './load-scoring';
import { clubView, type ReadOptions, type SitsAsk, windowToPick } from './reads';
import { orNull, round1, round3 } from './view';
import type { StripShade, WeekCell, WeekColumnView, WeekView } from './view-types';

/** A forecast runs a week or two; without one a week is shown all the same. */
const MOST_WINDOWS = 16;
const LEAST_WINDOWS = 14;

/** Winds as they are told once: stands of one height and shelter share them. */
class Strips {
  readonly list: StripShade[][] = [];
  private readonly known = new Map<string, number>();

  indexOf(shares: number[] | null): number | null {
    if (!shares) return null;
    const thousandths = shares.map((share) => Math.round(share * 1000));
    const key = thousandths.join();
    const index = this.known.get(key) ?? this.list.push(drawShades(thousandths.map((one) => one / 1000))) - 1;
    this.known.set(key, index);
    return index;
  }
}

function weekCell(verdict: Verdict, mine: OpenStands['mine'], strips: Strips): WeekCell {
  return {
    standId: verdict.standId,
    open: verdict.status === 'open',
    mine: mine?.standId === verdict.standId,
    word: verdict.word,
    score: round1(verdict.score),
    quiet: round1(verdict.quiet),
    hold: orNull(verdict.arcHold?.shareOfTime ?? null, round3),
    strip: strips.indexOf(verdict.directionShares ?? null),
    gate: verdict.gates[0]?.text ?? null,
  };
}

/** All stands in every window the forecast reaches. */
export async function readWeek(
  scope: ClubScope,
  ask: Pick<SitsAsk, 'weapon'>,
  now: number,
  options: ReadOptions = {},
): Promise<WeekView> {
  const { club } = scope;
  const weapon = ask.weapon ?? null;
  const first = windowToPick(now, club);
  const kept = options.forecast ?? (await loadForecast(scope, now));
  const ahead = windowsFrom(first, MOST_WINDOWS, club.rules, club);
  const reached = ahead.findLastIndex((window) => forecastReaches(kept, window)) + 1;
  const windows = ahead.slice(0, reached || LEAST_WINDOWS);
  const until = windows.at(-1)?.startAt ?? now;
  const { input } = await loadScoring(scope, { day: first.day, until, weapon }, now);
  const openWeek = await loadOpenWeek(scope, { windows, memberId: readerOf(scope), weapon, now });
  const openOf = (window: SitWindow) => openWeek.get(windowKey(window));
  const week = rankWeek({
    ...input,
    windows,
    forecast: kept.forecast,
    gatesFor: (standId, window) => openOf(window)?.gatesByStand.get(standId) ?? [],
    now,
    detail: 'list',
  });
  const strips = new Strips();
  const columns = week.map(({ window, verdicts }): WeekColumnView => {
    const cells = new Map(verdicts.map((v) => [v.standId, weekCell(v, openOf(window)?.mine ?? null, strips)]));
    return {
      window,
      dayText: formatDay(window.day),
      cells: input.stands.flatMap((stand) => cells.get(stand.id) ?? []),
      order: verdicts.map((verdict) => verdict.standId),
    };
  });
  return {
    club: clubView(club),
    weapon,
    weapons: WEAPONS.filter((w) => input.stands.some((stand) => stand.shotRangeM[w] !== undefined)),
    forecast: forecastView(kept, null),
    stands: input.stands.map(({ id, name, arcs }) => ({
      standId: id,
      name,
      bars: { morning: drawBars(arcsFor(arcs, 'morning')), evening: drawBars(arcsFor(arcs, 'evening')) },
    })),
    strips: strips.list,
    cautions: options.rules === 'leave_out' ? [] : await readQuotaCautions(scope, { day: first.day }),
    columns,
    madeAt: now,
  };
}
