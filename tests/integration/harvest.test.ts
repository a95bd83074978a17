import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import type { ClubRules } from '@/core/booking/rules';
import { reader } from '@/db/client';
import { auditLog, harvests } from '@/db/schema';
import { readWalkUp } from '@/features/board/read-walk-up';
import { exportHarvest } from '@/features/harvest/export-harvest';
import { emptyHarvestForm, type HarvestForm, makeHarvestSchema } from '@/features/harvest/harvest-schema';
import { readQuotasOf, readSeasonCautions } from '@/features/harvest/quota-cautions';
import { readHarvest } from '@/features/harvest/reads';
import { addHarvest, changeHarvest, removeHarvest } from '@/features/harvest/save-harvest';
import { readHarvestSheet, readNewHarvest } from '@/features/harvest/sheet-reads';
import { readSwap } from '@/features/notices/read-swap';
import { readWeek } from '@/features/sits/read-week';
import { readSits } from '@/features/sits/reads';
import { setClock } from '@/server/clock';
import { book, refusal, SATURDAY, smallClub } from '../helpers/book';
import { onSaturday, sitAndLog } from '../helpers/log-sits';
import { addMember, makeClub, type TestClub, type TestMember } from '../helpers/make-club';

const NOON = onSaturday('12:00');
const RULES: Partial<ClubRules> = {
  harvestQuotas: [
    { deer: 'antlered', per: 'member', most: 1 },
    { deer: 'any', per: 'club', most: 3 },
    { deer: 'any', per: 'member_guests', most: 1 },
  ],
};

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let oak: string;
let guest: TestMember;
beforeEach(async () => {
  setClock(() => NOON);
  ({ club, ann, bert, oak } = await smallClub(RULES));
  guest = await addMember(club, 'guest', {
    name: 'Gil Frost',
    sponsorId: ann.id,
    guestFrom: SATURDAY,
    guestTo: '2026-11-20',
  });
});

const read = makeHarvestSchema('us');
function sheet(hunter: TestMember, more: Partial<HarvestForm> = {}) {
  const known = { hunterId: hunter.id, sitId: '', day: SATURDAY, clock: '08:10', standId: oak, weapon: 'bow' as const };
  return read.parse({ ...emptyHarvestForm({ ...known, requestKey: randomUUID() }), ...more });
}
const BUCK = { deer: 'antlered_buck' } as const;
const rows = () => reader().select().from(harvests).where(eq(harvests.clubId, club.id));
const cautions = async (who: TestMember) =>
  (await readSits(who.scope, { day: '2026-11-14', window: 'morning' }, NOON)).cautions
    .filter((caution) => caution.code === 'quota_met')
    .map((caution) => caution.text);

