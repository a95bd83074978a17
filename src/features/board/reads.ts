import { weaponWord } from '@/core/booking/seasons';
import { addDays, dayOf, formatClock, formatDay } from '@/core/day-time';
import { type BoardState, boardState } from '@/core/outing/board-state';
import { findSit, listBookedSits, type SitDetail } from '@/features/bookings/data';
import { clockText, SIT_WINDOW_WORDS, spanText } from '@/features/bookings/words/sits';
import { type ApproachRow, listApproaches } from '@/features/ground/approaches-data';
import { listParkings } from '@/features/ground/parkings-data';
import { listLastVehicles, listOpenOutings, listOutingsOf, type OutingDetail } from '@/features/outings/data';
import { listLinkedOutings } from '@/features/outings/links-data';
import { listSteps, type OverdueStepRow } from '@/features/outings/overdue-data';
import { readContact } from '@/features/outings/read-contact';
import { signInProblem } from '@/features/outings/sign-in';
import { expectedBackBy } from '@/features/outings/walk-out';
import { backByText, clockBeside, lastSignText, STATE_WORDS } from '@/features/outings/words/outing';
import type { ClubScope } from '@/server/scope';
import { walkUpOffer } from './walk-up-offer';
import { BOARD_READ_WORDS } from './words/reads';

/** What a form to sign in starts from. */
export interface SignInStart {
  waysIn: { id: string; name: string }[];
  approachId: string | null;
  parkingId: string | null;
  vehicle: string;
  /** The club's clock, 24 h: 'HH:MM'. */
  backBy: string;
}

/** No positions and no addresses: a landowner reads this too. */
export interface BoardSit {
  id: string;
  day: string;
  memberName: string;
  mine: boolean;
  standName: string;
  windowText: string;
  timeText: string;
  state: BoardState;
  /** 'Overdue', 'Out, 10:42 AM' */
  stateText: string;
  weaponText: string;
  guests: string[];
  wayIn: string | null;
  parking: string | null;
  vehicle: string;
  /** '8:40 PM (first said 6:40 PM; tracking a deer)'; null unless somebody is on the ground. */
  backByText: string | null;
  lastSign: string | null;
  /** 'Officers told at 7:45 PM' */
  told: string[];
  /** Of the open outing; null: nobody is on the ground. */
  outing: { id: string; backBy: number; linked: boolean } | null;
  /** The reader may sign in for it now. */
  signIn: SignInStart | null;
  /** The reader may sign it out or move its time. */
  maySign: boolean;
}

export interface BoardDay {
  day: string;
  /** 'Today' or 'Tomorrow'. */
  title: string;
  dayText: string;
  sits: BoardSit[];
}

export interface Board {
  /** On the ground now, the overdue first, whatever day their sit is of. */
  onGround: BoardSit[];
  /** The rest of today and tomorrow. */
  days: BoardDay[];
  parkings: { id: string; name: string }[];
  /** The reader's safety contact, who is told when the reader is overdue; null: nobody is. */
  contactName: string | null;
  /** 'Saturday morning, 6:20 AM to 11:00 AM': a free stand may be taken now; null: not now, or not by the reader. */
  walkUp: string | null;
  at: number;
}

interface Known {
  scope: ClubScope;
  now: number;
  ways: ApproachRow[];
  vehicles: Map<string, string>;
  outings: Map<string, OutingDetail>;
  steps: OverdueStepRow[];
  linked: Set<string>;
}

function signInStart({ scope, now, ways, vehicles }: Known, sit: SitDetail): SignInStart | null {
  if (signInProblem(scope, sit, now) !== null) return null;
  const ins = ways.filter((way) => way.standId === sit.standId && way.direction !== 'out');
  const way = ins.find(({ id }) => id === sit.approachId) ?? (ins.length === 1 ? ins[0] : undefined);
  return {
    waysIn: ins.map(({ id, name }) => ({ id, name })),
    approachId: way?.id ?? null,
    parkingId: way?.parkingId ?? null,
    vehicle: vehicles.get(sit.memberId) ?? '',
    backBy: formatClock(expectedBackBy(scope.club, ways, sit), scope.club.zone),
  };
}

