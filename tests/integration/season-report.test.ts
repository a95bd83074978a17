import { and, eq, sql } from 'drizzle-orm';
import Papa from 'papaparse';
import { beforeAll, describe, expect, it } from 'vitest';
import { GET } from '@/app/api/clubs/[club]/report/route';
import type { ClubRules } from '@/core/booking/rules';
import { gini } from '@/core/draw/fairness';
import { reader, write } from '@/db/client';
import * as schema from '@/db/schema';
import { readReport } from '@/features/report/reads';
import { type ReportAsk, readReportAsk } from '@/features/report/report-schema';
import { newId } from '@/lib/ids';
import { setClock } from '@/server/clock';
import { type ClubScope, findScope } from '@/server/scope';
import { SATURDAY, smallClub } from '../helpers/book';
import { DEMO_NOW, type DemoVisitors, openDemo, VISITORS, type Visitor } from '../helpers/demo-visitors';
import { onSaturday, sitAndLog } from '../helpers/log-sits';
import { addMember, addStand, makeClub, TEST_NOW, type TestMember } from '../helpers/make-club';
import { inRequest, type TestRequest } from '../helpers/request';

const DAY_MS = 86_400_000;
const NOON = onSaturday('12:00');
const WHOLE = readReportAsk({});

/** Rows of a file, as a spreadsheet reads it. */
async function fileOf(browser: TestRequest, club: string, query: string) {
  const response = await inRequest(browser, () =>
    GET(new Request(`http://127.0.0.1/report?${query}`), { params: Promise.resolve({ club }) }),
  );
  const text = (await response.text()).replace(/^\ufeff/, '');
  return { status: response.status, text, rows: Papa.parse<string[]>(text, { skipEmptyLines: true }).data };
}

interface PastSit {
  day: string;
  windows?: 'morning' | 'evening' | 'all_day';
  score?: number;
  windFromDeg?: number;
  /** Deer bumped and seen; left out: no log. */
  log?: { bumped?: number; does?: number };
  bookedBy?: string;
}

/** A sit of the past as a club may have on record, whatever today's rules say of it. */
async function addPast(who: TestMember, standId: string, past: PastSit): Promise<string> {
  const id = newId('sit');
  const { id: clubId } = who.scope.club;
  const startAt = Date.parse(`${past.day}T12:00:00Z`);
  const endAt = startAt + 4 * 3_600_000;
  await write(async (tx) => {
    await tx.insert(schema.sits).values({
      id,
      clubId,
      standId,
      memberId: who.id,
      day: past.day,
      windows: past.windows ?? 'morning',
      startAt,
      endAt,
      weapon: 'bow',
      guests: [],
      status: 'booked',
      requestKey: id,
      bookedBy: past.bookedBy ?? who.id,
      createdAt: startAt - DAY_MS,
      updatedAt: startAt - DAY_MS,
    });
    if (past.score !== undefined) {
      const { score, windFromDeg = null } = past;
      await tx
        .insert(schema.sitPredictions)
        .values({ sitId: id, clubId, standId, quiet: 60, score, windFromDeg, at: startAt });
    }
    if (!past.log) return;
    const { bumped = 0, does = 0 } = past.log;
    await tx.insert(schema.sitLogs).values({
      sitId: id,
      clubId,
      startAt,
      endAt,
      antleredBucks: 0,
      does,
      fawns: 0,
      unknown: 0,
      bumpedIn: bumped,
      bumpedSitting: 0,
      bumpedOut: 0,
      createdAt: endAt,
    });
  });
  return id;
}

