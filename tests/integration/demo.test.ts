import { count, eq, getTableColumns } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import type { WindowName } from '@/core/condition-types';
import { addDays, dayOf, daysBetween } from '@/core/day-time';
import { distanceM, insideRings, toLocal } from '@/core/geometry';
import { FEATURE_KINDS, STAND_KINDS } from '@/core/ground-types';
import { quotaStates } from '@/core/harvest/quotas';
import { ROLES } from '@/core/permissions';
import { m2ToAcre } from '@/core/units';
import { reader } from '@/db/client';
import * as schema from '@/db/schema';
import { gatesFor, loadBookingContext } from '@/features/bookings/booking-context';
import { guestKey } from '@/features/bookings/guest-parties';
import { windowsHeld } from '@/features/bookings/words/sits';
import { BOUNDARY, boundaryPolygon } from '@/features/demo/boundary';
import { buildDemo, DEMO_SLUG } from '@/features/demo/build-demo';
import { DEMO_PLACE, pointOf } from '@/features/demo/demo-place';
import type { DemoRows } from '@/features/demo/demo-rows';
import { demoSignIns } from '@/features/demo/demo-sign-ins';
import { DEMO_PASSWORD } from '@/features/demo/people';
import { seedDemo } from '@/features/demo/seed-demo';
import { localShapes } from '@/features/ground/to-core';
import { readSits } from '@/features/sits/reads';
import { passwordMatches } from '@/server/passwords';
import { systemScopeBySlug } from '@/server/scope';

const NOW = Date.UTC(2026, 10, 4, 15);
const TODAY = dayOf(NOW, DEMO_PLACE.zone);
const DAYS = [0, 45, 97, 150, 203, 261, 318, 364].map((n) => NOW + n * 86_400_000);
/** As far as a phone's position may be off. */
const NEAR_M = 30;

const local = ([lon = 0, lat = 0]: number[]) => toLocal(DEMO_PLACE, { lat, lon });
const inside = (p: { eastM: number; northM: number }) => insideRings(p, [BOUNDARY.map(pointOf)]);

/** Surveyor's area of the boundary as GeoJSON, from degrees back to metres. */
function acres(): number {
  const ring = (boundaryPolygon().coordinates[0] ?? []).map(local);
  const twice = ring.slice(1).reduce((sum, b, i) => {
    const a = ring[i] ?? b;
    return sum + a.eastM * b.northM - b.eastM * a.northM;
  }, 0);
  return m2ToAcre(Math.abs(twice) / 2);
}

const tables = {
  users: schema.users,
  clubs: schema.clubs,
  memberships: schema.memberships,
  parkings: schema.parkings,
  stands: schema.stands,
  closures: schema.closures,
  approaches: schema.approaches,
  features: schema.features,
  mapItems: schema.mapItems,
  imports: schema.imports,
  setupAnswers: schema.setupAnswers,
  sits: schema.sits,
  claims: schema.claims,
  sitLogs: schema.sitLogs,
  sitPredictions: schema.sitPredictions,
  sitLogVersions: schema.sitLogVersions,
  harvests: schema.harvests,
  outings: schema.outings,
  safetyContacts: schema.safetyContacts,
  visits: schema.visits,
  chores: schema.chores,
  inspections: schema.inspections,
  draws: schema.draws,
  drawEntries: schema.drawEntries,
  workDays: schema.workDays,
  workDayMembers: schema.workDayMembers,
  auditLog: schema.auditLog,
};

async function countRows(): Promise<Record<string, number>> {
  const counts: Record<string, number> = {};
  for (const [name, table] of Object.entries(tables)) {
    const [row] = await reader().select({ rows: count() }).from(table);
    counts[name] = row?.rows ?? 0;
  }
  return counts;
}

beforeAll(async () => {
  const refused = await seedDemo('libsql://windrest.example.test', NOW);
  expect(refused).toBe('not_local');
  expect(Object.values(await countRows()).every((rows) => rows === 0)).toBe(true);
  expect(await demoSignIns()).toBeNull();
  expect(await seedDemo('file:demo.db', NOW)).toBe('seeded');
});

