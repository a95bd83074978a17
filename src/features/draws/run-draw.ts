import { chooseSolver } from '@/adapters/solver/choose';
import { dayOf } from '@/core/day-time';
import { type Allotment, faultOf } from '@/core/draw/allotment';
import { buildProgram, readGiven } from '@/core/draw/build-program';
import { drawConflicts } from '@/core/draw/draw-conflicts';
import { turnOrder } from '@/core/draw/turn-order';
import { turnWeight, worthOf } from '@/core/draw/worth';
import { reader, write } from '@/db/client';
import { gatesFor, loadBookingContext } from '@/features/bookings/booking-context';
import { clockText, windowsHeld } from '@/features/bookings/sit-words';
import { readSits } from '@/features/sits/reads';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type DrawRow, listEntries, updateDraw, updateEntry } from './draws-data';
import { loadPoints } from './load-points';
import { drawName, needDraw, noteDraw } from './note-draw';
import { tellResults } from './tell-results';

/** An answer within a hundredth of the best is taken; after so many seconds the best one found. */
const GAP = 0.01;
const SECONDS = 20;

async function loadScores(scope: ClubScope, draw: DrawRow, now: number): Promise<Map<string, number>> {
  const window = windowsHeld(draw.windows)[0];
  const { open, blocked } = await readSits(scope, { day: draw.day, window }, now, { rules: 'leave_out' });
  return new Map([...open, ...blocked].map((row) => [row.standId, row.score]));
}

function seedNumber(seed: string): number {
  let sum = 0;
  for (const char of seed) sum = (Math.imul(sum, 31) + (char.codePointAt(0) ?? 0)) >>> 0;
  return sum;
}

/** Makes the draw: turns by points and chance, then the allotment of the greatest total worth that keeps every rule. */
export async function runDraw(scope: ClubScope, drawId: string, now: number): Promise<{ id: string; given: number }> {
  const draw = await needDraw(scope, drawId, ['open', 'drawn']);
  if (now < draw.closesAt) {
    throw new AppError(
      'conflict',
      `Members may enter until ${clockText(draw.closesAt, scope.club)} on ${dayOf(draw.closesAt, scope.club.zone)}. Make the draw after that.`,
    );
  }
  const entries = await listEntries(scope, drawId);
  if (entries.length === 0) throw new AppError('conflict', 'Nobody entered this draw. Call it off.');
  const points = await loadPoints(scope, { before: draw.day, rules: draw.pointRules });
  const pointsOf = (memberId: string) => points.get(memberId) ?? 0;
  const turns = turnOrder(
    draw.seed,
    entries.map(({ entry }) => ({ id: entry.memberId, points: pointsOf(entry.memberId) })),
  );
  const turnOf = (memberId: string) => turns.indexOf(memberId);
  const scores = entries.some(({ entry }) => entry.anyByScore) ? await loadScores(scope, draw, now) : new Map();
  const windows = windowsHeld(draw.windows);
  const base = { day: draw.day, windows, standIds: draw.standIds, now };
  const ground = await loadBookingContext(scope, { ...base, memberId: null }, reader());
  const stands = draw.standIds.flatMap((id) => ground.stands.get(id) ?? []);
  const weapons = [...new Set(entries.map(({ entry }) => entry.weapon))];
  const occupied = ground.otherSits
    .filter((sit) => sit.day === draw.day && sit.windows.some((window) => windows.includes(window)))
    .map((sit) => sit.standAt);

  const ruleTexts: (string | null)[][] = [];
  for (const { entry } of entries) {
    const context = await loadBookingContext(scope, { ...base, memberId: entry.memberId }, reader());
    ruleTexts.push(
      stands.map((stand) => {
        const gates = gatesFor(context, stand.id, { weapon: entry.weapon, guests: [] });
        return gates[0]?.text ?? null;
      }),
    );
  }
  const worth = entries.map(({ entry }, member) =>
    stands.map((stand, at) => {
      if (ruleTexts[member]?.[at] !== null) return null;
      const plain = worthOf(entry, stand.id, scores.get(stand.id) ?? null);
      return plain === null ? null : Math.round(plain * turnWeight(turnOf(entry.memberId), entries.length) * 10);
    }),
  );
  if (worth.every((row) => row.every((one) => one === null))) {
    const text = ruleTexts.flat().find((one) => one !== null);
    throw new AppError('conflict', `Nobody may be given any of the stands asked for. ${text ?? ''}`.trim());
  }
  const allotment: Allotment = {
    kinds: entries.map(({ entry }) => weapons.indexOf(entry.weapon)),
    stands: stands.length,
    worth,
    ...drawConflicts({ stands, weapons, occupied, rules: scope.club.rules }),
  };
  const built = buildProgram(allotment);
  const answer = await chooseSolver().solve(built.program, { seconds: SECONDS, gap: GAP, seed: seedNumber(draw.seed) });
  if (answer.kind !== 'found') {
    throw new AppError('unavailable', 'No answer was found in time. Try again, or draw for fewer stands.');
  }
  const given = readGiven(allotment, built, answer.columns);
  if (faultOf(allotment, given) !== null) {
    throw new AppError('internal', 'The draw could not be made. Try again.', { log: 'the solver broke a rule' });
  }
  const { value, bound, gap, timeUp } = answer;
  const members = entries.map(({ entry, name }) => {
    return { name, entry, points: pointsOf(entry.memberId), turn: turnOf(entry.memberId) + 1 };
  });
  const reasons = tellResults({ allotment, given, members, stands, ruleTexts });
  await write(async (tx) => {
    await needDraw(scope, drawId, ['open', 'drawn'], tx);
    for (const [index, { entry, points: had, turn }] of members.entries()) {
      const at = given[index] ?? null;
      const standId = at === null ? null : (stands[at]?.id ?? null);
      await updateEntry(scope, tx, entry, { points: had, turn, standId, reasons: reasons[index] ?? [] });
    }
    await updateDraw(scope, tx, drawId, { state: 'drawn', drawnAt: now, result: { value, bound, gap, timeUp } });
    const detail = { seed: draw.seed, value, gap };
    await noteDraw(scope, tx, { id: drawId, verb: 'made', summary: `Made ${drawName(draw)}.`, detail }, now);
  });
  return { id: drawId, given: given.filter((one) => one !== null).length };
}