describe('a harvest sheet', () => {
  it('is kept in kilograms and millimetres, with antlers on bucks and milk on does alone', async () => {
    const typed = {
      ...BUCK,
      age: '2.5' as const,
      ageMethod: 'teeth' as const,
      dressed: '120',
      pointsLeft: '4',
      insideSpread: '15.5',
      lactating: 'yes' as const,
    };
    await addHarvest(ann.scope, sheet(ann, typed), NOON);
    await addHarvest(ann.scope, sheet(ann, { dressed: '88', pointsLeft: '4', lactating: 'yes' }), NOON);
    const [buck, doe] = await rows();
    expect(buck).toMatchObject({
      sex: 'buck',
      antlered: true,
      pointsLeft: 4,
      lactating: null,
      takenAt: onSaturday('08:10'),
    });
    // 1 lb = 0.45359237 kg and 1 in = 25.4 mm, exactly (International Yard and Pound, 1959).
    expect(buck?.dressedKg).toBeCloseTo(54.4310844, 6);
    expect(buck?.insideSpreadMm).toBeCloseTo(393.7, 6);
    expect(doe).toMatchObject({ sex: 'doe', antlered: false, pointsLeft: null, lactating: true });
  });

  it('is counted once when sent twice', async () => {
    const input = sheet(ann, BUCK);
    const first = await addHarvest(ann.scope, input, NOON);
    expect((await addHarvest(ann.scope, input, NOON + 1)).id).toBe(first.id);
    expect(first.met).toEqual(['Your limit of 1 antlered deer this season is met (1 taken).']);
    expect(await rows()).toHaveLength(1);
    expect((await refusal(addHarvest(bert.scope, { ...input, hunterId: bert.id }, NOON))).code).toBe('conflict');
  });

  it('names what cannot be', async () => {
    const wrong = (more: Partial<HarvestForm>) => () => sheet(ann, more);
    expect(wrong({ age: '1.5' })).toThrow('how the age was estimated');
    expect(wrong({ dressed: '150', live: '120' })).toThrow('swapped');
    expect(wrong({ ...BUCK, pointsLeft: '4.5' })).toThrow('whole number');
    const ahead = await refusal(addHarvest(ann.scope, sheet(ann, { clock: '16:00' }), NOON));
    expect(ahead.more.fields).toHaveProperty('clock');
    const elsewhere = sheet(ann, { standId: 'std_none' });
    expect((await refusal(addHarvest(ann.scope, elsewhere, NOON))).more.fields).toHaveProperty('standId');
    expect(await rows()).toEqual([]);
  });

  it('begins from the sit whose log leads to it', async () => {
    const hit = { shot: 'hit', shotClock: '08:10', hitPlace: 'heart_lungs', followUp: 'recovered' } as const;
    const sit = await sitAndLog(ann, oak, { antleredBucks: 1, ...hit });
    const { form } = await readNewHarvest(ann.scope, sit.id, NOON);
    expect(form).toMatchObject({ sitId: sit.id, hunterId: ann.id, day: SATURDAY, clock: '08:10', standId: oak });
    expect((await readNewHarvest(bert.scope, sit.id, NOON)).form).toMatchObject({ sitId: '', hunterId: bert.id });
  });
});

describe('who may write and change a sheet', () => {
  it('is the hunter, the sponsor of a guest, and an officer', async () => {
    const steward = await addMember(club, 'steward');
    expect((await refusal(addHarvest(bert.scope, sheet(ann), NOON))).code).toBe('forbidden');
    expect((await refusal(addHarvest(bert.scope, sheet(guest), NOON))).code).toBe('forbidden');
    expect(guest.scope.can('harvest.write')).toBe(false);
    await addHarvest(ann.scope, sheet(guest), NOON);
    const { id } = await addHarvest(steward.scope, sheet(bert), NOON);
    const at = { id, version: 1 };
    expect((await refusal(changeHarvest(ann.scope, at, sheet(ann), NOON))).code).toBe('forbidden');
    expect((await refusal(removeHarvest(ann.scope, at, NOON))).code).toBe('forbidden');
    expect((await readHarvestSheet(ann.scope, id)).change).toBeNull();
    expect((await readHarvestSheet(bert.scope, id)).change?.form.hunterId).toBe(bert.id);
    const stranger = await addMember(await makeClub(), 'admin');
    expect((await refusal(readHarvestSheet(stranger.scope, id))).code).toBe('not_found');
    expect((await refusal(changeHarvest(stranger.scope, at, sheet(stranger), NOON))).code).toBe('not_found');
    expect((await refusal(addHarvest(stranger.scope, sheet(ann), NOON))).more.fields).toHaveProperty('hunterId');
  });

  it('keeps on record what a change and a removal did, and refuses an old form', async () => {
    const { id } = await addHarvest(ann.scope, sheet(ann, { dressed: '90' }), NOON);
    await changeHarvest(ann.scope, { id, version: 1 }, sheet(ann, { dressed: '98' }), NOON);
    const late = await refusal(changeHarvest(ann.scope, { id, version: 1 }, sheet(ann), NOON));
    expect(late.code).toBe('conflict');
    await removeHarvest(ann.scope, { id, version: 2 }, NOON);
    expect(await rows()).toMatchObject([{ version: 3, removedAt: NOON }]);
    const audit = (await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id))).filter(
      (row) => row.subjectId === id,
    );
    expect(audit.map((row) => row.action)).toEqual(['harvest.added', 'harvest.changed', 'harvest.removed']);
    expect(Object.keys(Object(audit[1]?.detail.before))).toEqual(['dressedKg']);
    expect((await readHarvest(ann.scope, {}, NOON)).sheets).toEqual([]);
  });
});

