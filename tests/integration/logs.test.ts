import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { reader } from '@/db/client';
import { auditLog, outbox, sitLogs, sitLogVersions } from '@/db/schema';
import { cancelSit } from '@/features/bookings/cancel-sit';
import { readLog, readLogScreen } from '@/features/logs/reads';
import { remindLogs } from '@/features/logs/remind-logs';
import { saveLog } from '@/features/logs/save-log';
import { loadEvents, loadSightings } from '@/features/sits/load-scoring';
import { setClock } from '@/server/clock';
import { book, refusal, SATURDAY, smallClub } from '../helpers/book';
import { logOf, onSaturday, sitAndLog } from '../helpers/log-sits';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';

const NOON = onSaturday('12:00');
const DAY_MS = 86_400_000;

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let oak: string;
beforeEach(async () => {
  setClock(() => NOON);
  ({ club, ann, bert, oak } = await smallClub());
});

const auditOf = () => reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));

describe('writing a log', () => {
  it('keeps what was seen, and tells the audit log only that it was written', async () => {
    const sit = await sitAndLog(ann, oak, {
      does: 2,
      fawns: 1,
      bumpedOut: 1,
      bumpedWhere: 'by the gate',
      notes: 'Wind held.',
    });
    const [row] = await reader().select().from(sitLogs).where(eq(sitLogs.sitId, sit.id));
    expect(row).toMatchObject({
      startAt: onSaturday('07:00'),
      endAt: onSaturday('10:30'),
      does: 2,
      fawns: 1,
      bumpedWhere: 'by the gate',
      shot: 'none',
      version: 1,
      savedBy: ann.id,
    });
    const written = (await auditOf()).filter((entry) => entry.action.startsWith('log.'));
    expect(written).toHaveLength(1);
    expect(written[0]).toMatchObject({ action: 'log.written', subjectId: sit.id, detail: { version: 1 } });
    expect(JSON.stringify(written)).not.toMatch(/does|fawn|gate/);
  });

  it('keeps what it said before each change, with who had said it', async () => {
    const admin = await addMember(club, 'admin', { name: 'Cora Pike' });
    const sit = await sitAndLog(ann, oak, { does: 2 });
    await saveLog(admin.scope, logOf(sit.id, { version: 1, does: 3 }), NOON + 60_000);
    await saveLog(ann.scope, logOf(sit.id, { version: 2, does: 3, antleredBucks: 1 }), NOON + 120_000);
    const screen = await readLog(ann.scope, sit.id, NOON + DAY_MS);
    expect(screen.written).toMatchObject({ version: 3, line: { counts: '1 buck, 3 does' } });
    expect(screen.history.map(({ version, line }) => [version, line.counts])).toEqual([
      [2, '3 does'],
      [1, '2 does'],
    ]);
    expect(screen.history[0]?.savedText).toContain('Cora Pike');
    expect(screen.history[1]?.savedText).toContain('Ann Roe');
  });

  it('takes a second press as the first, and refuses a form opened before a change', async () => {
    const sit = await sitAndLog(ann, oak, { does: 2 });
    expect(await saveLog(ann.scope, logOf(sit.id, { does: 2 }), NOON + 1)).toMatchObject({ version: 1 });
    await saveLog(ann.scope, logOf(sit.id, { version: 1, does: 4 }), NOON + 2);
    const late = await refusal(saveLog(ann.scope, logOf(sit.id, { version: 1, does: 9 }), NOON + 3));
    expect(late.code).toBe('conflict');
    expect(late.message).toContain('Ann Roe saved this log');
    const kept = await reader().select().from(sitLogVersions).where(eq(sitLogVersions.sitId, sit.id));
    expect(kept).toHaveLength(1);
  });

  it('drops what belongs to a hit when there was none', async () => {
    const sit = await sitAndLog(ann, oak, {
      shot: 'hit',
      shotClock: '08:10',
      hitPlace: 'heart_lungs',
      followUp: 'recovered',
      followUpNotes: 'Forty yards.',
    });
    const shot = {
      version: 1,
      shot: 'missed',
      shotClock: '08:10',
      hitPlace: 'elsewhere',
      followUp: 'waiting',
    } as const;
    await saveLog(ann.scope, logOf(sit.id, shot), NOON);
    const [row] = await reader().select().from(sitLogs).where(eq(sitLogs.sitId, sit.id));
    expect(row).toMatchObject({ shot: 'missed', shotAt: onSaturday('08:10'), hitPlace: null, followUp: null });
  });

  it('refuses a sit to come, hours to come, a cancelled sit and strangers', async () => {
    const sit = await book(ann, oak);
    const early = await refusal(saveLog(ann.scope, logOf(sit.id), TEST_NOW));
    expect(early.message).toContain('has not begun');
    const ahead = await refusal(saveLog(ann.scope, logOf(sit.id), onSaturday('09:00')));
    expect(ahead.more.fields).toHaveProperty('endClock');
    expect((await refusal(saveLog(bert.scope, logOf(sit.id), NOON))).code).toBe('forbidden');
    const stranger = await addMember(await makeClub(), 'admin');
    expect((await refusal(saveLog(stranger.scope, logOf(sit.id), NOON))).code).toBe('not_found');
    await cancelSit(ann.scope, { sitId: sit.id, reason: '' }, TEST_NOW);
    expect((await refusal(saveLog(ann.scope, logOf(sit.id), NOON))).message).toContain('was cancelled');
    expect(await reader().select().from(sitLogs).where(eq(sitLogs.clubId, club.id))).toEqual([]);
  });

  it('lets the sponsor write for a guest, who writes none', async () => {
    const dates = { guestFrom: SATURDAY, guestTo: SATURDAY };
    const guest = await addMember(club, 'guest', { name: 'Gil Frost', sponsorId: ann.id, ...dates });
    const sit = await book(guest, oak);
    expect(guest.scope.can('log.write')).toBe(false);
    const { waiting } = await readLogScreen(ann.scope, NOON);
    expect(waiting).toMatchObject([{ sitId: sit.id, memberName: 'Gil Frost' }]);
    expect((await readLogScreen(bert.scope, NOON)).waiting).toEqual([]);
    await saveLog(ann.scope, logOf(sit.id, { does: 1 }), NOON);
    expect((await readLogScreen(ann.scope, NOON)).waiting).toEqual([]);
  });
});

