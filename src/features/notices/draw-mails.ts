import { dayOf, formatDay } from '@/core/day-time';
import type { ReadFrom } from '@/db/client';
import { env } from '@/env';
import { findSit } from '@/features/bookings/data';
import { clockText, dayAndWindow } from '@/features/bookings/sit-words';
import { type DrawRow, listEntries } from '@/features/draws/draws-data';
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

const whenOf = (draw: DrawRow, withYear = false) => dayAndWindow(draw.day, draw.windows, withYear);

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

async function publishedMails(scope: ClubScope, ask: DrawMailsAsk, from: ReadFrom): Promise<DrawMail[]> {
  const { event, draw, people } = ask;
  const mails: DrawMail[] = [];
  for (const { entry } of await listEntries(scope, draw.id, from)) {
    const person = people.find(({ memberId }) => memberId === entry.memberId);
    if (!person) continue;
    const stand = entry.standId === null ? null : await getStand(scope, entry.standId, from);
    const drawn = entry.standId === null ? null : (stand?.name ?? published.goneStand);
    const sit = entry.sitId === null ? null : await findSit(scope, entry.sitId, from);
    const gone = entry.standId !== null && sit?.status !== 'booked';
    mails.push({
      person,
      mail: {
        ...frame(scope, draw, `${event.id}:${person.memberId}`, published.button),
        subject: published.subject(drawn, whenOf(draw)),
        paragraphs: [
          published.opening(whenOf(draw, true)),
          published.outcome(drawn),
          ...(gone ? [published.givenUp] : []),
          ...(entry.reasons ?? []),
        ],
        ...(sit ? { latest: sit.startAt - BEFORE_MS } : {}),
      },
    });
  }
  return mails;
}

/** The offer as it stands now: one taken or replaced since is told to nobody. */
async function swapMails(scope: ClubScope, ask: DrawMailsAsk, from: ReadFrom, now: number): Promise<DrawMail[]> {
  const { event, draw, people } = ask;
  const entries = await listEntries(scope, draw.id, from);
  const offer = entries.find(({ userId, entry }) => userId === event.actorUserId && entry.swapWith !== null);
  const asked = entries.find(({ entry }) => entry.memberId === offer?.entry.swapWith);
  const person = people.find(({ memberId }) => memberId === asked?.entry.memberId);
  if (!offer?.entry.sitId || !asked?.entry.sitId || !person) return [];
  const theirs = await findSit(scope, offer.entry.sitId, from);
  const own = await findSit(scope, asked.entry.sitId, from);
  if (theirs?.status !== 'booked' || own?.status !== 'booked' || own.endAt <= now) return [];
  const mail = {
    ...frame(scope, draw, `swap:${theirs.id}:${own.id}:${person.memberId}`, swap.button),
    subject: swap.subject(theirs.standName, own.standName, whenOf(draw)),
    paragraphs: [
      swap.opening({
        member: offer.name,
        theirs: theirs.standName,
        own: own.standName,
        when: whenOf(draw, true),
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