describe('the report of the demo club', () => {
  let demo: DemoVisitors;
  let scope: ClubScope;
  beforeAll(async () => {
    demo = await openDemo();
    scope = await scopeOf('admin');
  });

  async function scopeOf(visitor: Visitor): Promise<ClubScope> {
    const [user] = await reader()
      .select()
      .from(schema.users)
      .where(eq(schema.users.email, `${VISITORS[visitor]}@example.org`));
    const found = await findScope(demo.slug, user?.id ?? '');
    if (!found) throw new Error(`${visitor} is not let in.`);
    return found;
  }

  /** Counted by the database alone. */
  async function count(select: string): Promise<number> {
    const rows = await reader().all<{ n: number }>(sql.raw(select));
    return Number(rows[0]?.n ?? Number.NaN);
  }
  const endedSits = () =>
    `from sits left join sit_logs l on l.sit_id = sits.id where sits.club_id = '${scope.club.id}' and status = 'booked'
     and sits.end_at <= ${DEMO_NOW} and day between '2026-07-01' and '2027-06-30'`;

  it('counts what the database counts', async () => {
    const report = await readReport(scope, WHOLE, DEMO_NOW);
    expect(report.period).toMatchObject({ season: '2026', label: '2026-27' });
    expect(report.sits).toBeGreaterThan(80);
    expect(report.sits).toBe(await count(`select count(*) n ${endedSits()}`));
    const { use, bumps, deer, members } = report;
    expect(use.rows.reduce((sum, row) => sum + row.sits, 0)).toBe(report.sits);
    expect(use.rows.reduce((sum, row) => sum + row.byWeek.reduce((a, b) => a + b, 0), 0)).toBe(report.sits);
    const windows = use.rows.reduce((sum, row) => sum + row.mornings + row.evenings, 0);
    expect(windows).toBe(await count(`select sum(case windows when 'all_day' then 2 else 1 end) n ${endedSits()}`));
    for (const row of use.rows) {
      expect(row.sits, row.name).toBe(
        await count(`select count(*) n ${endedSits()} and sits.stand_id = '${row.standId}'`),
      );
    }
    const logged = `${endedSits()} and l.sit_id is not null`;
    expect(bumps.all.sits).toBe(await count(`select count(*) n ${logged}`));
    expect(bumps.all.bumped).toBe(
      await count(`select count(*) n ${logged} and l.bumped_in + l.bumped_sitting + l.bumped_out > 0`),
    );
    expect(bumps.winds.reduce((sum, { count: one }) => sum + one.sits, 0) + bumps.noWind).toBe(bumps.all.sits);
    expect(bumps.inArc.sits + bumps.outOfArc.sits + bumps.noWind).toBe(bumps.all.sits);
    expect(deer.total.seen.all).toBe(
      await count(`select sum(l.antlered_bucks + l.does + l.fawns + l.unknown) n ${logged}`),
    );
    expect(deer.total.hours).toBeCloseTo(await count(`select sum(l.end_at - l.start_at) / 3600000.0 n ${logged}`), 6);
    expect(report.unproven).toBe(
      await count(
        `select count(*) n ${endedSits()} and l.sit_id is null and sits.id not in (select sit_id from outings)`,
      ),
    );
    expect(members.rows.reduce((sum, row) => sum + row.sits, 0)).toBe(report.sits);
    expect(members.by).toBe('score');
    const perMember = members.rows.map(({ good }) => good);
    expect(perMember.reduce((a, b) => a + b, 0)).toBe(members.good);
    expect(members.ofGood).toBeCloseTo(gini(perMember) ?? Number.NaN, 12);
  });

  it('finds every rest kept, as the club’s own rules held each booking to it', async () => {
    const { rests } = await readReport(scope, WHOLE, DEMO_NOW);
    expect(rests.times).toBeGreaterThan(20);
    expect(rests.broken).toEqual([]);
    expect(rests.kept).toBe(rests.times);
    for (const row of rests.rows)
      if (row.least !== null) expect(row.least, row.name).toBeGreaterThanOrEqual(row.restDays);
  });

  it('counts deer and work as their own screens do', async () => {
    const { harvest, hours } = await readReport(scope, WHOLE, DEMO_NOW);
    const days = "between '2026-07-01' and '2027-06-30'";
    const club = `club_id = '${scope.club.id}'`;
    const taken = `from harvests where ${club} and removed_at is null and day ${days}`;
    expect(harvest?.antlered).toBe(await count(`select count(*) n ${taken} and antlered`));
    expect(harvest?.antlerless).toBe(await count(`select count(*) n ${taken} and not antlered`));
    const club6 = harvest?.quotas.find(({ quota }) => quota.per === 'club');
    expect(club6?.taken).toBe(harvest?.antlerless);
    expect(hours?.forChores).toBe(
      await count(`select sum(hours) n from chores where ${club} and removed_at is null and done_on ${days}`),
    );
    expect(hours?.onDays).toBe(
      await count(
        `select sum(m.hours) n from work_day_members m join work_days d on d.id = m.work_day_id
         where m.${club} and d.cancelled_at is null and d.day ${days}`,
      ),
    );
    expect(hours?.total).toBeGreaterThan(0);
  });

  it('is of one season, or of some days, when asked', async () => {
    const archery = await readReport(scope, readReportAsk({ season: 'archery' }), DEMO_NOW);
    expect(archery.period.label).toContain('Archery');
    const [from, to] = ['2026-10-05', '2026-10-11'];
    const week = await readReport(scope, readReportAsk({ season: 'archery', from, to }), DEMO_NOW);
    expect(week.sits).toBe(await count(`select count(*) n ${endedSits()} and day between '${from}' and '${to}'`));
    expect(week.use.weeks).toEqual([{ fromDay: from, toDay: to }]);
    const turned = await readReport(scope, readReportAsk({ from: to, to: from }), DEMO_NOW);
    expect(turned.period.problem).toContain('Turn them round');
    expect(turned.period.fromDay).toBe('2026-07-01');
    const long = await readReport(scope, readReportAsk({ from: '2020-01-01' }), DEMO_NOW);
    expect(long.period).toMatchObject({ fromDay: '2020-01-01', toDay: '2021-02-03' });
    expect((await readReport(scope, readReportAsk({ season: '2011' }), DEMO_NOW)).sits).toBe(0);
    expect(readReportAsk({ season: '', from: '', to: '2026-02-30' })).toEqual(WHOLE);
  });

  it('shows officers every member, a member the own line alone, and the same figure to both', async () => {
    const officer = await readReport(await scopeOf('steward'), WHOLE, DEMO_NOW);
    const memberScope = await scopeOf('member');
    const member = await readReport(memberScope, WHOLE, DEMO_NOW);
    expect(officer.members.rows.length).toBeGreaterThan(5);
    expect(member.members.rows.map(({ name }) => name)).toEqual([memberScope.member.name]);
    expect(member.members.ofGood).toBe(officer.members.ofGood);
    const csv = (visitor: Visitor) => fileOf(demo.browsers[visitor], demo.slug, 'part=members');
    expect((await csv('member')).rows).toHaveLength(2);
    expect((await csv('steward')).rows).toHaveLength(officer.members.rows.length + 1);
  });

  it('is closed to guests, landowners and other clubs', async () => {
    const status = async (visitor: Visitor) => (await fileOf(demo.browsers[visitor], demo.slug, 'part=use')).status;
    expect(await status('guest')).toBe(403);
    expect(await status('landowner')).toBe(403);
    for (const visitor of ['removed member', 'admin of another club', 'stranger'] as const) {
      expect(await status(visitor), visitor).toBe(404);
    }
    expect(await status('signed out')).toBe(401);
  });

  it('leaves as files that say what the page says, each on record', async () => {
    const report = await readReport(scope, WHOLE, DEMO_NOW);
    const file = async (part: string) => {
      const { status, rows } = await fileOf(demo.browsers.admin, demo.slug, `part=${part}`);
      expect(status, part).toBe(200);
      for (const row of rows) expect(row.length, part).toBe(rows[0]?.length);
      return rows;
    };
    const use = await file('use');
    expect(use.slice(1).map(([name, sits]) => [name, Number(sits)])).toEqual(
      report.use.rows.map(({ name, sits }) => [name, sits]),
    );
    expect((await file('pressure')).length).toBe(report.use.rows.length * report.use.days.length + 1);
    expect((await file('rests')).length).toBe(report.rests.rows.length + 1);
    expect((await file('unused')).length).toBe(report.unused.length + 1);
    expect((await file('harvest')).length).toBe((report.harvest?.quotas.length ?? 0) + 1);
    expect((await file('hours')).length).toBe((report.hours?.rows.length ?? 0) + 1);
    const bumps = await file('bumps');
    expect(bumps[1]?.slice(3, 6).map(Number)).toEqual([
      report.bumps.all.sits,
      report.bumps.all.bumped,
      report.bumps.all.sits - report.bumps.all.bumped,
    ]);
    const deer = await file('deer');
    expect(Number(deer[1]?.[5])).toBe(report.deer.total.seen.all);
    expect((await fileOf(demo.browsers.admin, demo.slug, 'part=nothing')).status).toBe(400);
    const taken = await reader()
      .select()
      .from(schema.auditLog)
      .where(and(eq(schema.auditLog.clubId, scope.club.id), eq(schema.auditLog.action, 'report.exported')));
    expect(taken.map(({ detail }) => detail.part)).toContain('pressure');
  });
});

