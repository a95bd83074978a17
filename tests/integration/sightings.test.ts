import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { figureText } from '@/core/indices';
import { reader } from '@/db/client';
import { auditLog, visits } from '@/db/schema';
import { formClubOf } from '@/features/ground/form-club';
import { addVisit } from '@/features/logs/add-visit';
import { exportSightings } from '@/features/logs/export-sightings';
import { readLogScreen } from '@/features/logs/reads';
import { removeVisit } from '@/features/logs/remove-visit';
import { readSightings } from '@/features/logs/sightings-reads';
import { emptyVisitForm, makeVisitSchema, type VisitForm } from '@/features/logs/visit-schema';
import { loadEvents } from '@/features/sits/load-scoring';
import { addFeature } from '../helpers/add-ground';
import { book, refusal, SATURDAY, smallClub } from '../helpers/book';
import { onSaturday, sitAndLog } from '../helpers/log-sits';
import { addMember, addStand, makeClub, TEST_PLACE, type TestClub, type TestMember } from '../helpers/make-club';

const NOON = onSaturday('12:00');
const DAY_MS = 86_400_000;
const club = { whose: 'club' as const };

describe("a season's sightings", () => {
  it('are counted by stand, window and month, with sits that saw nothing', async () => {
    const { ann, bert, oak, club: made } = await smallClub();
    const pool = await addStand(made, { name: 'Pool' });
    await addStand(made, { name: 'Never sat' });
    await sitAndLog(ann, oak, { antleredBucks: 1, does: 3, fawns: 2, bumpedIn: 1 });
    await sitAndLog(bert, pool);
    await book(ann, oak, { day: '2026-11-14' });
    const view = await readSightings(ann.scope, club, NOON + 14 * DAY_MS);
    expect(view).toMatchObject({ kept: false, whose: 'club', unlogged: 1 });
    expect(view.year.label).toBe('2026-27');
    expect(view.total).toMatchObject({ sits: 2, zeroSits: 1, hours: 7, bumpedSits: 1 });
    expect(figureText(view.total.perHour.all)).toBe('0.86');
    expect(view.byStand.map(({ label, indices }) => [label, figureText(indices.perHour.all)])).toEqual([
      ['Oak Ladder', '1.71'],
      ['Pool', '0.00'],
    ]);
    expect(figureText(view.byStand[1]?.indices.doesPerBuck ?? view.total.doesPerBuck)).toBe('no bucks seen');
    expect(view.byWindow.map(({ label }) => label)).toEqual(['morning']);
    expect(view.byMonth.map(({ label }) => label)).toEqual(['Nov 2026']);
    const before = await readSightings(ann.scope, { ...club, year: 2025 }, NOON);
    expect(before.total.sits).toBe(0);
    expect(figureText(before.total.perHour.all)).toBe('no hours sat');
  });

  it('are one’s own where the club keeps them, in tables and files alike', async () => {
    for (const [rule, officerSees] of [
      ['all', 2],
      ['officers', 2],
      ['after_season', 0],
    ] as const) {
      const { ann, bert, oak, club: made } = await smallClub({ sightingsSeenBy: rule });
      const pool = await addStand(made, { name: 'Pool' });
      const officer = await addMember(made, 'admin');
      await sitAndLog(ann, oak, { does: 1, notes: 'Mine.' });
      await sitAndLog(bert, pool, { antleredBucks: 1, notes: 'The big one.' });
      const seen = await readSightings(ann.scope, club, NOON);
      expect(seen.total.sits, rule).toBe(rule === 'all' ? 2 : 1);
      expect(seen.kept, rule).toBe(rule !== 'all');
      expect((await readSightings(officer.scope, club, NOON)).total.sits, rule).toBe(officerSees);
      const { csv } = await exportSightings(ann.scope, { ...club, what: 'logs' }, NOON);
      expect(csv).toContain('Mine.');
      expect(csv.includes('The big one.'), rule).toBe(rule === 'all');
      const tables = await exportSightings(ann.scope, { ...club, what: 'tables' }, NOON);
      expect(tables.csv.includes('Pool'), rule).toBe(rule === 'all');
      const own = await readSightings(ann.scope, { whose: 'own' }, NOON);
      expect(
        own.logs.map((log) => log.notes),
        rule,
      ).toEqual(['Mine.']);
    }
  });

  it('leave the machine as text that no spreadsheet runs, and on record', async () => {
    const { ann, oak, club: made } = await smallClub();
    await sitAndLog(ann, oak, { notes: '=HYPERLINK("http://example.test")' });
    const { csv, name } = await exportSightings(ann.scope, { ...club, what: 'logs' }, NOON);
    expect(name).toBe(`sightings-logs-${made.slug}-2026-27.csv`);
    expect(csv).toContain(`"'=HYPERLINK(""http://example.test"")"`);
    const rows = await reader().select().from(auditLog).where(eq(auditLog.clubId, made.id));
    expect(rows.filter((row) => row.action === 'sightings.exported')).toHaveLength(1);
  });
});

