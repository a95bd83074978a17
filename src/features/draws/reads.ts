import { dayOf, formatDay } from '@/core/day-time';
import { fairnessWords, gini } from '@/core/draw/fairness';
import { WEAPONS } from '@/core/ground-types';
import { reader } from '@/db/client';
import { listSponsoredGuests } from '@/features/bookings/rules-data';
import { clockText } from '@/features/bookings/words/sits';
import { listStands } from '@/features/ground/stands-data';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type EnterDrawValues, MOST_CHOICES } from './draw-schema';
import { type DrawRow, findDraw, listDraws, listEntries } from './draws-data';
import { loadPoints } from './load-points';
import { type RunView, readRun } from './read-run';
import { listResults, type ResultLine } from './results-data';
import { slotName, slotsTitle } from './slots';
import { RESULT_LIST_WORDS } from './words/results';
import { DRAW_STATE_WORDS, DRAW_READ_WORDS as WORDS } from './words/screens';

export interface DrawLine {
  id: string;
  title: string;
  state: DrawRow['state'];
  stateText: string;
}

function stateText(scope: ClubScope, draw: DrawRow, now: number): string {
  if (draw.state !== 'open') return DRAW_STATE_WORDS[draw.state];
  if (now >= draw.closesAt) return DRAW_STATE_WORDS.closed;
  return DRAW_STATE_WORDS.openUntil(
    formatDay(dayOf(draw.closesAt, scope.club.zone)),
    clockText(draw.closesAt, scope.club),
  );
}

export async function readDraws(scope: ClubScope, now: number): Promise<DrawLine[]> {
  return (await listDraws(scope)).map((draw) => ({
    id: draw.id,
    title: slotsTitle(draw.slots),
    state: draw.state,
    stateText: stateText(scope, draw, now),
  }));
}

export interface DrawResultLine {
  memberId: string;
  name: string;
  own: boolean;
  turn: number;
  stand: string | null;
  guests: string[];
  reasons: string[];
  /** Given back, lapsed or cancelled since. */
  gone: boolean;
  /** Holds a sit that may still be swapped. */
  held: boolean;
  offersTo: string | null;
}

/** What came of the wishes for one window. */
export interface SlotResults {
  slot: number;
  name: string;
  lines: DrawResultLine[];
  ownSitId: string | null;
}

export interface DrawScreen extends DrawLine {
  note: string;
  seed: string;
  mayEnter: boolean;
  mayMake: boolean;
  entered: string[];
  slots: { value: string; label: string }[];
  stands: { value: string; label: string }[];
  form: EnterDrawValues;
  hasEntered: boolean;
  /** Guests with an account for whom the reader answers. */
  knownGuests: { id: string; name: string }[];
  mostGuests: number;
  points: number;
  pointText: string;
  /** null: not to be seen yet. */
  results: SlotResults[] | null;
  resultText: string | null;
  fairText: string | null;
  /** null: none was begun, or it is not the reader's to see. */
  run: RunView | null;
}

function resultText({ result }: DrawRow): string | null {
  if (!result) return null;
  if (result.gap === 0) return WORDS.proved;
  const percent = (result.gap * 100).toFixed(1);
  if (result.cutBy === null) return WORDS.within(percent);
  return result.cutBy === 'time' ? WORDS.cutByTime(percent) : WORDS.cutByNodes(percent);
}

/** How evenly the stands fell to those who entered. */
function fairText(memberIds: readonly string[], results: readonly ResultLine[]): string | null {
  const given = results.filter(({ result }) => result.standId !== null);
  const counts = memberIds.map((id) => given.filter(({ result }) => result.memberId === id).length);
  const share = gini(counts);
  if (share === null) return null;
  const seated = counts.filter((count) => count > 0).length;
  return WORDS.fair(seated, counts.length, given.length, fairnessWords(share), share.toFixed(2));
}

function resultLine({ result, entry, name, sitStatus }: ResultLine, own: string, names: Map<string, string>) {
  const { memberId, standId, reasons, swapWith } = result;
  return {
    memberId,
    name,
    own: memberId === own,
    turn: entry.turn ?? 0,
    stand: standId === null ? null : (names.get(standId) ?? RESULT_LIST_WORDS.goneStand),
    guests: standId === null ? [] : entry.guests.map((guest) => guest.name),
    reasons,
    gone: sitStatus !== null && sitStatus !== 'booked',
    held: sitStatus === 'booked',
    offersTo: swapWith,
  };
}

export async function readDraw(scope: ClubScope, id: string, now: number): Promise<DrawScreen> {
  const officer = scope.can('draws.write');
  // Before the draw: a run that ends between the two is then still watched, and its end asks for the page again.
  const run = officer ? await readRun(scope, id, now) : null;
  const draw = await findDraw(scope, id);
  if (!draw) throw notFound();
  const { member, club } = scope;
  const entries = await listEntries(scope, id);
  const own = entries.find(({ entry }) => entry.memberId === member.id)?.entry ?? null;
  const names = new Map((await listStands(scope)).map((stand) => [stand.id, stand.name]));
  const points = await loadPoints(scope, { before: draw.day, rules: draw.pointRules });
  const seen = draw.state === 'published' || (draw.state === 'drawn' && officer);
  const results = seen ? await listResults(scope, id) : [];
  const { pointsPerMiss, workHoursPerPoint, resetOnGiven } = draw.pointRules;
  const every = draw.slots.map((_, slot) => slot);
  return {
    id: draw.id,
    title: slotsTitle(draw.slots),
    state: draw.state,
    stateText: stateText(scope, draw, now),
    note: draw.note,
    seed: draw.seed,
    mayEnter: draw.state === 'open' && now < draw.closesAt,
    mayMake: (draw.state === 'open' || draw.state === 'drawn') && now >= draw.closesAt,
    entered: entries.map(({ name }) => name),
    slots: draw.slots.map((slot, at) => ({ value: String(at), label: slotName(slot) })),
    stands: draw.standIds.flatMap((value) => {
      const label = names.get(value);
      return label === undefined ? [] : [{ value, label }];
    }),
    form: {
      drawId: id,
      weapon: own?.weapon ?? WEAPONS[0],
      slots: (own?.slots ?? every).map(String),
      choices: Array.from({ length: MOST_CHOICES }, (_, at) => own?.choices[at] ?? ''),
      anyByScore: own?.anyByScore ?? true,
      guests: own?.guests ?? [],
    },
    hasEntered: own !== null,
    knownGuests: await listSponsoredGuests(scope, member.id, reader()),
    mostGuests: club.rules.guestsAtOnce,
    points: points.get(member.id) ?? 0,
    pointText: WORDS.points(pointsPerMiss, workHoursPerPoint, resetOnGiven),
    results: seen
      ? draw.slots.map((slot, at) => {
          const here = results.filter(({ result }) => result.slot === at);
          return {
            slot: at,
            name: slotName(slot),
            lines: here.map((line) => resultLine(line, member.id, names)),
            ownSitId: here.find(({ result }) => result.memberId === member.id)?.result.sitId ?? null,
          };
        })
      : null,
    resultText: seen ? resultText(draw) : null,
    fairText: fairText(
      entries.map(({ entry }) => entry.memberId),
      results,
    ),
    run,
  };
}

export async function readDrawStands(scope: ClubScope): Promise<{ value: string; label: string }[]> {
  return (await listStands(scope)).map(({ id, name }) => ({ value: id, label: name }));
}
