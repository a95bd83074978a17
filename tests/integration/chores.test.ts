import { eq } from 'drizzle-orm';
import ical from 'ical.js';
import { beforeEach, describe, expect, it } from 'vitest';
import {
  addChoreAction,
  addWorkDayAction,
  cancelWorkDayAction,
  creditWorkDayAction,
  finishChoreAction,
  joinWorkDayAction,
  saveInspectionAction,
  takeChoreAction,
} from '@/app/clubs/[club]/chores/actions';
import { closeAction } from '@/app/clubs/[club]/closures/actions';
import { type InspectionAnswers, itemsFor } from '@/core/upkeep/inspection';
import { reader } from '@/db/client';
import { auditLog, chores, closures, outbox, visits } from '@/db/schema';
import { loadGates } from '@/features/bookings/load-gates';
import { makeFeed } from '@/features/calendar/make-feed';
import { readFeed } from '@/features/calendar/read-feed';
import { EMPTY_CHORE } from '@/features/chores/chore-schema';
import { readChores } from '@/features/chores/reads';
import { remindUpkeep } from '@/features/chores/remind-upkeep';
import { readStandUpkeep } from '@/features/chores/upkeep-reads';
import { setClock } from '@/server/clock';
import { book } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';

/** TEST_NOW is Wednesday 4 November 2026, 10 in the morning at the club. */
const TODAY = '2026-11-04';
const DAY_MS = 86_400_000;

let club: TestClub;
let steward: TestMember;
let dale: TestMember;
let stand: string;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub({ spacingM: { bow: 0, crossbow: 0, muzzleloader: 0, shotgun: 0, rifle: 0 } });
  steward = await addMember(club, 'steward', { name: 'Ada Steward' });
  dale = await addMember(club, 'member', { name: 'Dale Ruck' });
  stand = await addStand(club, { name: 'Oak Ladder' });
});

const answersOf = (more: InspectionAnswers = {}): InspectionAnswers => ({
  ...Object.fromEntries(itemsFor('ladder').map((item) => [item, 'good'])),
  ...more,
});

const inspect = (more: Record<string, unknown> = {}) =>
  inRequest(steward.browser, () =>
    saveInspectionAction(club.slug, {
      standId: stand,
      kind: 'ladder',
      day: TODAY,
      answers: answersOf(),
      result: 'pass',
      notes: '',
      strapFittedOn: '',
      strapYears: '',
      nextDueOn: '2027-11-04',
      reopen: false,
      ...more,
    }),
  );

const mailsOf = (kind: string) =>
  reader()
    .select()
    .from(outbox)
    .where(eq(outbox.clubId, club.id))
    .then((rows) => rows.filter((row) => row.kind === kind));

