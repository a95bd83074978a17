import type { BookingStand } from '@/core/booking/booking-types';
import { countGuestDays } from '@/core/booking/guest-days';
import type { Allotment } from '@/core/draw/allotment';
import { drawConflicts } from '@/core/draw/draw-conflicts';
import { drawLimits } from '@/core/draw/draw-limits';
import { turnOrder } from '@/core/draw/turn-order';
import { stepsOf, turnWeight, worthOf } from '@/core/draw/worth';
import type { Weapon } from '@/core/ground-types';
import { reader } from '@/db/client';
import type { DrawSlot } from '@/db/schema';
import { type BookingContext, loadBookingContext } from '@/features/bookings/booking-context';
import { windowsHeld } from '@/features/bookings/words/sits';
import { readSits } from '@/features/sits/reads';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type DrawRow, type EntryRow, listEntries } from './draws-data';
import { type EntrantRules, loadEntrantRules } from './load-entrant';
import { loadPoints } from './load-points';
import { DRAW_ERRORS } from './words/errors';

/** Worth is counted in tenths, so that a solver sums whole numbers. */
const TENTHS = 10;

export interface Entrant {
  name: string;
  entry: EntryRow;
  points: number;
  /** Place in line, from 1. */
  turn: number;
}

/** A draw as the sums see it, with what its numbers stand for. */
export interface LoadedDraw {
  allotment: Allotment;
  slots: DrawSlot[];
  members: Entrant[];
  /** A place is one of these in a slot; they are numbered slot by slot. */
  stands: BookingStand[];
  /** By member and place: the rule of booking that forbids it. */
  ruleTexts: (string | null)[][];
}

async function loadEntrants(scope: ClubScope, draw: DrawRow): Promise<Entrant[]> {
  const entries = await listEntries(scope, draw.id);
  if (entries.length === 0) throw new AppError('conflict', DRAW_ERRORS.nobodyEntered);
  const points = await loadPoints(scope, { before: draw.day, rules: draw.pointRules });
  const had = (memberId: string) => points.get(memberId) ?? 0;
  const turns = turnOrder(
    draw.seed,
    entries.map(({ entry }) => ({ id: entry.memberId, points: had(entry.memberId) })),
  );
  return entries.map(({ entry, name }) => ({
    name,
    entry,
    points: had(entry.memberId),
    turn: turns.indexOf(entry.memberId) + 1,
  }));
}

/** Sit scores by stand, slot by slot; without anybody who leaves it to the score none are asked for. */
async function loadScores(
  scope: ClubScope,
  draw: DrawRow,
  members: Entrant[],
  now: number,
): Promise<Map<string, number>[]> {
  const scores: Map<string, number>[] = [];
  for (const { day, windows } of draw.slots) {
    const window = windowsHeld(windows)[0];
    if (!members.some(({ entry }) => entry.anyByScore)) {
      scores.push(new Map());
      continue;
    }
    const { open, blocked } = await readSits(scope, { day, window }, now, { rules: 'leave_out' });
    scores.push(new Map([...open, ...blocked].map((row) => [row.standId, row.score])));
  }
  return scores;
}

function worthRow(
  draw: DrawRow,
  member: Entrant,
  members: number,
  of: { ids: string[]; scores: Map<string, number>[] },
) {
  const weight = turnWeight(member.turn - 1, members) * TENTHS;
  return draw.slots.flatMap((_, slot) =>
    of.ids.map((standId) => {
      if (!member.entry.slots.includes(slot)) return null;
      const plain = worthOf(member.entry, standId, of.scores[slot]?.get(standId) ?? null);
      return plain === null ? null : Math.round(plain * weight);
    }),
  );
}

/** Everything the sums look at, read before they begin. */
export async function loadDraw(scope: ClubScope, draw: DrawRow, now: number): Promise<LoadedDraw> {
  const members = await loadEntrants(scope, draw);
  const grounds: BookingContext[] = [];
  for (const { day, windows } of draw.slots) {
    const ask = { day, windows: windowsHeld(windows), standIds: draw.standIds, memberId: null, now };
    grounds.push(await loadBookingContext(scope, ask, reader()));
  }
  const stands = draw.standIds.flatMap((id) => grounds[0]?.stands.get(id) ?? []);
  if (stands.length === 0) throw new AppError('conflict', DRAW_ERRORS.noStands);
  const entrants: EntrantRules[] = [];
  for (const { entry } of members) entrants.push(await loadEntrantRules(scope, draw, entry, stands, now));

  const scores = await loadScores(scope, draw, members, now);
  const weapons: Weapon[] = [...new Set(members.map(({ entry }) => entry.weapon))];
  const of = { ids: stands.map((stand) => stand.id), scores };
  const ruleTexts = entrants.map((entrant) => entrant.ruleTexts);
  const worth = members.map((member, index) =>
    worthRow(draw, member, members.length, of).map((value, place) =>
      (ruleTexts[index]?.[place] ?? null) === null ? value : null,
    ),
  );
  if (worth.every((row) => row.every((one) => one === null))) {
    throw new AppError('conflict', DRAW_ERRORS.nothingMayBeGiven(ruleTexts.flat().find((one) => one !== null) ?? null));
  }
  const slots = draw.slots.map(({ day, windows }, slot) => ({
    day,
    occupied: (grounds[slot]?.otherSits ?? [])
      .filter((sit) => sit.day === day && sit.windows.some((window) => windowsHeld(windows).includes(window)))
      .map((sit) => sit.standAt),
  }));
  const { rules } = scope.club;
  const most = rules.guestDaysPerSeason;
  const allotment: Allotment = {
    kinds: members.map(({ entry }) => weapons.indexOf(entry.weapon)),
    slots: slots.length,
    slotOf: slots.flatMap((_, slot) => stands.map(() => slot)),
    worth,
    steps: members.map(({ turn }) =>
      stepsOf(slots.length).map((step) => Math.round(step * turnWeight(turn - 1, members.length) * TENTHS)),
    ),
    ...drawConflicts({ slots, stands, weapons, rules }),
    limits: drawLimits({
      rules,
      slots,
      stands: stands.map(({ id, mostSitsSeason }) => ({
        mostSitsSeason,
        seasonSits: grounds.map((ground) => ground.standCounts.get(id) ?? 0),
      })),
      members: entrants.map(({ liveClaims, seasonSits, huntsWith }) => ({
        liveClaims,
        seasonSits,
        guestsOver: most === null || !huntsWith ? null : (together) => countGuestDays(huntsWith(together)) > most,
      })),
    }),
  };
  return { allotment, slots: draw.slots, members, stands, ruleTexts };
}
