import { dayOf, formatDay } from '@/core/day-time';
import type { ReadFrom } from '@/db/client';
import { env } from '@/env';
import { findSit } from '@/features/bookings/data';
import { clockText } from '@/features/bookings/words/sits';
import { type DrawRow, listEntries } from '@/features/draws/draws-data';
import { listResults, type ResultLine } from '@/features/draws/results-data';
import { slotName, slotsTitle } from '@/features/draws/slots';
import { getStand } from '@/features/ground/stands-data';
import type { ClubScope } from '@/server/scope';
import type { NoticePerson } from './choices-data';
import type { DrawEvent } from './draw-events-data';
import type { NoticeMail } from './queue-notice';
import { DRAW_MAILS } from './words/mails';

/** Quiet hours hold nothing past two hours before entries close or the sit begins. */
const BEFORE_MS = 2 * 3_600_000;

export interface DrawMailsAsk {
  event: DrawEvent;
  draw: DrawRow;
  /** Those who want to be told and may enter. */
  people: NoticePerson[];
}
export type DrawMail = { person: NoticePerson; mail: NoticeMail };

const whenOf = (draw: DrawRow, withYear = false) => slotsTitle(draw.slots, withYear);

const { opened, calledOff, published, swap } = DRAW_MAILS;

function frame(scope: ClubScope, draw: DrawRow, key: string, label: string) {
  return {
    kind: 'draw_changed' as const,
    dedupeKey: `notice.draw_changed:${key}`,
    button: { label, url: `${env.appUrl}/clubs/${scope.club.slug}/draws/${draw.id}` },
  };
}

function openedMails(scope: ClubScope, { event, draw, people }: DrawMailsAsk, now: number): DrawMail[] {
  if (draw.state !== 'open' || now >= draw.closesAt) return [];
  const { club } = scope;
  const closes = opened.closesAt(formatDay(dayOf(draw.closesAt, club.zone), true), clockText(draw.closesAt, club));
  return people
    .filter(({ userId }) => userId !== event.actorUserId)
    .map((person) => ({
      person,
      mail: {
        ...frame(scope, draw, `${event.id}:${person.memberId}`, opened.button),
        subject: opened.subject(whenOf(draw)),
        paragraphs: [opened.opening(event.actorName, whenOf(draw, true))],
        facts: [
          { label: opened.stands, value: String(draw.standIds.length) },
          { label: opened.closes, value: closes },
          ...(draw.note === '' ? [] : [{ label: opened.note, value: draw.note }]),
        ],
        latest: draw.closesAt - BEFORE_MS,
      },
    }));
}

function calledOffMails(scope: ClubScope, { event, draw, people }: DrawMailsAsk): DrawMail[] {
  return people
    .filter(({ userId, joinedAt }) => userId !== event.actorUserId && joinedAt <= event.at)
    .map((person) => ({
      person,
      mail: {
        ...frame(scope, draw, `${event.id}:${person.memberId}`, calledOff.button),
        subject: calledOff.subject(whenOf(draw)),
        paragraphs: [calledOff.opening(event.actorName, whenOf(draw, true)), calledOff.after],
      },
    }));
}

/** What came of one window, and until when it is of use to know. */
async function drawnPart(scope: ClubScope, draw: DrawRow, { result }: ResultLine, from: ReadFrom) {
  const stand = result.standId === null ? null : await getStand(scope, result.standId, from);
  const drawn = result.standId === null ? null : (stand?.name ?? published.goneStand);
  const sit = result.sitId === null ? null : await findSit(scope, result.sitId, from);
  const outcome = published.outcome(drawn);
  const several = draw.slots.length > 1;
  return {
    drawn,
    startAt: sit?.startAt ?? null,
    paragraphs: [
      several ? published.inWindow(slotName(draw.slots[result.slot]), outcome) : outcome,
      ...(drawn !== null && sit?.status !== 'booked' ? [published.givenUp] : []),
      ...result.reasons,
    ],
  };
}

async function publishedMails(scope: ClubScope, ask: DrawMailsAsk, from: ReadFrom): Promise<DrawMail[]> {
  const { event, draw, people } = ask;
  const results = await listResults(scope, draw.id, from);
  const mails: DrawMail[] = [];
  for (const { entry } of await listEntries(scope, draw.id, from)) {
    const person = people.find(({ memberId }) => memberId === entry.memberId);
    if (!person) continue;
    const parts = [];
    for (const line of results) {
      if (line.result.memberId === entry.memberId) parts.push(await drawnPart(scope, draw, line, from));
    }
    const stands = [...new Set(parts.flatMap(({ drawn }) => drawn ?? []))];
    const starts = parts.flatMap(({ startAt }) => startAt ?? []);
    mails.push({
      person,
      mail: {
        ...frame(scope, draw, `${event.id}:${person.memberId}`, published.button),
        subject: published.subject(stands.length === 0 ? null : stands.join(', '), whenOf(draw)),
        paragraphs: [published.opening(whenOf(draw, true)), ...parts.flatMap(({ paragraphs }) => paragraphs)],
        ...(starts.length > 0 ? { latest: Math.min(...starts) - BEFORE_MS } : {}),
      },
    });
  }
  return mails;
}

/** The offer as it stands now: one taken or replaced since is told to nobody. */
async function swapMails(scope: ClubScope, ask: DrawMailsAsk, from: ReadFrom, now: number): Promise<DrawMail[]> {
  const { event, draw, people } = ask;
  const results = (await listResults(scope, draw.id, from)).filter(({ result }) => result.slot === event.detail.slot);
  const offer = results.find(({ userId, result }) => userId === event.actorUserId && result.swapWith !== null);
  const asked = results.find(({ result }) => result.memberId === offer?.result.swapWith);
  const person = people.find(({ memberId }) => memberId === asked?.result.memberId);
  if (!offer?.result.sitId || !asked?.result.sitId || !person) return [];
  const when = slotName(draw.slots[offer.result.slot]);
  const whenWithYear = slotName(draw.slots[offer.result.slot], true);
  const theirs = await findSit(scope, offer.result.sitId, from);
  const own = await findSit(scope, asked.result.sitId, from);
  if (theirs?.status !== 'booked' || own?.status !== 'booked' || own.endAt <= now) return [];
  const mail = {
    ...frame(scope, draw, `swap:${theirs.id}:${own.id}:${person.memberId}`, swap.button),
    subject: swap.subject(theirs.standName, own.standName, when),
    paragraphs: [
      swap.opening({
        member: offer.name,
        theirs: theirs.standName,
        own: own.standName,
        when: whenWithYear,
      }),
      swap.after,
    ],
    latest: own.startAt - BEFORE_MS,
  };
  return [{ person, mail }];
}

/** Whom to tell of an event, and what. */
export async function drawMailsOf(
  scope: ClubScope,
  ask: DrawMailsAsk,
  from: ReadFrom,
  now: number,
): Promise<DrawMail[]> {
  const { action } = ask.event;
  if (action === 'draw.opened') return openedMails(scope, ask, now);
  if (action === 'draw.cancelled') return calledOffMails(scope, ask);
  if (action === 'draw.published') return publishedMails(scope, ask, from);
  return swapMails(scope, ask, from, now);
}
