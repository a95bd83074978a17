import { dayOf, formatDay } from '@/core/day-time';
import { fairnessWords, gini } from '@/core/draw/fairness';
import { WEAPONS } from '@/core/types';
import { clockText, dayAndWindow } from '@/features/bookings/sit-words';
import { listStands } from '@/features/ground/stands-data';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type EnterDrawValues, MOST_CHOICES } from './draw-schema';
import { type DrawRow, findDraw, listDraws, listEntries } from './draws-data';
import { loadPoints } from './load-points';

export interface DrawLine {
  id: string;
  title: string;
  state: DrawRow['state'];
  stateText: string;
}

function stateText(scope: ClubScope, draw: DrawRow, now: number): string {
  if (draw.state === 'cancelled') return 'Called off';
  if (draw.state === 'published') return 'Published';
  if (draw.state === 'drawn') return 'Made, not published';
  const when = `${formatDay(dayOf(draw.closesAt, scope.club.zone))}, ${clockText(draw.closesAt, scope.club)}`;
  return now < draw.closesAt ? `Open until ${when}` : 'Closed, to be made';
}

export async function readDraws(scope: ClubScope, now: number): Promise<DrawLine[]> {
  return (await listDraws(scope)).map((draw) => ({
    id: draw.id,
    title: dayAndWindow(draw.day, draw.windows, true),
    state: draw.state,
    stateText: stateText(scope, draw, now),
  }));
}

export interface DrawResultLine {
  memberId: string;
  name: string;
  own: boolean;
  points: number;
  turn: number;
  stand: string | null;
  reasons: string[];
  /** Given back, lapsed or cancelled since. */
  gone: boolean;
  /** Holds a sit that may still be swapped. */
  held: boolean;
  offersTo: string | null;
}

export interface DrawScreen extends DrawLine {
  note: string;
  seed: string;
  mayEnter: boolean;
  mayMake: boolean;
  entered: string[];
  stands: { value: string; label: string }[];
  form: EnterDrawValues;
  hasEntered: boolean;
  points: number;
  pointText: string;
  /** null: not to be seen yet. */
  results: DrawResultLine[] | null;
  resultText: string | null;
  fairText: string | null;
  ownSitId: string | null;
}

function pointText({ pointsPerMiss, resetOnGiven, workHoursPerPoint }: DrawRow['pointRules']): string {
  const parts = [
    `${pointsPerMiss} for each draw that gave nothing`,
    ...(workHoursPerPoint === null ? [] : [`1 for each ${workHoursPerPoint} hours of work credited`]),
  ];
  return `Points: ${parts.join(', ')}${resetOnGiven ? '; a stand given takes them back to none' : ''}. Each point is one more entry in the lottery for the order of turns.`;
}

function resultText(draw: DrawRow): string | null {
  if (!draw.result) return null;
  const { gap, timeUp } = draw.result;
  if (gap === 0) return 'Proved to be the best answer under every rule.';
  const percent = (gap * 100).toFixed(1);
  return timeUp
    ? `The best answer found in the time allowed; a better one could be worth ${percent} % more at most.`
    : `Within ${percent} % of the best answer there can be.`;
}

export async function readDraw(scope: ClubScope, id: string, now: number): Promise<DrawScreen> {
  const draw = await findDraw(scope, id);
  if (!draw) throw notFound();
  const { member } = scope;
  const entries = await listEntries(scope, id);
  const own = entries.find(({ entry }) => entry.memberId === member.id)?.entry ?? null;
  const rows = await listStands(scope);
  const names = new Map(rows.map((stand) => [stand.id, stand.name]));
  const points = await loadPoints(scope, { before: draw.day, rules: draw.pointRules });
  const seen = draw.state === 'published' || (draw.state === 'drawn' && scope.can('draws.write'));
  const counts = entries.map(({ entry }) => (entry.standId === null ? 0 : 1));
  const share = gini(counts);
  const given = counts.filter((one) => one === 1).length;
  const choices = Array.from({ length: MOST_CHOICES }, (_, at) => own?.choices[at] ?? '');
  return {
    id: draw.id,
    title: dayAndWindow(draw.day, draw.windows, true),
    state: draw.state,
    stateText: stateText(scope, draw, now),
    note: draw.note,
    seed: draw.seed,
    mayEnter: draw.state === 'open' && now < draw.closesAt,
    mayMake: (draw.state === 'open' || draw.state === 'drawn') && now >= draw.closesAt,
    entered: entries.map(({ name }) => name),
    stands: draw.standIds.flatMap((value) => {
      const label = names.get(value);
      return label === undefined ? [] : [{ value, label }];
    }),
    form: { drawId: id, weapon: own?.weapon ?? WEAPONS[0], choices, anyByScore: own?.anyByScore ?? true },
    hasEntered: own !== null,
    points: points.get(member.id) ?? 0,
    pointText: pointText(draw.pointRules),
    results: seen
      ? entries
          .map(({ entry, name, sitStatus }) => ({
            memberId: entry.memberId,
            name,
            own: entry.memberId === member.id,
            points: entry.points ?? 0,
            turn: entry.turn ?? 0,
            stand: entry.standId === null ? null : (names.get(entry.standId) ?? 'A stand no longer in use'),
            reasons: entry.reasons ?? [],
            gone: sitStatus !== null && sitStatus !== 'booked',
            held: sitStatus === 'booked',
            offersTo: entry.swapWith,
          }))
          .sort((a, b) => a.turn - b.turn)
      : null,
    resultText: seen ? resultText(draw) : null,
    fairText:
      seen && share !== null
        ? `${given} of ${entries.length} members were given a stand: ${fairnessWords(share)} (Gini ${share.toFixed(2)}, where 0 is the same for all).`
        : null,
    ownSitId: own?.sitId ?? null,
  };
}

export async function readDrawStands(scope: ClubScope): Promise<{ value: string; label: string }[]> {
  return (await listStands(scope)).map(({ id, name }) => ({ value: id, label: name }));
}