describe('inspections', () => {
  it('keeps a pass, and the stand stays open', async () => {
    expect(await inspect({ strapFittedOn: '2024-12-01' })).toMatchObject({ ok: true, data: { told: 0, chore: false } });
    const { line, history } = await readStandUpkeep(steward.scope, stand, TEST_NOW);
    expect(line).toMatchObject({ result: 'pass', nextState: 'fine', strapState: 'soon' });
    expect(line.strapText).toBe('Good to Tue 1 Dec 2026 (usual 2 y)');
    expect(history).toHaveLength(1);
    expect(
      (
        await loadGates(dale.scope, {
          day: '2026-11-07',
          window: 'morning',
          memberId: dale.id,
          weapon: null,
          now: TEST_NOW,
        })
      ).gatesByStand.get(stand),
    ).toEqual([]);
  });

  it('closed shuts the stand at once, tells those booked there and makes a chore, in one change', async () => {
    await book(dale, stand);
    const result = await inspect({
      answers: answersOf({ straps: 'unsafe' }),
      result: 'closed',
      notes: 'Main strap chewed half through.\nDo not climb.',
    });
    expect(result).toMatchObject({ ok: true, data: { standName: 'Oak Ladder', told: 1, chore: true } });
    const { gatesByStand } = await loadGates(dale.scope, {
      day: '2026-11-09',
      window: 'morning',
      memberId: dale.id,
      weapon: null,
      now: TEST_NOW,
    });
    expect(gatesByStand.get(stand)?.map(({ code }) => code)).toContain('closed');
    expect(
      gatesByStand
        .get(stand)
        ?.map(({ text }) => text)
        .join(),
    ).toContain('Main strap chewed half through');
    const mails = await mailsOf('stand.closed');
    expect(mails.map(({ toEmail }) => toEmail)).toEqual([dale.email]);
    expect(mails[0]?.message?.text).toContain('Why: Main strap chewed half through');
    const open = await readChores(steward.scope, TEST_NOW);
    expect(open.chores.map(({ title, due }) => [title, due])).toEqual([['Mend Oak Ladder', 'Wed 18 Nov 2026']]);
    const audits = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(audits.map(({ action }) => action)).toEqual(
      expect.arrayContaining(['closure.added', 'inspection.added', 'chore.added']),
    );
  });

  it('makes no second closure when the stand is shut already', async () => {
    const shut = { answers: answersOf({ tree: 'unsafe' }), result: 'closed', notes: 'Tree dead at the top' };
    await inspect(shut);
    expect(await inspect(shut)).toMatchObject({ ok: true });
    expect(await reader().select().from(closures).where(eq(closures.clubId, club.id))).toHaveLength(1);
  });

  const openClosures = async () => {
    const rows = await reader().select().from(closures).where(eq(closures.clubId, club.id));
    return rows.filter(({ removedAt, toDay }) => removedAt === null && toDay === null).map(({ reason }) => reason);
  };
  const unsafe = { answers: answersOf({ tree: 'unsafe' }), result: 'closed', notes: 'Tree dead at the top' };

  it('a pass after it opens what it closed when asked to, on record, and nothing by itself', async () => {
    await inspect(unsafe);
    expect((await readStandUpkeep(steward.scope, stand, TEST_NOW)).closedBy).toMatchObject({
      dayText: 'Wed 4 Nov 2026',
      reason: 'Tree dead at the top',
    });
    expect(await inspect()).toMatchObject({ ok: true, data: { opened: false } });
    expect(await openClosures()).toHaveLength(1);
    expect(await inspect({ reopen: true })).toMatchObject({ ok: true, data: { opened: true } });
    expect(await openClosures()).toEqual([]);
    const after = await readStandUpkeep(steward.scope, stand, TEST_NOW);
    expect(after).toMatchObject({ closed: false, closedBy: null });
    const audits = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    const opened = audits.find(({ action }) => action === 'closure.opened');
    expect(opened).toMatchObject({ actorName: 'Ada Steward', summary: 'Opened Oak Ladder again from 2026-11-04.' });
    expect(audits.filter(({ action }) => action === 'inspection.added').at(-1)?.detail).toMatchObject({
      opened: opened?.subjectId,
    });
    expect(await inspect({ reopen: true })).toMatchObject({ ok: true, data: { opened: false } });
  });

  it('a pass opens no closure that stood before the inspection, and only a pass opens one', async () => {
    const form = { standId: stand, fromDay: TODAY, toDay: '', reason: 'The neighbour fells trees' };
    await inRequest(steward.browser, () => closeAction(club.slug, form));
    setClock(() => TEST_NOW + 60_000);
    await inspect(unsafe);
    expect((await readStandUpkeep(steward.scope, stand, TEST_NOW)).closed).toBe(true);
    expect(await inspect({ reopen: true })).toMatchObject({ ok: true, data: { opened: false } });
    expect(await openClosures()).toEqual(['The neighbour fells trees']);

    const other = await addStand(club, { name: 'Ash Ladder' });
    await inspect({ ...unsafe, standId: other });
    const fix = { answers: answersOf({ seat: 'fix' }), result: 'fix_first', notes: 'Seat torn', reopen: true };
    expect(await inspect({ ...fix, standId: other })).toMatchObject({ ok: true, data: { opened: false } });
    expect(await openClosures()).toHaveLength(2);
  });

  it.each([
    ['a pass with something unsafe', { answers: answersOf({ seat: 'unsafe' }) }, 'result'],
    ['a pass with something to fix', { answers: answersOf({ seat: 'fix' }) }, 'result'],
    ['an item not answered', { answers: {} }, 'answers.tree'],
    ['fix first without a word', { answers: answersOf({ seat: 'fix' }), result: 'fix_first' }, 'notes'],
    ['a next look before this one', { nextDueOn: TODAY }, 'nextDueOn'],
    ['a day to come', { day: '2026-11-05' }, 'day'],
  ])('refuses %s beside its field', async (_, more, field) => {
    const result = await inspect(more);
    expect(result.ok ? null : result.error.fields?.[field]).toEqual(expect.any(String));
  });
});