describe('other visits', () => {
  let made: TestClub;
  let ann: TestMember;
  let bert: TestMember;
  let oak: string;
  beforeEach(async () => {
    ({ club: made, ann, bert, oak } = await smallClub());
  });

  const visit = (more: Partial<VisitForm>) =>
    makeVisitSchema(formClubOf(ann.scope.club)).parse({
      ...emptyVisitForm(SATURDAY, '11:30'),
      place: `stand:${oak}`,
      ...more,
    });
  const kept = () => reader().select().from(visits).where(eq(visits.clubId, made.id));

  it('count as pressure where they were, until taken out', async () => {
    const { id } = await addVisit(ann.scope, visit({ kind: 'work', bumped: 2, notes: 'New strap.' }), NOON);
    const events = await loadEvents(ann.scope, NOON + DAY_MS, NOON);
    expect(events).toMatchObject([{ kind: 'work', at: onSaturday('11:30'), standId: oak, bumped: 2 }]);
    const [line] = (await readLogScreen(bert.scope, NOON)).visits;
    expect(line).toMatchObject({ where: 'Oak Ladder', memberName: 'Ann Roe', bumped: 2, mayRemove: false });
    expect((await refusal(removeVisit(bert.scope, id, NOON))).code).toBe('forbidden');
    await removeVisit(ann.scope, id, NOON);
    expect(await loadEvents(ann.scope, NOON + DAY_MS, NOON)).toEqual([]);
    expect((await refusal(removeVisit(ann.scope, id, NOON))).code).toBe('not_found');
    expect(await kept()).toHaveLength(1);
  });

  it('may be at a feature or a position, and are kept once when sent twice', async () => {
    const at = { lat: TEST_PLACE.lat + 0.002, lon: TEST_PLACE.lon - 0.003 };
    const plot = await addFeature(made, 'Clover', 'food_plot', at);
    const input = visit({ place: `feature:${plot}` });
    const first = await addVisit(ann.scope, input, NOON);
    expect(await addVisit(ann.scope, input, NOON + 1)).toEqual(first);
    expect(await kept()).toMatchObject([{ ...at, standId: null }]);
    const position = { place: 'point', lat: '34.118', lon: '-84.001', kind: 'drive' as const };
    await addVisit(ann.scope, visit(position), NOON);
    expect((await kept()).find((row) => row.kind === 'drive')).toMatchObject({ lat: 34.118, lon: -84.001 });
  });

  it('are refused to come, of long ago, far away, and at places of another club', async () => {
    expect((await refusal(addVisit(ann.scope, visit({ clock: '15:00' }), NOON))).more.fields).toHaveProperty('day');
    expect((await refusal(addVisit(ann.scope, visit({ day: '2025-10-01' }), NOON))).more.fields).toHaveProperty('day');
    expect(() => visit({ place: 'point', lat: '50', lon: '8' })).toThrow('from the club');
    expect(() => visit({ place: '' })).toThrow('Choose where');
    const other = await makeClub();
    const theirs = await addStand(other);
    const error = await refusal(addVisit(ann.scope, visit({ place: `stand:${theirs}` }), NOON));
    expect(error.more.fields).toHaveProperty('place');
    expect(await kept()).toEqual([]);
  });
});