describe('quotas', () => {
  it('count a guest on the sponsor, and caution those whom they touch before booking', async () => {
    expect(await cautions(ann)).toEqual([]);
    await addHarvest(ann.scope, sheet(guest, BUCK), NOON);
    const page = await readHarvest(ann.scope, {}, NOON);
    expect(page.quotas.map(({ taken, most, met }) => [taken, most, met !== null])).toEqual([
      [1, 1, true],
      [1, 3, false],
      [1, 1, true],
    ]);
    expect(page.members).toEqual([{ memberId: ann.id, name: 'Ann Roe', antlered: 1, antlerless: 0, byGuests: 1 }]);
    expect(await cautions(ann)).toHaveLength(2);
    expect(await cautions(bert)).toEqual([]);
    expect((await cautions(guest))[0]).toContain('Your deer count on your sponsor, whose limit of 1');
    await addHarvest(bert.scope, sheet(bert), NOON);
    await addHarvest(bert.scope, sheet(bert, { guestName: 'Cousin Hal' }), NOON);
    expect(await cautions(bert)).toEqual([
      "The club's limit of 3 deer this season is met (3 taken).",
      'The limit for your guests of 1 deer this season is met (1 taken).',
    ]);
  });

  it('are told of whoever is booked for, wherever a sit can be booked or changed', async () => {
    const admin = await addMember(club, 'admin', { name: 'Ida Kern' });
    await addHarvest(ann.scope, sheet(ann, BUCK), NOON);
    const of = async (who: TestMember, member?: string) =>
      (await readQuotasOf(who.scope, { day: SATURDAY, memberId: member })).map(({ text }) => text);
    expect(await of(admin)).toEqual([]);
    expect(await of(admin, ann.id)).toEqual(["Ann Roe's limit of 1 antlered deer this season is met (1 taken)."]);
    expect(await of(admin, guest.id)).toEqual([
      'The deer of Gil Frost count on their sponsor, whose limit of 1 antlered deer this season is met (1 taken).',
    ]);
    expect(await of(admin, bert.id)).toEqual([]);
    expect((await refusal(of(bert, ann.id))).code).toBe('forbidden');
    const own = 'Your limit of 1 antlered deer this season is met (1 taken).';
    expect(await of(ann, ann.id)).toEqual([own]);
    expect((await readWeek(ann.scope, {}, NOON)).cautions.map(({ text }) => text)).toEqual([own]);
    expect((await readWeek(bert.scope, {}, NOON)).cautions).toEqual([]);
    expect((await readWalkUp(ann.scope, NOON)).cautions).toEqual([own]);
    expect((await readWalkUp(bert.scope, NOON)).cautions).toEqual([]);
    expect(await readSeasonCautions(ann.scope, [SATURDAY, '2026-11-21', '2027-11-06'])).toEqual([
      { fromDay: '2026-07-01', toDay: '2027-06-30', texts: [own] },
      { fromDay: '2027-07-01', toDay: '2028-06-30', texts: [] },
    ]);
    const sit = await book(ann, oak, { day: '2026-11-14' }, NOON);
    expect((await readSwap(ann.scope, sit.id, NOON))?.quotas).toEqual([own]);
    expect((await readSwap(admin.scope, sit.id, NOON))?.quotas).toEqual(await of(admin, ann.id));
  });

  it('begin anew with the season, and forget a sheet taken out', async () => {
    const { id } = await addHarvest(ann.scope, sheet(ann, BUCK), NOON);
    const nextYear = Date.UTC(2027, 10, 6, 15);
    const later = await readSits(ann.scope, { day: '2027-11-07', window: 'morning' }, nextYear);
    expect(later.cautions.some((caution) => caution.code === 'quota_met')).toBe(false);
    await removeHarvest(ann.scope, { id, version: 1 }, NOON);
    expect(await cautions(ann)).toEqual([]);
  });

  it('leave as a file with the weights in kilograms', async () => {
    await addHarvest(ann.scope, sheet(ann, { dressed: '100', place: '=cmd()' }), NOON);
    const { csv } = await exportHarvest(ann.scope, 2026, NOON);
    expect(csv.split('\r\n')).toHaveLength(3);
    expect(csv).toContain(',45.4,');
    expect(csv).toContain(`"'=cmd()"`);
  });
});