describe('chores', () => {
  const add = (more: Record<string, string> = {}) =>
    inRequest(steward.browser, () => addChoreAction(club.slug, { ...EMPTY_CHORE, title: 'Mow the lane', ...more }));
  const finish = (who: TestMember, id: string, hours = '2.5') =>
    inRequest(who.browser, () => finishChoreAction(club.slug, { id, doneOn: TODAY, hours }));
  const idOf = async (result: Awaited<ReturnType<typeof add>>) => (result.ok ? result.data.id : '');

  it('is taken, done at its place and credited, and the work presses on the stand', async () => {
    const id = await idOf(await add({ place: `stand:${stand}`, dueOn: '2026-11-10' }));
    expect(await inRequest(dale.browser, () => takeChoreAction(club.slug, { id }))).toMatchObject({ ok: true });
    expect(await finish(dale, id)).toMatchObject({ ok: true });
    const screen = await readChores(dale.scope, TEST_NOW);
    expect(screen.chores).toEqual([]);
    expect(screen.hours.find(({ name }) => name === 'Dale Ruck')?.hours).toBe(2.5);
    const rows = await reader().select().from(visits).where(eq(visits.clubId, club.id));
    expect(rows).toMatchObject([{ kind: 'work', standId: stand, memberId: dale.id }]);
  });

  it("is done once, and another's only by an officer", async () => {
    const other = await addMember(club, 'member', { name: 'June Hale' });
    const id = await idOf(await add({ assigneeId: dale.id }));
    expect(await finish(other, id)).toMatchObject({ ok: false, error: { code: 'forbidden' } });
    expect(await finish(steward, id)).toMatchObject({ ok: true });
    expect(await finish(dale, id)).toMatchObject({ ok: false, error: { code: 'conflict' } });
    const [row] = await reader().select().from(chores).where(eq(chores.id, id));
    expect(row).toMatchObject({ doneBy: dale.id, hours: 2.5 });
  });

  it('takes no assignee and no place of another club', async () => {
    const elsewhere = await makeClub();
    const stranger = await addMember(elsewhere);
    const farStand = await addStand(elsewhere);
    expect(await add({ assigneeId: stranger.id })).toMatchObject({ ok: false, error: { code: 'invalid' } });
    expect(await add({ place: `stand:${farStand}` })).toMatchObject({ ok: false, error: { code: 'invalid' } });
    const id = await idOf(await add());
    expect(await inRequest(stranger.browser, () => takeChoreAction(elsewhere.slug, { id }))).toMatchObject({
      ok: false,
      error: { code: 'not_found' },
    });
  });
});

