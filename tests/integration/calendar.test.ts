import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import ICAL from 'ical.js';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { GET as getBoard } from '@/app/api/clubs/[club]/board/route';
import { GET } from '@/app/calendar/[secret]/route';
import { makeFeedAction, revokeFeedAction } from '@/app/clubs/[club]/calendar/actions';
import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import { reader, write } from '@/db/client';
import { auditLog, calendarFeeds, clubs, memberships, stands } from '@/db/schema';
import { bookSit } from '@/features/bookings/book-sit';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { type BookSitInput, bookSitSchema } from '@/features/bookings/sit-schema';
import { readFeeds } from '@/features/calendar/reads';
import { setClock } from '@/server/clock';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest, newBrowser } from '../helpers/request';

let club: TestClub;
let ann: TestMember;
let steward: TestMember;
let oak: string;

beforeAll(() => setClock(() => TEST_NOW));

beforeEach(async () => {
  club = await makeClub();
  ann = await addMember(club, 'member', { name: 'Ann Roe' });
  steward = await addMember(club, 'steward', { name: 'Stew Holt' });
  oak = await addStand(club, { name: 'Oak Ladder', lat: 34.123456, lon: -84.065432 });
});

const book = (who: TestMember, standId: string, more: Partial<BookSitInput> = {}) => {
  const key = { requestKey: randomUUID() };
  const day = '2026-11-07';
  return bookSit(
    who.scope,
    bookSitSchema.parse({ standId, day, windows: 'morning', weapon: 'bow', ...key, ...more }),
    TEST_NOW,
  );
};

async function make(who: TestMember, scope: 'own' | 'club', withPlace = false) {
  const answer = await inRequest(who.browser, () => makeFeedAction(club.slug, { scope, withPlace }));
  if (!answer.ok) throw new Error(answer.error.message);
  return answer.data.url;
}

function get(url: string, headers: Record<string, string> = {}) {
  const secret = new URL(url).pathname.split('/').at(-1) ?? '';
  const request = new Request(url, { headers });
  return inRequest(newBrowser(), () => GET(request, { params: Promise.resolve({ secret }) }));
}

async function events(url: string) {
  const text = await (await get(url)).text();
  const calendar = new ICAL.Component(ICAL.parse(text));
  return calendar.getAllSubcomponents('vevent').map((component) => {
    const event = new ICAL.Event(component);
    return {
      uid: event.uid,
      summary: event.summary,
      sequence: event.sequence,
      status: component.getFirstPropertyValue('status'),
      geo: component.getFirstPropertyValue('geo'),
      start: event.startDate.toJSDate().getTime(),
      text: component.toString(),
    };
  });
}

async function setPrivacy(calendarPrivacy: (typeof DEFAULT_CLUB_RULES)['calendarPrivacy']) {
  const rules = { ...DEFAULT_CLUB_RULES, calendarPrivacy };
  await write((tx) => tx.update(clubs).set({ rules }).where(eq(clubs.id, club.id)));
}

describe('a feed', () => {
  it('holds the own sits, as an independent parser reads them, and cancelled ones as cancelled', async () => {
    const sit = await book(ann, oak);
    await book(steward, await addStand(club));
    const url = await make(ann, 'own');
    const [event, ...more] = await events(url);
    expect(more).toEqual([]);
    expect(event).toMatchObject({
      uid: `${sit.id}@windrest`,
      summary: 'Sit: Oak Ladder',
      status: 'CONFIRMED',
      sequence: 0,
    });
    expect(event?.start).toBe(Math.floor(sit.startAt / 1000) * 1000);
    await cancelSit(ann.scope, { sitId: sit.id, reason: 'work' }, TEST_NOW + 1000);
    const [after] = await events(url);
    expect(after).toMatchObject({ uid: `${sit.id}@windrest`, status: 'CANCELLED', sequence: 1 });
  });

  it('answers 304 to the tag it gave until something changes', async () => {
    await book(ann, oak);
    const url = await make(ann, 'own');
    const first = await get(url);
    const etag = first.headers.get('etag') ?? '';
    expect(first.status).toBe(200);
    expect(first.headers.get('content-type')).toBe('text/calendar; charset=utf-8');
    expect(first.headers.get('cache-control')).toContain('private');
    const same = await get(url, { 'if-none-match': `"other", W/${etag}` });
    expect([same.status, await same.text(), same.headers.get('etag')]).toEqual([304, '', etag]);
    await book(ann, oak, { day: '2026-11-13' });
    const changed = await get(url, { 'if-none-match': etag });
    expect(changed.status).toBe(200);
    expect(changed.headers.get('etag')).not.toBe(etag);
  });

  it("keeps the club's rule of privacy, and the reader's own always in full", async () => {
    await book(ann, oak, { note: 'private words' });
    const elm = await addStand(club, { name: 'Elm Box' });
    await book(steward, elm);
    const url = await make(steward, 'club');
    const seen = async () => (await events(url)).map((event) => event.summary).sort();
    expect(await seen()).toEqual(['Sit: Ann Roe, Oak Ladder', 'Sit: Elm Box']);
    await setPrivacy('names_only');
    expect(await seen()).toEqual(['Sit: Ann Roe', 'Sit: Elm Box']);
    await setPrivacy('busy_only');
    expect(await seen()).toEqual(['A sit is booked', 'Sit: Elm Box']);
    const text = await (await get(url)).text();
    for (const secret of ['Ann Roe', 'Oak Ladder', 'private words', ann.email]) expect(text).not.toContain(secret);
  });

  it('carries no positions unless the member asked', async () => {
    await book(ann, oak);
    const plain = (await events(await make(ann, 'own')))[0];
    expect(plain?.geo).toBeNull();
    expect(plain?.text).not.toMatch(/34\.12|84\.06/);
    expect((await events(await make(ann, 'own', true)))[0]?.geo).toEqual([34.123456, -84.065432]);
  });

  it('keeps only a hash of the secret, and puts none in the audit log', async () => {
    const url = await make(ann, 'own');
    const secret = /([^/]+)\.ics$/.exec(url)?.[1] ?? '';
    expect(secret.length).toBeGreaterThanOrEqual(32);
    const feeds = await reader().select().from(calendarFeeds).where(eq(calendarFeeds.clubId, club.id));
    const log = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(log.map((row) => row.action)).toEqual(['feed.made']);
    expect(JSON.stringify([feeds, log])).not.toContain(secret);
  });
});

