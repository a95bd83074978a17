import { and, eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { GET as exportRoute } from '@/app/api/clubs/[club]/audit/route';
import MembersPage from '@/app/clubs/[club]/club/members/page';
import { savePlaceAction } from '@/app/clubs/[club]/club/place/actions';
import { saveRulesAction } from '@/app/clubs/[club]/club/rules/edit/actions';
import RulesPage from '@/app/clubs/[club]/club/rules/page';
import { createClubAction } from '@/app/clubs/new/actions';
import { type ClubRules, DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import type { Role } from '@/core/permissions';
import { reader, write } from '@/db/client';
import { auditLog, clubs, users } from '@/db/schema';
import { auditFilterSchema } from '@/features/clubs/audit-schema';
import { readAudit } from '@/features/clubs/read-audit';
import { rulesToForm } from '@/features/clubs/rules-form';
import { audit } from '@/server/audit';
import { setClock } from '@/server/clock';
import { findScope } from '@/server/scope';
import { addMember, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest, newBrowser } from '../helpers/request';

let at = TEST_NOW;
let club: TestClub;
let admin: TestMember;
let count = 0;

beforeEach(async () => {
  at = TEST_NOW;
  setClock(() => at);
  club = await makeClub();
  admin = await addMember(club, 'admin', { name: 'Ada Lund' });
});

const auditOf = (action: string, clubId = club.id) =>
  reader()
    .select()
    .from(auditLog)
    .where(and(eq(auditLog.clubId, clubId), eq(auditLog.action, action)));
const clubRow = async () => (await reader().select().from(clubs).where(eq(clubs.id, club.id)))[0];

describe('starting a club', () => {
  const form = (slug: string) => ({
    name: 'Spring Hollow',
    slug,
    lat: '34.117',
    lon: '-84.000',
    zone: 'America/New_York',
    units: 'us' as const,
  });
  const start = (slug: string) => inRequest(admin.browser, () => createClubAction(form(slug)));

  it('makes its founder the first admin, with the default rules and an audit row', async () => {
    const slug = `hollow-${++count}`;
    expect(await start(slug)).toEqual({ ok: true, data: { slug } });
    const scope = await findScope(slug, admin.userId);
    expect(scope?.member.role).toBe('admin');
    expect(scope?.club).toMatchObject({ lat: 34.117, lon: -84, rules: DEFAULT_CLUB_RULES, version: 1 });
    expect(await auditOf('club.created', scope?.club.id)).toHaveLength(1);
  });

  it('refuses an address in use beside its field, also when two come at once', async () => {
    const slug = `hollow-${++count}`;
    const answers = await Promise.all([start(slug), start(slug)]);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(answers.find((answer) => !answer.ok)).toMatchObject({
      error: { code: 'conflict', fields: { slug: expect.any(String) } },
    });
  });

  it('wants a confirmed e-mail address and a signed-in account', async () => {
    expect(await inRequest(newBrowser(), () => createClubAction(form('nobody-club')))).toMatchObject({
      error: { code: 'signed_out' },
    });
    await write((tx) => tx.update(users).set({ emailVerifiedAt: null }).where(eq(users.id, admin.userId)));
    expect(await start('unconfirmed-club')).toMatchObject({ error: { code: 'forbidden' } });
  });
});

describe('the rules', () => {
  const form = (change: Partial<ClubRules>, version = 1) =>
    rulesToForm({ ...DEFAULT_CLUB_RULES, ...change }, 'us', version);
  const save = (who: TestMember, change: Partial<ClubRules>, version = 1) =>
    inRequest(who.browser, () => saveRulesAction(club.slug, form(change, version)));

  it('are saved with a row that says what was and what is', async () => {
    const answer = await save(admin, { restDaysDefault: 5, walkUpSits: false });
    expect(answer).toEqual({ ok: true, data: { changed: ['Walk-up', 'Rest of a stand'] } });
    expect(await clubRow()).toMatchObject({ version: 2, rules: { restDaysDefault: 5, walkUpSits: false } });
    const [row] = await auditOf('club.rules_changed');
    expect(row?.summary).toBe('Ada Lund changed the rules: Walk-up, Rest of a stand.');
    expect(row?.detail).toMatchObject({
      changed: [
        { label: 'Walk-up' },
        {
          label: 'Rest of a stand',
          before: expect.stringContaining('3 full days'),
          after: expect.stringContaining('5 full days'),
        },
      ],
    });
  });

  it('are not overwritten by a second admin who saw them before: the first is named', async () => {
    const second = await addMember(club, 'admin', { name: 'Bo Dahl' });
    await save(admin, { restDaysDefault: 5 });
    const answer = await save(second, { restDaysDefault: 1 });
    expect(answer).toMatchObject({
      ok: false,
      error: { code: 'conflict', message: expect.stringContaining('Ada Lund') },
    });
    expect((await clubRow())?.rules.restDaysDefault).toBe(5);
    expect(await save(second, { restDaysDefault: 1 }, 2)).toMatchObject({ ok: true });
  });

  it('stay as they are when two save at the same moment: one of them', async () => {
    const second = await addMember(club, 'admin');
    const answers = await Promise.all([save(admin, { restDaysDefault: 5 }), save(second, { restDaysDefault: 7 })]);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(await auditOf('club.rules_changed')).toHaveLength(1);
  });

  it('write nothing when nothing differs', async () => {
    expect(await save(admin, {})).toEqual({ ok: true, data: { changed: [] } });
    expect((await clubRow())?.version).toBe(1);
    expect(await auditOf('club.rules_changed')).toEqual([]);
  });

  it('say beside the field what is wrong, and save nothing of it', async () => {
    const bad = {
      ...form({}),
      restDays: 'many',
      seasons: [{ id: 'a', name: '', weapons: [], fromDay: '', toDay: '', legalLightName: '' }],
    };
    const answer = await inRequest(admin.browser, () => saveRulesAction(club.slug, bad));
    expect(answer).toMatchObject({ ok: false, error: { code: 'invalid' } });
    const fields = answer.ok ? {} : answer.error.fields;
    expect(fields).toHaveProperty('restDays');
    expect(fields).toHaveProperty(['seasons.0.name']);
    expect((await clubRow())?.version).toBe(1);
  });

  it('are changed by admins only, and seen by everyone in the club', async () => {
    for (const role of ['steward', 'member', 'guest', 'landowner'] as Role[]) {
      const who = await addMember(
        club,
        role,
        role === 'guest' ? { sponsorId: admin.id, guestFrom: '2026-11-01', guestTo: '2026-11-30' } : {},
      );
      expect(await save(who, { restDaysDefault: 0 })).toMatchObject({ error: { code: 'forbidden' } });
      const page = inRequest(who.browser, () => RulesPage(asked(club.slug)));
      expect(await page).toBeTruthy();
    }
  });

  it('share their version with the place, which is on record in words', async () => {
    const place = {
      name: 'Club',
      lat: '35',
      lon: '-84',
      zone: 'America/New_York',
      units: 'metric' as const,
      version: 1,
    };
    const answer = await inRequest(admin.browser, () => savePlaceAction(club.slug, place));
    expect(answer).toMatchObject({ ok: true, data: { changed: ['Name', 'Place', 'Units'] } });
    expect(await save(admin, { restDaysDefault: 5 })).toMatchObject({ error: { code: 'conflict' } });
    const [row] = await auditOf('club.place_changed');
    expect(JSON.stringify(row?.detail)).toContain('35.00000° N, 84.00000° W');
  });
});

const asked = (slug: string, search: Record<string, string> = {}) => ({
  params: Promise.resolve({ club: slug }),
  searchParams: Promise.resolve(search),
});

describe('the audit log', () => {
  async function write3() {
    const rows = [
      { name: 'Ada Lund', userId: admin.userId, action: 'stand.added', summary: 'Added 100% Oak_Ladder.', day: 1 },
      {
        name: '=cmd()',
        userId: 'usr_evil',
        action: 'sit.booked',
        summary: '=HYPERLINK("http://x.test","a,b")',
        day: 2,
      },
      { name: 'Windrest', userId: null, action: 'sit.lapsed', summary: 'A sit lapsed,\nnobody signed in.', day: 3 },
    ];
    await write(async (tx) => {
      for (const { name, userId, action, summary, day } of rows) {
        const entry = {
          clubId: club.id,
          actor: { userId, name },
          action,
          subjectType: 'x',
          subjectId: `x${day}`,
          summary,
        };
        await audit(tx, entry, Date.UTC(2026, 9, day, 5));
      }
    });
  }
  const find = async (query: Record<string, string>) =>
    (await readAudit(admin.scope, auditFilterSchema.parse(query), 1)).lines.map((line) => line.summary.slice(0, 9));

  beforeEach(write3);

  it('filters by person, action, words and club days', async () => {
    expect(await find({})).toEqual(['A sit lap', '=HYPERLIN', 'Added 100']);
    expect(await find({ person: admin.userId })).toEqual(['Added 100']);
    expect(await find({ person: 'windrest' })).toEqual(['A sit lap']);
    expect(await find({ action: 'sit.booked' })).toEqual(['=HYPERLIN']);
    expect(await find({ text: 'OAK_l' })).toEqual(['Added 100']);
    expect(await find({ text: '100%' })).toEqual(['Added 100']);
    expect(await find({ text: 'x_' })).toEqual([]);
    // 05:00 UTC on 2 October is 01:00 of that day in New York; 03:59 UTC would be the day before.
    expect(await find({ from: '2026-10-02', to: '2026-10-02' })).toEqual(['=HYPERLIN']);
    expect(await find({ to: '2026-10-01' })).toEqual(['Added 100']);
  });

  it('is paged, and shows rows of its own club only', async () => {
    await write(async (tx) => {
      for (let i = 0; i < 60; i++) {
        const entry = {
          clubId: club.id,
          actor: admin.scope.actor,
          action: 'x.y',
          subjectType: 'x',
          subjectId: 'x',
          summary: `Row ${i}.`,
        };
        await audit(tx, entry, TEST_NOW + i);
      }
    });
    const filter = auditFilterSchema.parse({ action: 'x.y' });
    const first = await readAudit(admin.scope, filter, 1);
    expect([first.total, first.pages, first.lines.length, first.lines[0]?.summary]).toEqual([60, 2, 50, 'Row 59.']);
    expect((await readAudit(admin.scope, filter, 99)).lines.at(-1)?.summary).toBe('Row 0.');
    const other = await addMember(await makeClub(), 'admin');
    expect((await readAudit(other.scope, auditFilterSchema.parse({}), 1)).total).toBe(0);
  });

  const take = (who: TestMember, search = '') =>
    inRequest(who.browser, () =>
      exportRoute(new Request(`http://here.test/api/clubs/${club.slug}/audit${search}`), {
        params: Promise.resolve({ club: club.slug }),
      }),
    );

  it('is taken out as a file in which no cell is a formula, and that is on record', async () => {
    const response = await take(admin, '?to=2026-10-31');
    expect(response.status).toBe(200);
    expect(response.headers.get('content-type')).toContain('text/csv');
    expect(response.headers.get('content-disposition')).toContain(`audit-${club.slug}-2026-11-04.csv`);
    const csv = await response.text();
    expect(csv).toContain(`"'=HYPERLINK(""http://x.test"",""a,b"")"`);
    expect(csv).toContain(`"'=cmd()"`);
    expect(csv).toContain('"A sit lapsed,\nnobody signed in."');
    expect(csv).not.toMatch(/(^|,|\r\n)"?=/);
    const [row] = await auditOf('audit.exported');
    expect(row?.summary).toBe('Ada Lund took 3 rows of the audit log out as a file.');
  });

  it('is open to admins of the club only', async () => {
    const steward = await addMember(club, 'steward');
    const other = await addMember(await makeClub(), 'admin');
    expect((await take(steward)).status).toBe(403);
    expect((await take(other)).status).toBe(404);
    expect((await take(admin, '?from=yesterday')).status).toBe(400);
    expect(await auditOf('audit.exported')).toEqual([]);
  });
});

describe('pages of a club', () => {
  it('answer a stranger, a missing club and a closed page with the same 404', async () => {
    const stranger = await addMember(await makeClub(), 'admin');
    const member = await addMember(club, 'member');
    const digest = (who: TestMember, slug: string) =>
      inRequest(who.browser, () => MembersPage(asked(slug))).then(
        () => 'open',
        (error: unknown) => String(error instanceof Error && 'digest' in error ? error.digest : error),
      );
    const closed = [
      await digest(stranger, club.slug),
      await digest(stranger, 'no-such-club'),
      await digest(member, club.slug),
    ];
    expect(new Set(closed).size).toBe(1);
    expect(closed[0]).toContain('404');
    expect(await digest(admin, club.slug)).toBe('open');
  });
});
