import { huntingYear } from '@/core/booking/hunting-year';
import { dayOf, formatClock, formatDay } from '@/core/day-time';
import { can } from '@/core/permissions';
import { type DueState, dueState } from '@/core/upkeep/inspection';
import { spanText } from '@/features/bookings/words/sits';
import { numberText } from '@/features/clubs/read-number';
import { degreesText } from '@/features/ground/place-text';
import { listStands } from '@/features/ground/stands-data';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { ChangeChoreForm } from './chore-schema';
import { type ChoreDetail, findChore, listDoneChores, listOpenChores, listPeople, sumHours } from './chores-data';
import { lastInspections } from './inspections-data';
import { type UpkeepLine, upkeepLine } from './upkeep-reads';
import { CHORE_LIST_WORDS } from './words/chores';
import type { ChangeWorkDayForm } from './work-day-schema';
import { findWorkDay, listComing, listPastWorkDays, listWorkDays, type WorkDayRow } from './work-days-data';

const MOST_DONE = 20;
const MOST_PAST_DAYS = 6;

export interface ChoreLine {
  id: string;
  title: string;
  notes: string;
  place: string;
  assignee: string | null;
  mine: boolean;
  free: boolean;
  /** 'Sat 7 Nov' */
  due: string | null;
  state: DueState;
  /** 'Done Sat 7 Nov by Dale, 2 h'; null: to do. */
  done: string | null;
}

export interface WorkDayLine {
  id: string;
  title: string;
  dayText: string;
  timeText: string;
  meet: string;
  notes: string;
  coming: string[];
  comes: boolean;
  over: boolean;
  hours: number;
}

export interface ChoresScreen {
  chores: ChoreLine[];
  done: ChoreLine[];
  workDays: WorkDayLine[];
  pastDays: WorkDayLine[];
  upkeep: UpkeepLine[];
  hours: { name: string; hours: number }[];
  /** '1 Jul 2026': hours are summed from here. */
  since: string;
}

function choreLine(scope: ClubScope, chore: ChoreDetail, today: string): ChoreLine {
  const { id, title, notes, dueOn, doneOn } = chore;
  return {
    id,
    title,
    notes,
    place: chore.placeName,
    assignee: chore.assigneeName,
    mine: chore.assigneeId === scope.member.id,
    free: chore.assigneeId === null,
    due: dueOn && formatDay(dueOn, true),
    state: dueOn === null ? 'fine' : dueState(dueOn, today),
    done: doneOn && CHORE_LIST_WORDS.done(formatDay(doneOn, true), chore.doerName, numberText(chore.hours)),
  };
}

type Coming = Awaited<ReturnType<typeof listComing>>;

function workDayLine(scope: ClubScope, row: WorkDayRow, all: Coming, now: number): WorkDayLine {
  const coming = all.filter(({ workDayId }) => workDayId === row.id);
  return {
    id: row.id,
    title: row.title,
    dayText: formatDay(row.day, true),
    timeText: spanText(row.startAt, row.endAt, scope.club),
    meet: row.meet,
    notes: row.notes,
    coming: coming.map(({ name }) => name),
    comes: coming.some(({ memberId }) => memberId === scope.member.id),
    over: row.endAt <= now,
    hours: coming.reduce((sum, { hours }) => sum + (hours ?? 0), 0),
  };
}

export async function readChores(scope: ClubScope, now: number): Promise<ChoresScreen> {
  const today = dayOf(now, scope.club.zone);
  const year = huntingYear(today);
  const [open, done, days, past, coming, stands, last, sums, people] = await Promise.all([
    listOpenChores(scope),
    listDoneChores(scope, MOST_DONE),
    listWorkDays(scope, today),
    listPastWorkDays(scope, today, MOST_PAST_DAYS),
    listComing(scope),
    listStands(scope),
    lastInspections(scope),
    sumHours(scope, year),
    listPeople(scope),
  ]);
  const urgency: Record<DueState, number> = { over: 0, soon: 1, fine: 2 };
  return {
    chores: open.map((chore) => choreLine(scope, chore, today)),
    done: done.map((chore) => choreLine(scope, chore, today)),
    workDays: days.map((row) => workDayLine(scope, row, coming, now)),
    pastDays: past.map((row) => workDayLine(scope, row, coming, now)),
    upkeep: stands
      .map((stand) => upkeepLine(stand, last.get(stand.id), today))
      .sort((a, b) => urgency[a.nextState] - urgency[b.nextState] || a.name.localeCompare(b.name)),
    hours: people
      .filter(({ role, id }) => can(role, 'chores.read') || sums.has(id))
      .map(({ id, name }) => ({ name, hours: sums.get(id) ?? 0 }))
      .sort((a, b) => b.hours - a.hours || a.name.localeCompare(b.name)),
    since: formatDay(year.fromDay, true),
  };
}

export async function readChoreForm(
  scope: ClubScope,
  id: string,
  now: number,
): Promise<{ line: ChoreLine; values: ChangeChoreForm }> {
  const chore = await findChore(scope, id);
  if (!chore) throw notFound();
  const point = chore.place === 'point' && chore.lat !== null && chore.lon !== null;
  return {
    line: choreLine(scope, chore, dayOf(now, scope.club.zone)),
    values: {
      id,
      version: chore.version,
      title: chore.title,
      notes: chore.notes,
      assigneeId: chore.assigneeId ?? '',
      place: chore.place,
      lat: point ? degreesText(chore.lat ?? 0) : '',
      lon: point ? degreesText(chore.lon ?? 0) : '',
      dueOn: chore.dueOn ?? '',
    },
  };
}

/** Whom a chore may be given to. */
export async function listWorkers(scope: ClubScope): Promise<{ value: string; label: string }[]> {
  const people = await listPeople(scope);
  return people.filter(({ role }) => can(role, 'chores.read')).map(({ id, name }) => ({ value: id, label: name }));
}

export interface WorkDayScreen {
  line: WorkDayLine;
  values: ChangeWorkDayForm;
  cancelled: boolean;
  started: boolean;
  members: { memberId: string; name: string; hours: string; comes: boolean }[];
}

export async function readWorkDay(scope: ClubScope, id: string, now: number): Promise<WorkDayScreen> {
  const row = await findWorkDay(scope, id);
  if (!row) throw notFound();
  const coming = await listComing(scope);
  const here = coming.filter(({ workDayId }) => workDayId === id);
  const { zone } = scope.club;
  const workers = await listWorkers(scope);
  return {
    line: workDayLine(scope, row, coming, now),
    cancelled: row.cancelledAt !== null,
    started: row.startAt <= now,
    values: {
      id,
      sequence: row.sequence,
      title: row.title,
      day: row.day,
      startClock: formatClock(row.startAt, zone),
      endClock: formatClock(row.endAt, zone),
      meet: row.meet,
      notes: row.notes,
    },
    members: workers.map(({ value, label }) => {
      const one = here.find(({ memberId }) => memberId === value);
      return { memberId: value, name: label, hours: numberText(one?.hours ?? null), comes: one !== undefined };
    }),
  };
}
