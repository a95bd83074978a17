import { beforeEach, describe, expect, it } from 'vitest';
import { changeName } from '@/features/accounts/change-name';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { closeDays } from '@/features/bookings/close-days';
import { saveLog } from '@/features/logs/save-log';
import { readKeptSits, readKeptWeek } from '@/features/sits/kept-reads';
import { readWeek } from '@/features/sits/read-week';
import { readSits } from '@/features/sits/reads';
import { currentWeather, refreshForecast } from '@/features/weather/refresh-forecast';
import { book, SATURDAY } from '../helpers/book';
import { logOf, onSaturday } from '../helpers/log-sits';
import { addMember, addStand, makeClub, TEST_NOW, TEST_PLACE, type TestMember } from '../helpers/make-club';
import { eachSitsClub, MORNING } from '../helpers/sits-club';

const made = eachSitsClub();
const list = (who: TestMember, now = TEST_NOW) => readKeptSits(who.scope, MORNING, now);
const fresh = (who: TestMember, now = TEST_NOW) => readSits(who.scope, MORNING, now);
/** A kept answer without the mark that tells it from others. */
const said = <T extends { mark: string }>({ mark: _, ...view }: T) => view;

describe('a kept list', () => {
  let admin: TestMember;

  beforeEach(async () => {
    admin = await addMember(made.club, 'admin', { name: 'Cora Pell' });
    // What is read while a forecast is fetched is not kept, and a page waits for one only so long.
    await refreshForecast(TEST_PLACE, TEST_NOW, currentWeather());
  });

  it('is the very same answer while nothing changes, and is worked out anew each minute', async () => {
    const first = await list(made.ann);
    expect(said(first)).toEqual(await fresh(made.ann));
    expect(await list(made.ann)).toBe(first);
    expect(await list(made.ann, TEST_NOW + 60_000)).not.toBe(first);
  });

  it('is each reader’s own and each club’s own', async () => {
    const { ann, bert, west } = made;
    await book(ann, west);
    const [hers, his] = [await list(ann), await list(bert)];
    expect(hers.mine?.standId).toBe(west);
    expect(his.mine).toBeNull();
    const elsewhere = await makeClub();
    const stranger = await addMember(elsewhere);
    const far = await addStand(elsewhere, { name: 'Far Oak' });
    expect((await list(stranger)).open.map(({ name }) => name)).toEqual(['Far Oak']);
    await book(stranger, far);
    expect(await list(ann)).toBe(hers);
  });

  it('is dropped by a booking, a cancelling, a closing and a name', async () => {
    const { ann, bert, west, east } = made;
    const closure = { standId: east, fromDay: SATURDAY, toDay: SATURDAY, reason: 'Tree work' };
    const booked = await book(bert, west);
    const changes: [string, () => Promise<unknown>][] = [
      ['a name', () => changeName({ id: bert.userId, name: bert.name }, { name: 'Albert Hale' }, TEST_NOW)],
      ['a closing', () => closeDays(admin.scope, closure, TEST_NOW)],
      ['a cancelling', () => cancelSit(bert.scope, { sitId: booked.id, reason: '' }, TEST_NOW)],
      ['a booking', () => book(bert, west)],
    ];
    for (const [what, change] of changes) {
      const before = await list(ann);
      expect(await list(ann), what).toBe(before);
      await change();
      const after = await list(ann);
      expect(after, what).not.toEqual(before);
      expect(said(after), what).toEqual(await fresh(ann));
    }
  });

  it('is dropped by a log that tells of bumped deer', async () => {
    const { ann, bert, west } = made;
    const sit = await book(bert, west);
    const noon = onSaturday('12:00');
    const wednesday = { day: '2026-11-11', window: 'morning' as const };
    await readKeptSits(ann.scope, wednesday, noon);
    const before = await readKeptSits(ann.scope, wednesday, noon);
    expect(await readKeptSits(ann.scope, wednesday, noon)).toBe(before);
    await saveLog(bert.scope, logOf(sit.id, { bumpedIn: 3 }), noon);
    const after = await readKeptSits(ann.scope, wednesday, noon);
    expect(after).not.toEqual(before);
    expect(said(after)).toEqual(await readSits(ann.scope, wednesday, noon));
  });

  it('is dropped by a newer forecast', async () => {
    const { ann } = made;
    const before = await list(ann);
    const outcome = await refreshForecast(TEST_PLACE, onSaturday('20:00'), currentWeather());
    expect(outcome.status).toBe('refreshed');
    expect(await list(ann)).not.toBe(before);
  });
});

it('keeps the week in the same way', async () => {
  const { ann, bert, west } = made;
  const ask = { weapon: undefined };
  await readKeptWeek(ann.scope, ask, TEST_NOW);
  const before = await readKeptWeek(ann.scope, ask, TEST_NOW);
  expect(await readKeptWeek(ann.scope, ask, TEST_NOW)).toBe(before);
  await book(bert, west);
  const after = await readKeptWeek(ann.scope, ask, TEST_NOW);
  expect(said(after)).toEqual(await readWeek(ann.scope, ask, TEST_NOW));
  expect(after).not.toEqual(before);
});