describe('a small club’s report', () => {
  const ask = (more: Partial<ReportAsk> = {}): ReportAsk => ({ ...WHOLE, ...more });

  it('of a new club has nothing to say and does not fall over', async () => {
    const made = await makeClub();
    const admin = await addMember(made, 'admin');
    const empty = await readReport(admin.scope, WHOLE, TEST_NOW);
    expect(empty).toMatchObject({ sits: 0, use: { weeks: [], days: [], rows: [] }, rests: { times: 0 } });
    expect(empty.members).toMatchObject({ rows: [], ofGood: null, ofSits: null, luck: null });
    for (const part of ['use', 'rests', 'members', 'bumps', 'deer', 'hours']) {
      expect((await fileOf(admin.browser, made.slug, `part=${part}`)).status, part).toBe(200);
    }
  });

  it('looks back to the last season until the new one has a sit', async () => {
    const { ann, oak } = await smallClub();
    await addPast(ann, oak, { day: '2025-11-08' });
    expect((await readReport(ann.scope, WHOLE, TEST_NOW)).period.label).toBe('2025-26');
    await addPast(ann, oak, { day: '2026-10-08' });
    const report = await readReport(ann.scope, WHOLE, TEST_NOW);
    expect(report.period.label).toBe('2026-27');
    expect(report.choices.map(({ label }) => label)).toEqual(['2026-27', '2025-26']);
  });

  it('tells of rests broken, to officers with who it was and how it was booked', async () => {
    const { ann, bert, oak, club } = await smallClub();
    const officer = await addMember(club, 'admin');
    // Before the period asked for: the first day in it is held against that.
    await addPast(ann, oak, { day: '2026-10-01' });
    await addPast(bert, oak, { day: '2026-10-03', bookedBy: officer.id });
    await addPast(ann, oak, { day: '2026-10-07', windows: 'evening' });
    const days = ask({ from: '2026-10-02' });
    const { rests } = await readReport(officer.scope, days, NOON);
    expect(rests.rows).toMatchObject([{ name: 'Oak Ladder', restDays: 3, times: 2, kept: 1, least: 1 }]);
    expect(rests.broken).toMatchObject([
      { day: '2026-10-03', after: '2026-10-01', rested: 1, who: 'Bert Hale', how: ['by_another'] },
    ]);
    const seen = await readReport(ann.scope, days, NOON);
    expect(seen.rests.broken).toMatchObject([{ day: '2026-10-03', who: null, how: null }]);
  });

  it('names stands nobody sat, and those sat in one window only', async () => {
    const { ann, oak, club } = await smallClub();
    await addStand(club, { name: 'Never', createdAt: TEST_NOW - 400 * DAY_MS });
    const only = await addStand(club, { name: 'Mornings alone', evening: 'avoid' });
    const both = await addStand(club, { name: 'Both' });
    await write((tx) =>
      tx.insert(schema.closures).values({
        id: newId('closure'),
        clubId: club.id,
        standId: oak,
        fromDay: '2026-10-10',
        toDay: '2026-10-12',
        reason: 'Loose bolt',
        byMemberId: ann.id,
        createdAt: TEST_NOW,
      }),
    );
    for (const standId of [oak, only]) await addPast(ann, standId, { day: '2026-10-03' });
    await addPast(ann, both, { day: '2026-10-03', windows: 'all_day' });
    const { unused } = await readReport(ann.scope, WHOLE, TEST_NOW);
    expect(unused.map(({ name, what, closedDays, lastDay }) => [name, what, closedDays, lastDay])).toEqual([
      ['Never', 'never', 0, null],
      ['Oak Ladder', 'mornings_only', 3, '2026-10-03'],
    ]);
    expect(unused.map(({ drawnOn }) => drawnOn)).toEqual([null, '2026-11-04']);
  });

  it('counts a guest’s sit on the member who answers for them, and good sits by their kept score', async () => {
    const { ann, bert, oak, club } = await smallClub();
    const officer = await addMember(club, 'admin', { name: 'Cal Reed' });
    const guest = await addMember(club, 'guest', { name: 'Gil Ash', sponsorId: bert.id });
    // Twelve scores, 1 to 12: the better third are Bert's four, two of them sat by his guest.
    for (let n = 1; n <= 12; n++) {
      const who = n <= 8 ? ann : n <= 10 ? bert : guest;
      await addPast(who, oak, { day: `2026-10-${String(2 * n).padStart(2, '0')}`, score: n });
    }
    const { members } = await readReport(officer.scope, WHOLE, TEST_NOW);
    expect(members).toMatchObject({ by: 'score', atLeast: 9, good: 4, judged: 12, sat: 2, neverSat: 1 });
    // One member has all four in 71 of 495 deals, mostly Ann who sat more: the Gini of two cannot tell that from luck.
    expect(members.luck).toMatchObject({ as: 'by_lot', high: 0.5 });
    expect(members.rows.map(({ name, sits, good }) => [name, sits, good])).toEqual([
      ['Bert Hale', 4, 4],
      ['Ann Roe', 8, 0],
    ]);
    // By hand: 0 and 4 give 1/2, 4 and 8 give 1/6.
    expect(members.ofGood).toBeCloseTo(1 / 2, 12);
    expect(members.ofSits).toBeCloseTo(1 / 6, 12);
  });

  it('keeps others’ logs as the club’s rule says: bumps, deer and the bumps in pressure', async () => {
    const seen = async (sightingsSeenBy: ClubRules['sightingsSeenBy']) => {
      const { ann, bert, oak, club } = await smallClub({ sightingsSeenBy });
      const pool = await addStand(club, { name: 'Pool' });
      const officer = await addMember(club, 'steward');
      await sitAndLog(ann, oak, { does: 1 });
      await sitAndLog(bert, pool, { does: 5, bumpedIn: 3 });
      const at = NOON + DAY_MS;
      const report = async (who: TestMember) => {
        const { kept, bumps, deer, use } = await readReport(who.scope, WHOLE, at);
        const peak = use.rows.find(({ name }) => name === 'Pool')?.peakPressure ?? 0;
        return { kept, bumped: bumps.all.bumped, deer: deer.total.seen.all, unlogged: deer.unlogged, felt: peak > 1 };
      };
      const file = await fileOf(ann.browser, club.slug, 'part=deer');
      return { member: await report(ann), officer: await report(officer), inFile: file.text.includes('Pool') };
    };
    setClock(() => NOON + DAY_MS);
    const all = { kept: false, bumped: 1, deer: 6, unlogged: 0, felt: true };
    expect(await seen('all')).toEqual({ member: all, officer: all, inFile: true });
    const own = { kept: true, bumped: 0, deer: 1, unlogged: 0, felt: false };
    expect(await seen('officers')).toEqual({ member: own, officer: all, inFile: false });
    const none = { ...own, deer: 0 };
    expect(await seen('after_season')).toEqual({ member: own, officer: none, inFile: false });
  });

  it('sorts bumps by the wind kept with each sit, inside the stand’s arcs and outside', async () => {
    const { ann, oak } = await smallClub();
    // The stand is good from west to north.
    await addPast(ann, oak, { day: '2026-10-03', score: 50, windFromDeg: 300, log: {} });
    await addPast(ann, oak, { day: '2026-10-10', score: 50, windFromDeg: 310, log: { bumped: 1 } });
    await addPast(ann, oak, { day: '2026-10-17', score: 50, windFromDeg: 90, log: { bumped: 2 } });
    await addPast(ann, oak, { day: '2026-10-24', log: {} });
    await addPast(ann, oak, { day: '2026-10-31' });
    const { bumps } = await readReport(ann.scope, WHOLE, TEST_NOW);
    expect(bumps.winds.map(({ wind, count }) => [wind, count.bumped, count.sits])).toEqual([
      ['E', 1, 1],
      ['NW', 1, 2],
    ]);
    expect([bumps.inArc, bumps.outOfArc].map(({ bumped, sits }) => [bumped, sits])).toEqual([
      [1, 2],
      [1, 1],
    ]);
    expect(bumps).toMatchObject({ noWind: 1, all: { sits: 4, bumped: 2 } });
  });

  it('lets no name run as a formula', async () => {
    const { ann, club } = await smallClub();
    const odd = await addStand(club, { name: '=1+1' });
    await addPast(ann, odd, { day: SATURDAY });
    setClock(() => NOON + DAY_MS);
    const { rows } = await fileOf(ann.browser, club.slug, 'part=use');
    expect(rows[1]?.[0]).toBe("'=1+1");
  });
});