describe('what others learn of a log', () => {
  const rifle = { id: 's', name: 'Rifle', weapons: ['bow' as const], fromDay: '2026-11-01', toDay: '2026-11-30' };

  async function screenOf(rules: Parameters<typeof smallClub>[0], now = NOON) {
    const made = await smallClub(rules);
    const officer = await addMember(made.club, 'steward');
    const sit = await sitAndLog(made.ann, made.oak, { antleredBucks: 1 });
    const opens = (who: TestMember) =>
      readLog(who.scope, sit.id, now).then(
        (log) => log.written?.line.counts,
        (error) => error.code,
      );
    const [line] = (await readLogScreen(officer.scope, NOON)).club ?? [];
    return { own: await opens(made.ann), member: await opens(made.bert), officer: await opens(officer), line };
  }

  it('is all under "all"', async () => {
    expect(await screenOf({ sightingsSeenBy: 'all' })).toMatchObject({
      own: '1 buck',
      member: '1 buck',
      officer: '1 buck',
      line: { logged: true, counts: '1 buck', mayOpen: true },
    });
  });

  it('is for officers alone under "officers"', async () => {
    expect(await screenOf({ sightingsSeenBy: 'officers' })).toMatchObject({
      own: '1 buck',
      member: 'not_found',
      officer: '1 buck',
      line: { counts: '1 buck' },
    });
  });

  it('is for nobody until the season is over: officers see that a log exists', async () => {
    const rules = { sightingsSeenBy: 'after_season' as const, seasons: [rifle] };
    expect(await screenOf(rules)).toMatchObject({
      own: '1 buck',
      member: 'not_found',
      officer: 'not_found',
      line: { logged: true, counts: null, mayOpen: false },
    });
    const december = Date.UTC(2026, 11, 1, 15);
    expect(await screenOf(rules, december)).toMatchObject({ own: '1 buck', member: '1 buck', officer: '1 buck' });
  });

  it('lets an officer write a missing log, and not change one that is kept from them', async () => {
    const made = await smallClub({ sightingsSeenBy: 'after_season', seasons: [rifle] });
    const officer = await addMember(made.club, 'steward');
    const sit = await book(made.ann, made.oak);
    await saveLog(officer.scope, logOf(sit.id, { does: 1 }), NOON);
    const again = await refusal(saveLog(officer.scope, logOf(sit.id, { version: 1, does: 2 }), NOON));
    expect(again.code).toBe('forbidden');
  });
});

describe('what the list of stands makes of it', () => {
  it('weighs deer bumped as pressure, and hours and deer as sightings', async () => {
    const sit = await sitAndLog(ann, oak, { does: 3, unknown: 1, bumpedIn: 2, bumpedSitting: 1 });
    const events = await loadEvents(ann.scope, NOON + DAY_MS, NOON + DAY_MS);
    expect(events).toMatchObject([{ kind: 'sit', standId: oak, at: sit.endAt, bumped: 3 }]);
    expect(await loadSightings(ann.scope, SATURDAY, NOON + DAY_MS)).toEqual([
      { standId: oak, sits: 1, hours: 3.5, deer: 4 },
    ]);
  });
});

describe('the reminder', () => {
  const reminders = () =>
    reader()
      .select()
      .from(outbox)
      .where(eq(outbox.kind, 'log.missing'))
      .then((rows) => rows.filter((row) => row.clubId === club.id));

  it('comes once, by day, for a sit without a log', async () => {
    const pool = await addStand(club, { name: 'Pool' });
    await sitAndLog(bert, pool, {});
    const sit = await book(ann, oak);
    await remindLogs(onSaturday('20:00'));
    expect(await reminders()).toEqual([]);
    const atNight = onSaturday('23:59') + 4 * 3_600_000;
    await remindLogs(atNight);
    expect(await reminders()).toEqual([]);
    const morning = onSaturday('09:00') + DAY_MS;
    await Promise.all([remindLogs(morning), remindLogs(morning)]);
    await remindLogs(morning + DAY_MS);
    const mails = await reminders();
    expect(mails).toHaveLength(1);
    expect(mails[0]).toMatchObject({ toEmail: ann.email, dedupeKey: `log.missing:${sit.id}` });
    expect(mails[0]?.message?.text).toContain(`/clubs/${club.slug}/log/${sit.id}`);
  });

  it("goes to the sponsor for a guest's sit, and not at all after a week", async () => {
    const dates = { guestFrom: SATURDAY, guestTo: SATURDAY };
    const guest = await addMember(club, 'guest', { name: 'Gil Frost', sponsorId: ann.id, ...dates });
    await book(guest, oak);
    await remindLogs(onSaturday('09:00') + 9 * DAY_MS);
    expect(await reminders()).toEqual([]);
    await remindLogs(onSaturday('09:00') + 2 * DAY_MS);
    const mails = await reminders();
    expect(mails.map((mail) => mail.toEmail)).toEqual([ann.email]);
    expect(mails[0]?.message?.text).toContain('your guest Gil Frost');
  });
});