describe('work days', () => {
  const set = (day: string) =>
    inRequest(steward.browser, () =>
      addWorkDayAction(club.slug, {
        title: 'Work day',
        day,
        startClock: '08:00',
        endClock: '12:00',
        meet: 'the barn',
        notes: '',
      }),
    );

  it('is joined before, and credited once it has begun', async () => {
    const made = await set('2026-11-05');
    const id = made.ok ? made.data.id : '';
    expect(await inRequest(dale.browser, () => joinWorkDayAction(club.slug, { id, comes: true }))).toMatchObject({
      ok: true,
    });
    const credit = () =>
      inRequest(steward.browser, () =>
        creditWorkDayAction(club.slug, {
          id,
          members: [
            { memberId: dale.id, hours: '4' },
            { memberId: steward.id, hours: '' },
          ],
        }),
      );
    expect(await credit()).toMatchObject({ ok: false, error: { code: 'conflict' } });
    setClock(() => TEST_NOW + 2 * DAY_MS);
    expect(await credit()).toMatchObject({ ok: true, data: { credited: 1 } });
    const { hours, pastDays } = await readChores(dale.scope, TEST_NOW + 2 * DAY_MS);
    expect(hours).toEqual([
      { name: 'Dale Ruck', hours: 4 },
      { name: 'Ada Steward', hours: 0 },
    ]);
    expect(pastDays).toMatchObject([{ hours: 4, over: true }]);
  });
});

describe('the calendar feed', () => {
  it('holds work days, and as cancelled those called off, as an independent parser reads them', async () => {
    const day = {
      title: 'Work day',
      day: '2026-11-14',
      startClock: '08:00',
      endClock: '12:00',
      meet: 'the barn',
      notes: '',
    };
    const made = await inRequest(steward.browser, () => addWorkDayAction(club.slug, day));
    const { url } = await makeFeed(dale.scope, { scope: 'own', withPlace: false }, TEST_NOW);
    const secret = /calendar\/([^.]+)\.ics/.exec(url)?.[1] ?? '';
    const event = async () => {
      const { body } = await readFeed(secret, TEST_NOW);
      const found = new ical.Component(ical.parse(body)).getFirstSubcomponent('vevent');
      const value = (name: string) => String(found?.getFirstPropertyValue(name));
      return [value('summary'), value('dtstart'), value('status'), value('sequence'), value('location')];
    };
    const summary = `Work day, ${dale.scope.club.name}`;
    // 8:00 EST is 13:00 UTC.
    expect(await event()).toEqual([summary, '2026-11-14T13:00:00Z', 'CONFIRMED', '0', 'the barn']);
    const id = made.ok ? made.data.id : '';
    await inRequest(steward.browser, () => cancelWorkDayAction(club.slug, { id }));
    expect((await event()).slice(2, 4)).toEqual(['CANCELLED', '1']);
  });
});

describe('reminders', () => {
  it('tells stewards once of a strap and a look that come due, and the assignee of a chore', async () => {
    await inspect({ strapFittedOn: '2024-11-20', nextDueOn: '2026-11-20' });
    await inRequest(steward.browser, () =>
      addChoreAction(club.slug, { ...EMPTY_CHORE, title: 'Mow the lane', assigneeId: dale.id, dueOn: '2026-11-06' }),
    );
    await remindUpkeep(TEST_NOW);
    await remindUpkeep(TEST_NOW + 3_600_000);
    const [upkeep, ...more] = await mailsOf('upkeep.due');
    expect(more).toEqual([]);
    expect(upkeep?.toEmail).toBe(steward.email);
    expect(upkeep?.message?.text).toContain('Oak Ladder: main strap, good to Fri 20 Nov 2026 (usual 2 y)');
    expect(upkeep?.message?.text).toContain('Oak Ladder: next look by Fri 20 Nov 2026');
    expect((await mailsOf('chore.due')).map(({ toEmail }) => toEmail)).toEqual([dale.email]);
  });

  it('waits for the morning', async () => {
    await inspect({ strapFittedOn: '2024-11-20' });
    expect(await remindUpkeep(Date.UTC(2026, 10, 5, 6))).toEqual({ reminded: 0 });
  });
});