function boardSit(known: Known, sit: SitDetail): BoardSit {
  const { scope, now } = known;
  const { club } = scope;
  const outing = known.outings.get(sit.id) ?? null;
  const open = outing?.signedOutAt === null ? outing : null;
  const state = boardState({ ...sit, outing, backByMinutes: club.rules.backByMinutes, now });
  const mine = sit.memberId === scope.member.id;
  const maySign = (mine && scope.can('sits.book')) || scope.can('board.sign_for_others');
  const say = (at: number) => clockBeside(at, now, club);
  const steps = open ? known.steps.filter((row) => row.outingId === open.id && row.moves === open.moves) : [];
  return {
    id: sit.id,
    day: sit.day,
    memberName: sit.memberName,
    mine,
    standName: sit.standName,
    windowText: SIT_WINDOW_WORDS[sit.windows],
    timeText: spanText(sit.startAt, sit.endAt, club),
    state,
    stateText: outing?.signedOutAt
      ? BOARD_READ_WORDS.since(STATE_WORDS[state], say(outing.signedOutAt))
      : STATE_WORDS[state],
    weaponText: weaponWord(sit.weapon),
    guests: sit.guests.map((guest) => guest.name),
    wayIn: outing ? outing.approachName : sit.approachName,
    parking: outing ? outing.parkingName : sit.parkingName,
    vehicle: outing?.vehicle ?? '',
    backByText: open && backByText(open, say),
    lastSign: open && lastSignText(open, say),
    told: steps.map((row) => BOARD_READ_WORDS.told(row.step, row.outcome, clockText(row.at, club))),
    outing: open && { id: open.id, backBy: open.backBy, linked: known.linked.has(open.id) },
    signIn: maySign && !open ? signInStart(known, sit) : null,
    maySign,
  };
}

/** Sits of today and tomorrow, and those of whoever is on the ground, cancelled ones among them. */
async function loadSits(scope: ClubScope, days: { fromDay: string; toDay: string }, open: OutingDetail[]) {
  const booked = await listBookedSits(scope, days);
  const missing = open.filter((outing) => !booked.some((sit) => sit.id === outing.sitId));
  const others = await Promise.all(missing.map((outing) => findSit(scope, outing.sitId)));
  return [...booked, ...others.filter((sit) => sit !== null)];
}

/** Who is on the ground, and who is booked where, today and tomorrow by the club's clock. */
export async function readBoard(scope: ClubScope, now: number): Promise<Board> {
  const today = dayOf(now, scope.club.zone);
  const tomorrow = addDays(today, 1);
  const open = await listOpenOutings(scope);
  const sits = await loadSits(scope, { fromDay: today, toDay: tomorrow }, open);
  const past = await listOutingsOf(
    scope,
    sits.map((sit) => sit.id),
  );
  const known: Known = {
    scope,
    now,
    ways: await listApproaches(scope),
    vehicles: await listLastVehicles(scope, [...new Set(sits.map((sit) => sit.memberId))]),
    // The latest comes first and stays; an open one is always the latest.
    outings: new Map([...past].reverse().map((outing) => [outing.sitId, outing])),
    steps: await listSteps(open.map(({ id }) => id)),
    linked: new Set(await listLinkedOutings(scope, now)),
  };
  const shown = sits.map((sit) => boardSit(known, sit));
  const onGround = shown
    .filter((sit) => sit.outing !== null)
    .sort((a, b) => (a.outing?.backBy ?? 0) - (b.outing?.backBy ?? 0) || a.id.localeCompare(b.id));
  const contact = scope.member.userId === null ? null : await readContact(scope.member.userId, now);
  return {
    onGround,
    days: [
      { day: today, title: BOARD_READ_WORDS.today },
      { day: tomorrow, title: BOARD_READ_WORDS.tomorrow },
    ].map(({ day, title }) => ({
      day,
      title,
      dayText: formatDay(day, true),
      sits: shown.filter((sit) => sit.day === day && sit.outing === null),
    })),
    parkings: (await listParkings(scope)).map(({ id, name }) => ({ id, name })),
    contactName: contact?.state === 'agreed' && !contact.off ? contact.name : null,
    walkUp: walkUpOffer(scope, shown, now),
    at: now,
  };
}