describe('the demo in the database', () => {
  it('holds every row that was built, and a second run changes nothing', async () => {
    const built = buildDemo(NOW, 'hash');
    const before = await countRows();
    expect(before).toEqual(Object.fromEntries(Object.entries(built).map(([name, rows]) => [name, rows.length])));
    expect(await seedDemo('file:demo.db', NOW + 86_400_000)).toBe('not_empty');
    expect(await countRows()).toEqual(before);
  });

  it('lets its people sign in, and names each of them', async () => {
    const users = await reader().select().from(schema.users);
    for (const user of users) {
      expect(user.email).toMatch(/@example\.org$/);
      expect(user.emailVerifiedAt).not.toBeNull();
    }
    expect(await passwordMatches(users[0]?.passwordHash ?? null, DEMO_PASSWORD)).toBe(true);
    const table = (await demoSignIns()) ?? '';
    expect(table).toContain(DEMO_PASSWORD);
    expect(table.match(/@example\.org/g)).toHaveLength(12);
  });

  it('ranks all stands of the club for the next window', async () => {
    const scope = await systemScopeBySlug(DEMO_SLUG);
    const view = await readSits(scope, {}, NOW);
    expect(view.standCount).toBe(16);
    expect(view.open.length + view.blocked.length).toBe(16);
    expect(view.open.length).toBeGreaterThanOrEqual(4);
    expect(view.blocked.length).toBeGreaterThanOrEqual(2);
  });

  it('keeps every sit to the rules a member is held to', async () => {
    const scope = await systemScopeBySlug(DEMO_SLUG);
    const sits = await reader().select().from(schema.sits).where(eq(schema.sits.status, 'booked'));
    for (const sit of sits) {
      const windows = windowsHeld(sit.windows);
      const context = await loadBookingContext(
        scope,
        { day: sit.day, windows, memberId: sit.memberId, now: sit.createdAt, exceptSitId: sit.id },
        reader(),
      );
      // Closures and claims made after this one do not count against it when it was booked.
      const held = await reader().select().from(schema.sits);
      const later = new Set(held.filter((other) => other.createdAt > sit.createdAt).map(({ id }) => id));
      const then = { ...context, otherSits: context.otherSits.filter(({ sitId }) => !later.has(sitId)) };
      expect(gatesFor(then, sit.standId, { weapon: sit.weapon, guests: sit.guests.map(guestKey) })).toEqual([]);
    }
  });
});

