import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { applyAdjustmentAction, undoAdjustmentAction } from '@/app/clubs/[club]/season/learning/actions';
import { reader, write } from '@/db/client';
import { auditLog, sitLogs, sitPredictions, sits, standAdjustments } from '@/db/schema';
import { keepPredictions } from '@/features/learning/keep-predictions';
import { readLearning } from '@/features/learning/reads';
import { newId } from '@/lib/ids';
import { addMember, makeClub, TEST_NOW, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';
import { eachSitsClub, HOUR, listFor, steady } from '../helpers/sits-club';

const made = eachSitsClub();

/** A past sit on West Oak, said to be so quiet, with deer bumped or none. */
async function addOutcome(quiet: number, bumped: number, n: number): Promise<void> {
  const startAt = TEST_NOW - (n + 2) * 24 * HOUR;
  const id = newId('sit');
  const { club, ann, west } = made;
  await write(async (tx) => {
    await tx.insert(sits).values({
      id,
      clubId: club.id,
      standId: west,
      memberId: ann.id,
      day: new Date(startAt).toISOString().slice(0, 10),
      windows: 'morning',
      startAt,
      endAt: startAt + 4 * HOUR,
      weapon: 'bow',
      guests: [],
      status: 'booked',
      requestKey: id,
      bookedBy: ann.id,
      createdAt: startAt,
      updatedAt: startAt,
    });
    await tx.insert(sitLogs).values({
      sitId: id,
      clubId: club.id,
      startAt,
      endAt: startAt + 4 * HOUR,
      antleredBucks: 0,
      does: 0,
      fawns: 0,
      unknown: 0,
      bumpedIn: bumped,
      bumpedSitting: 0,
      bumpedOut: 0,
      createdAt: startAt,
    });
    await tx.insert(sitPredictions).values({ sitId: id, clubId: club.id, standId: west, quiet, at: startAt });
  });
}

/** Twenty sits said 80, twelve of them clean: ten points too many. */
async function addSeason(): Promise<void> {
  for (let n = 0; n < 20; n++) await addOutcome(80, n < 12 ? 0 : 2, n);
}

const apply = (who: TestMember, points: number, count = 20) =>
  inRequest(who.browser, () => applyAdjustmentAction(made.club.slug, { standId: made.west, points, sits: count }));

const quietOfWest = async () =>
  (await listFor(made.ann)).open.find(({ standId }) => standId === made.west)?.quiet ?? Number.NaN;

describe('predictions kept for the log', () => {
  it('keep what is thought of a sit as its window begins, once, whoever asks', async () => {
    const startAt = TEST_NOW - HOUR;
    await addOutcome(50, 0, 0);
    await write(async (tx) => {
      await tx.delete(sitPredictions).where(eq(sitPredictions.clubId, made.club.id));
      const set = { day: '2026-11-04', startAt, endAt: startAt + 4 * HOUR };
      await tx.update(sits).set(set).where(eq(sits.clubId, made.club.id));
    });
    const forecastOf = async () => steady(270);
    const [a, b] = await Promise.all([keepPredictions(TEST_NOW, forecastOf), keepPredictions(TEST_NOW, forecastOf)]);
    expect(a.kept + b.kept).toBe(1);
    const [row] = await reader().select().from(sitPredictions).where(eq(sitPredictions.clubId, made.club.id));
    expect(row).toMatchObject({ standId: made.west, adjustedBy: 0, at: TEST_NOW });
    expect(Math.abs((row?.windFromDeg ?? Number.NaN) - 270)).toBeLessThan(5);
    expect(row?.score).toBeGreaterThan(0);
    expect(row?.score).toBeLessThanOrEqual(100);
    expect(row?.quiet).toBeGreaterThan(0);
    expect(await keepPredictions(TEST_NOW, forecastOf)).toEqual({ kept: 0 });
  });

  it('keep nothing without a forecast, nor of a sit long begun', async () => {
    await addOutcome(50, 0, 0);
    await write((tx) => tx.delete(sitPredictions).where(eq(sitPredictions.clubId, made.club.id)));
    expect(await keepPredictions(TEST_NOW, async () => steady(270))).toEqual({ kept: 0 });
  });
});

describe('what a log asks of a stand', () => {
  it('is shown with its score, and counts for nothing by itself', async () => {
    await addSeason();
    const { reliability, proposals, history } = await readLearning(made.ann.scope);
    // 12 clean at (.8 - 1)^2 = .04 and 8 at .64: 5.6 / 20.
    expect(reliability.brier?.score).toBeCloseTo(0.28, 9);
    expect(reliability.rows[4]).toMatchObject({ sits: 20, clean: 12 });
    expect(proposals).toMatchObject([
      { standName: 'West Oak', sits: 20, clean: 12, predicted: 80, points: -10, holds: 0 },
    ]);
    expect(history).toEqual([]);
  });

  it('is applied by an admin alone, moves the list, and is undone; all of it recorded', async () => {
    await addSeason();
    const before = await quietOfWest();
    const admin = await addMember(made.club, 'admin', { name: 'Ada Admin' });
    const steward = await addMember(made.club, 'steward');
    for (const who of [steward, made.ann]) expect(await apply(who, -10)).toMatchObject({ ok: false });
    expect(await apply(admin, -9)).toMatchObject({ ok: false, error: { code: 'conflict' } });
    expect(await apply(admin, -10)).toMatchObject({ ok: true });
    expect(before - (await quietOfWest())).toBeCloseTo(10, 0);
    expect((await readLearning(admin.scope)).history).toMatchObject([{ points: -10, sits: 20, holds: true }]);

    const undo = () => inRequest(admin.browser, () => undoAdjustmentAction(made.club.slug, { standId: made.west }));
    expect(await undo()).toMatchObject({ ok: true });
    expect(await quietOfWest()).toBeCloseTo(before, 6);
    expect(await undo()).toMatchObject({ ok: false, error: { code: 'conflict' } });
    const { history } = await readLearning(admin.scope);
    expect(history[0]?.text).toMatch(/^-10 points .* applied by Ada Admin.* Ended by Ada Admin/);
    const kept = await reader().select().from(auditLog).where(eq(auditLog.clubId, made.club.id));
    expect(kept.map(({ action }) => action).filter((a) => a.startsWith('adjustment.'))).toEqual([
      'adjustment.applied',
      'adjustment.undone',
    ]);
    expect(await reader().select().from(standAdjustments)).toHaveLength(1);
  });

  it('does not cross clubs', async () => {
    await addSeason();
    const admin = await addMember(made.club, 'admin');
    const other = await addMember(await makeClub(), 'admin');
    expect((await readLearning(other.scope)).proposals).toEqual([]);
    const answer = await inRequest(other.browser, () =>
      applyAdjustmentAction(made.club.slug, { standId: made.west, points: -10, sits: 20 }),
    );
    expect(answer).toMatchObject({ ok: false, error: { code: 'not_found' } });
    expect((await readLearning(admin.scope)).history).toEqual([]);
  });
});
