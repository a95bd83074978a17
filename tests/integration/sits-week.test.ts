import { describe, expect, it } from 'vitest';
import { write } from '@/db/client';
import { sitLogs, visits } from '@/db/schema';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { loadEvents, loadSightings } from '@/features/sits/load-scoring';
import { readWeek } from '@/features/sits/read-week';
import { newId } from '@/lib/ids';
import { GET as getDetail } from '../../src/app/api/clubs/[club]/sits/[stand]/route';
import { GET as getSits } from '../../src/app/api/clubs/[club]/sits/route';
import { GET as getWeek } from '../../src/app/api/clubs/[club]/week/route';
import { book, SATURDAY } from '../helpers/book';
import { addMember, makeClub, TEST_NOW, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';
import { DAY, eachSitsClub, HOUR, listFor, near, steady } from '../helpers/sits-club';

const made = eachSitsClub();

describe('what people did', () => {
  it('counts past sits with what was bumped, visits, and booked sits before the window; nothing cancelled or forgotten', async () => {
    const { club, ann, bert, west, east } = made;
    const past = await book(bert, west, { day: '2026-11-05', windows: 'evening' });
    const dropped = await book(bert, east, { day: '2026-11-06' });
    await cancelSit(bert.scope, { sitId: dropped.id, reason: '' }, TEST_NOW);
    const seen = { antleredBucks: 1, does: 2, fawns: 0, unknown: 1, bumpedIn: 1, bumpedSitting: 0, bumpedOut: 2 };
    const hours = { startAt: past.startAt, endAt: past.startAt + 3 * HOUR, createdAt: TEST_NOW };
    const visit = {
      clubId: club.id,
      kind: 'camera_check' as const,
      ...near(0.001),
      memberId: ann.id,
      createdAt: TEST_NOW,
    };
    await write(async (tx) => {
      await tx.insert(sitLogs).values({ sitId: past.id, clubId: club.id, ...seen, ...hours });
      await tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - DAY });
      await tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - 30 * DAY });
      await tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - DAY, removedAt: TEST_NOW });
    });
    const events = await loadEvents(ann.scope, Date.UTC(2026, 10, 7, 11), TEST_NOW);
    expect(events.map(({ kind, standId, bumped }) => [kind, standId, bumped])).toEqual([
      ['sit', west, 3],
      ['camera_check', null, 0],
    ]);
    expect(await loadSightings(ann.scope, SATURDAY, TEST_NOW)).toEqual([]);
    expect(await loadSightings(ann.scope, SATURDAY, past.endAt)).toEqual([
      { standId: west, sits: 1, hours: 3, deer: 4 },
    ]);
  });

  it('makes a pressed stand score less', async () => {
    const { club, ann } = made;
    const fresh = (await listFor(ann)).open.find(({ name }) => name === 'West Oak');
    const visit = { clubId: club.id, kind: 'work' as const, ...near(0.002), memberId: ann.id, createdAt: TEST_NOW };
    await write((tx) => tx.insert(visits).values({ ...visit, id: newId('visit'), at: TEST_NOW - HOUR, bumped: 2 }));
    const pressed = (await listFor(ann)).open.find(({ name }) => name === 'West Oak');
    expect(pressed?.score).toBeLessThan(fresh?.score ?? 0);
  });
});

describe('the week', () => {
  it('says of each window what its list says', async () => {
    const { ann, bert, west } = made;
    await book(bert, west);
    const kept = steady(270);
    const week = await readWeek(ann.scope, {}, TEST_NOW, { forecast: kept });
    expect(week.columns).toHaveLength(16);
    for (const column of week.columns.slice(0, 8)) {
      const { day, window } = column.window;
      const one = await listFor(ann, { day, window }, kept);
      expect(column.order).toEqual([...one.open, ...one.blocked].map((row) => row.standId));
      for (const row of one.open) {
        const cell = column.cells.find(({ standId }) => standId === row.standId);
        expect(cell).toMatchObject({ open: true, score: row.score, word: row.word, hold: row.hold });
      }
    }
    const taken = week.columns.find(({ window }) => window.day === SATURDAY && window.window === 'morning');
    expect(taken?.cells.find(({ standId }) => standId === west)).toMatchObject({ open: false });
  });

  it('shows a week of windows without a forecast', async () => {
    const { ann } = made;
    const week = await readWeek(ann.scope, {}, TEST_NOW, {
      forecast: { forecast: null, ageMs: null, stale: false, error: null },
    });
    expect(week.columns).toHaveLength(14);
    expect(week.strips).toEqual([]);
  });
});

describe('the routes', () => {
  const ask = (who: TestMember, get: typeof getSits, query = '', stand = '') =>
    inRequest(who.browser, () =>
      get(new Request(`http://127.0.0.1/api/x?${query}`), { params: Promise.resolve({ club: made.club.slug, stand }) }),
    );

  it('answer a member, and refuse what cannot be read with plain words', async () => {
    const { ann, west } = made;
    expect((await ask(ann, getSits, `day=${SATURDAY}&window=morning`)).status).toBe(200);
    expect((await ask(ann, getDetail, `day=${SATURDAY}&window=morning`, west)).status).toBe(200);
    expect((await ask(ann, getWeek)).status).toBe(200);
    for (const query of ['day=2026-02-30', 'day=9999-12-31', 'window=noon', 'weapon=spear']) {
      expect((await ask(ann, getSits, query)).status).toBe(400);
    }
    expect((await ask(ann, getDetail, '', 'std_none')).status).toBe(404);
  });

  it('give a stranger the answer of a missing club', async () => {
    const { club, west } = made;
    const stranger = await addMember(await makeClub());
    for (const get of [getSits, getDetail, getWeek]) expect((await ask(stranger, get, '', west)).status).toBe(404);
    const landowner = await addMember(club, 'landowner');
    expect((await ask(landowner, getSits)).status).toBe(403);
  });
});