describe.each(DAYS)('the demo made at %d', (now) => {
  const today = dayOf(now, DEMO_PLACE.zone);
  const rows: DemoRows = buildDemo(now, 'hash');
  const club = rows.clubs[0];
  const ofClub = rows.memberships.filter(({ clubId }) => clubId === club?.id);
  const stands = rows.stands.filter(({ clubId }) => clubId === club?.id);
  const booked = rows.sits.filter(({ status }) => status === 'booked');

  it('has what a club of 420 acres has', () => {
    expect(acres()).toBeGreaterThan(420 * 0.95);
    expect(acres()).toBeLessThan(420 * 1.05);
    expect(stands).toHaveLength(16);
    expect(new Set(stands.map(({ kind }) => kind))).toEqual(new Set(STAND_KINDS));
    expect(rows.features.length).toBeGreaterThanOrEqual(30);
    expect(new Set(rows.features.map(({ kind }) => kind))).toEqual(new Set(FEATURE_KINDS));
    expect(rows.parkings).toHaveLength(3);
    expect(rows.approaches.length).toBeGreaterThanOrEqual(20);
    expect(ofClub).toHaveLength(12);
    expect(new Set(ofClub.map(({ role }) => role))).toEqual(new Set(ROLES));
    expect(rows.clubs).toHaveLength(2);
    expect(rows.memberships.filter(({ userId }) => ofClub.some((m) => m.userId === userId)).length).toBe(13);
  });

  it('lies inside its own boundary, a 20 to 50 acre sanctuary apart from every stand', () => {
    for (const stand of stands) expect(inside(toLocal(DEMO_PLACE, stand)), stand.name).toBe(true);
    for (const parking of rows.parkings) expect(inside(toLocal(DEMO_PLACE, parking)), parking.name).toBe(true);
    for (const way of rows.approaches) {
      for (const point of way.points) expect(inside(local(point)), way.name).toBe(true);
    }
    for (const feature of rows.features.filter(({ name }) => name !== 'Tansy Fork')) {
      for (const shape of localShapes(DEMO_PLACE, feature.geometry)) {
        const points = shape.type === 'point' ? [shape.at] : shape.type === 'line' ? shape.points : shape.rings.flat();
        for (const point of points) expect(inside(point), feature.name).toBe(true);
      }
    }
    const sanctuary = rows.features.find(({ kind }) => kind === 'sanctuary');
    const [shape] = sanctuary ? localShapes(DEMO_PLACE, sanctuary.geometry) : [];
    if (shape?.type !== 'area') throw new Error('The sanctuary is no area.');
    for (const stand of stands) expect(insideRings(toLocal(DEMO_PLACE, stand), shape.rings), stand.name).toBe(false);
  });

  it('has a way to each stand, from a parking place to the stand', () => {
    for (const way of rows.approaches) {
      const parking = rows.parkings.find(({ id }) => id === way.parkingId);
      const stand = stands.find(({ id }) => id === way.standId);
      if (!parking || !stand) throw new Error(`${way.name} has no ends.`);
      const [first, last] = [way.points[0] ?? [], way.points.at(-1) ?? []];
      expect(distanceM(local(first), toLocal(DEMO_PLACE, parking)), way.name).toBeLessThan(NEAR_M);
      expect(distanceM(local(last), toLocal(DEMO_PLACE, stand)), way.name).toBeLessThan(NEAR_M);
    }
    for (const stand of stands) {
      const ways = rows.approaches.filter((way) => way.standId === stand.id && way.direction !== 'out');
      expect(ways.length, stand.name).toBeGreaterThan(0);
    }
  });

  it('holds each stand and each member once a window', () => {
    const taken = booked.flatMap((sit) => windowsHeld(sit.windows).map((window: WindowName) => ({ ...sit, window })));
    expect(rows.claims).toHaveLength(taken.length);
    const stand = rows.claims.map((claim) => `${claim.standId} ${claim.day} ${claim.window}`);
    const member = rows.claims.map((claim) => `${claim.memberId} ${claim.day} ${claim.window}`);
    expect(new Set(stand).size).toBe(stand.length);
    expect(new Set(member).size).toBe(member.length);
    for (const claim of rows.claims) expect(booked.some(({ id }) => id === claim.sitId)).toBe(true);
  });

  it('never breaks a rest period, counted in full days', () => {
    for (const a of booked) {
      const rest = stands.find(({ id }) => id === a.standId)?.restDays ?? club?.rules.restDaysDefault ?? 0;
      for (const b of booked) {
        const apart = Math.abs(daysBetween(a.day, b.day));
        if (a.standId === b.standId && apart > 0) expect(apart).toBeGreaterThan(rest);
      }
    }
  });

  it('has a season behind it and a few sits before it', () => {
    const past = booked.filter(({ day }) => day < today);
    const coming = booked.filter(({ day }) => day >= today);
    expect(past.length).toBeGreaterThanOrEqual(60);
    expect(past.every(({ day }) => day >= addDays(today, -70))).toBe(true);
    expect(coming.length).toBeGreaterThanOrEqual(5);
    expect(coming.every(({ day }) => day <= addDays(today, 14))).toBe(true);
    expect(rows.sits.filter(({ status }) => status === 'cancelled')).toHaveLength(2);
    expect(rows.sits.every(({ createdAt }) => createdAt < now)).toBe(true);
    expect(rows.auditLog.every(({ at }) => at <= now)).toBe(true);
    expect(rows.visits.every(({ at }) => at < now)).toBe(true);
  });

  it('counts deer at a rate that hunters report, sits with none among them', () => {
    const hours = rows.sitLogs.reduce((sum, log) => sum + (log.endAt - log.startAt) / 3_600_000, 0);
    const deer = rows.sitLogs.map((log) => log.antleredBucks + log.does + log.fawns + log.unknown);
    const rate = deer.reduce((sum, n) => sum + n, 0) / hours;
    // 0.73 an hour: Meier et al. 2025, Wildlife Research. Half and double it are still believable.
    expect(rate).toBeGreaterThan(0.36);
    expect(rate).toBeLessThan(1.46);
    const zeros = deer.filter((n) => n === 0).length / deer.length;
    expect(zeros).toBeGreaterThan(0.1);
    expect(zeros).toBeLessThan(0.5);
    expect(rows.sitLogs.some((log) => log.bumpedIn + log.bumpedSitting + log.bumpedOut > 0)).toBe(true);
    const ended = new Map(rows.sits.map((sit) => [sit.id, sit]));
    for (const log of rows.sitLogs) {
      expect(log.endAt).toBeGreaterThan(log.startAt);
      expect(log.startAt).toBeGreaterThanOrEqual(ended.get(log.sitId)?.startAt ?? Number.POSITIVE_INFINITY);
    }
  });

  it('has deer taken from sits whose logs tell of the shot, within most of the quotas', () => {
    expect(rows.harvests.length).toBeGreaterThanOrEqual(4);
    const logs = new Map(rows.sitLogs.map((log) => [log.sitId, log]));
    for (const sheet of rows.harvests) {
      const log = logs.get(sheet.sitId ?? '');
      expect(log).toMatchObject({ shot: 'hit', shotAt: sheet.takenAt, followUp: 'recovered' });
      expect(sheet.antlered ? log?.antleredBucks : log?.does).toBeGreaterThan(0);
      expect(sheet.createdAt).toBeLessThan(now);
    }
    const quotas = rows.clubs[0]?.rules.harvestQuotas ?? [];
    const taken = rows.harvests.map((sheet) => ({ ...sheet, byGuest: sheet.guestName !== '' }));
    const [member] = taken.filter((sheet) => sheet.antlered);
    const states = quotaStates(quotas, taken, member?.memberId ?? null);
    expect(states.some((state) => state.met)).toBe(true);
    expect(states.every((state) => state.taken <= state.quota.most)).toBe(true);
    const [before] = rows.sitLogVersions;
    expect(logs.get(before?.sitId ?? '')?.version).toBe(2);
  });

  it('has whoever sits now on the ground, once a member, and nobody for a sit that does not stand', () => {
    const stand = new Set(rows.sits.filter(({ status }) => status === 'booked').map(({ id }) => id));
    const open = rows.outings.filter(({ signedOutAt }) => signedOutAt === null);
    expect(rows.outings.length).toBeGreaterThan(40);
    expect(rows.outings.every(({ sitId }) => stand.has(sitId))).toBe(true);
    expect(new Set(open.map(({ memberId }) => memberId)).size).toBe(open.length);
    expect(rows.outings.every(({ signedInAt, signedOutAt }) => signedInAt <= now && (signedOutAt ?? now) <= now)).toBe(
      true,
    );
    expect(rows.outings.some(({ tracking }) => tracking)).toBe(true);
  });

  it('comes out the same at any hour of a day, but for who is on the ground, and otherwise on another', () => {
    const later = buildDemo(now + 3_600_000, 'hash');
    expect({ ...later, outings: rows.outings }).toEqual(rows);
    expect(buildDemo(now + 86_400_000, 'hash').sits[0]?.id).not.toBe(rows.sits[0]?.id);
  });
});

it('names in its rows only columns there are', () => {
  const rows = buildDemo(NOW, 'hash');
  expect(TODAY).toBe('2026-11-04');
  for (const [name, table] of Object.entries(tables)) {
    const columns = Object.keys(getTableColumns(table));
    const list: object[] = rows[name as keyof DemoRows];
    for (const row of list) for (const key of Object.keys(row)) expect(columns).toContain(key);
  }
});