describe('an address that no longer opens', () => {
  const status = async (url: string) => (await get(url)).status;

  it('is an old one after a renewal, and any after it is turned off', async () => {
    const old = await make(ann, 'own');
    const renewed = await make(ann, 'own');
    expect([await status(old), await status(renewed)]).toEqual([404, 200]);
    const off = await inRequest(ann.browser, () => revokeFeedAction(club.slug, { scope: 'own' }));
    expect(off).toMatchObject({ ok: true, data: { revoked: 1 } });
    expect(await status(renewed)).toBe(404);
    const again = await inRequest(ann.browser, () => revokeFeedAction(club.slug, { scope: 'own' }));
    expect(again).toMatchObject({ ok: false, error: { code: 'not_found' } });
  });

  it('is that of a removed member, and of one whose role no longer holds it', async () => {
    const own = await make(ann, 'own');
    const whole = await make(steward, 'club');
    await write(async (tx) => {
      await tx.update(memberships).set({ removedAt: TEST_NOW }).where(eq(memberships.id, ann.id));
      await tx.update(memberships).set({ role: 'member' }).where(eq(memberships.id, steward.id));
    });
    expect([await status(own), await status(whole)]).toEqual([404, 404]);
  });

  it('is any that was never made', async () => {
    for (const path of ['x', 'x.ics', `${'a'.repeat(32)}.ics`, `${'a'.repeat(32)}.txt`, '..%2f.ics']) {
      expect(await status(`http://127.0.0.1/calendar/${path}`)).toBe(404);
    }
  });
});

it("gives the club's calendar to officers only, and shows nobody another member's feeds", async () => {
  const answer = await inRequest(ann.browser, () => makeFeedAction(club.slug, { scope: 'club' }));
  expect(answer).toMatchObject({ ok: false, error: { code: 'forbidden' } });
  await make(steward, 'club');
  expect((await readFeeds(steward.scope)).map((feed) => [feed.scope, feed.madeOn])).toEqual([
    ['own', null],
    ['club', 'Wed 4 Nov 2026'],
  ]);
  expect((await readFeeds(ann.scope)).map((feed) => [feed.scope, feed.madeOn])).toEqual([['own', null]]);
});

describe('the board', () => {
  const board = async (who: TestMember) => {
    const request = new Request(`http://127.0.0.1/api/clubs/${club.slug}/board`);
    const answer = await inRequest(who.browser, () =>
      getBoard(request, { params: Promise.resolve({ club: club.slug }) }),
    );
    return { status: answer.status, text: await answer.text() };
  };

  it('shows today and tomorrow by the club clock, to a landowner too, without positions or addresses', async () => {
    const elm = await addStand(club, { name: 'Elm Box' });
    const box = await addStand(club, { name: 'Ash Box', seats: 2 });
    await book(ann, oak, { day: '2026-11-04', windows: 'evening' });
    await book(steward, box, { day: '2026-11-05', windows: 'all_day', guests: [{ name: 'Gil Fern', memberId: null }] });
    await book(ann, elm, { day: '2026-11-06' });
    const landowner = await addMember(club, 'landowner');
    const { status, text } = await board(landowner);
    expect(status).toBe(200);
    const { days } = JSON.parse(text);
    expect(days).toMatchObject([
      {
        day: '2026-11-04',
        title: 'Today',
        sits: [{ standName: 'Oak Ladder', memberName: 'Ann Roe', state: 'due', mine: false }],
      },
      {
        day: '2026-11-05',
        title: 'Tomorrow',
        sits: [{ standName: 'Ash Box', windowText: 'all day', guests: ['Gil Fern'] }],
      },
    ]);
    const [place] = await reader().select().from(stands).where(eq(stands.id, oak));
    expect(text).not.toContain(String(place?.lat));
    expect(text).not.toContain('@');
    expect(JSON.parse((await board(ann)).text).days[0].sits[0].mine).toBe(true);
  });

  it('says by the clock whether an unsigned sit is due, late or over', async () => {
    const sit = await book(ann, oak, { day: '2026-11-04', windows: 'evening' });
    const state = async () => JSON.parse((await board(ann)).text).days[0].sits[0].state;
    try {
      setClock(() => sit.startAt);
      expect(await state()).toBe('late');
      setClock(() => sit.endAt);
      expect(await state()).toBe('unsigned');
    } finally {
      setClock(() => TEST_NOW);
    }
  });
});
