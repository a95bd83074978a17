import { copyFileSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq, isNotNull } from 'drizzle-orm';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { formatClock, localToUtc } from '@/core/day-time';
import { reader, useDatabase, write } from '@/db/client';
import { claims, outbox, outings, overdueSteps, safetyContacts, sits } from '@/db/schema';
import { makeDice } from '@/features/demo/dice';
import { setClock } from '@/server/clock';
import { systemScopeBySlug } from '@/server/scope';
import { addMember, addStand, makeClub, TEST_PLACE, type TestMember } from '../helpers/make-club';
import { seasonFaults, seasonLeftUndone } from '../helpers/season-checks';
import { SeasonProcess } from '../helpers/season-process';
import { serveSmtp, type TestSmtp } from '../helpers/smtp-server';

const HOUR = 3_600_000;
/** From the opening of the bow season to its end, over the change of clocks on 1 November. */
const FROM = localToUtc('2026-10-01', '00:00', TEST_PLACE.zone);
const TO = localToUtc('2026-12-14', '00:00', TEST_PLACE.zone);
const MEMBERS = 16;
const STANDS = 12;
const KILLS_AT_WORK = 6;
const KILLS_AT_MAIL = 3;
const HOURS = (TO - FROM) / HOUR;

const folder = mkdtempSync(join(tmpdir(), 'windrest-season-'));
const databaseUrl = `file:${join(folder, 'season.db')}`;
const servers: TestSmtp[] = [];
/** Set to have the process that sends by this server killed when its next mail arrives. */
const killOnMail = [false, false];
const processes: SeasonProcess[] = [];

beforeAll(async () => {
  copyFileSync(inject('templateDatabase'), join(folder, 'season.db'));
  await useDatabase(databaseUrl);
  setClock(() => FROM);
  for (const n of [0, 1]) {
    servers.push(
      await serveSmtp(() => {
        if (!killOnMail[n]) return;
        killOnMail[n] = false;
        processes[n]?.kill();
      }),
    );
  }
});

afterAll(async () => {
  for (const server of servers) await server.close();
  rmSync(folder, { recursive: true, force: true });
});

async function makeSeason() {
  const club = await makeClub({ holdMinutes: 45, restDaysDefault: 2, passThroughM: 0, maxLiveClaims: 3 });
  const standIds: string[] = [];
  for (let n = 0; n < STANDS; n++) standIds.push(await addStand(club));
  await addMember(club, 'steward');
  const members: TestMember[] = [];
  for (let n = 0; n < MEMBERS; n++) members.push(await addMember(club));
  await write(async (tx) => {
    for (const [n, member] of members.entries()) {
      if (n % 2 === 0) continue;
      const contact = { userId: member.userId, name: `Contact ${n}`, email: `c${n}@example.test` };
      const asked = { secretHash: `hash ${n}`, askedAt: FROM, expiresAt: FROM, consentedAt: FROM };
      await tx.insert(safetyContacts).values({ ...contact, ...asked });
    }
  });
  for (const n of [0, 1]) {
    const userIds = members.filter((_, i) => i % 2 === n).map((member) => member.userId);
    const env = { DATABASE_URL: databaseUrl, SMTP_URL: servers[n]?.url ?? '', LOG_LEVEL: 'silent' };
    processes.push(new SeasonProcess({ slug: club.slug, userIds, standIds }, env));
  }
  return systemScopeBySlug(club.slug);
}

/** Both processes live the hour at once; one that was killed is started anew and lives it again. */
async function liveHour(at: number, kill: { who: number; doing: number } | null): Promise<boolean> {
  const lived = await Promise.all(processes.map((one, n) => one.live(at, kill?.who === n ? kill.doing : null)));
  for (const [n, done] of lived.entries()) {
    if (done) continue;
    await processes[n]?.start();
    while (!(await processes[n]?.live(at))) await processes[n]?.start();
  }
  return lived.every(Boolean);
}

it(`keeps its promises in each of the ${HOURS} hours of a season lived by two processes that are killed now and then`, async () => {
  const scope = await makeSeason();
  await Promise.all(processes.map((one) => one.start()));
  const dice = makeDice('season');
  const hoursOf = (count: number) => new Set(Array.from({ length: count }, () => dice.whole(24, HOURS - 48)));
  const killsAtWork = hoursOf(KILLS_AT_WORK);
  const killsAtMail = hoursOf(KILLS_AT_MAIL);
  let quiet = true;
  for (let hour = 0; hour < HOURS; hour++) {
    const at = FROM + hour * HOUR;
    const clock = formatClock(at, scope.club.zone);
    if (killsAtMail.has(hour)) killOnMail.fill(true);
    const kill = killsAtWork.has(hour) ? { who: dice.whole(0, 1), doing: dice.whole(1, 4) } : null;
    const before = quiet;
    quiet = await liveHour(at, kill);
    expect(await seasonFaults(scope, at), `hour ${hour}, ${clock}`).toEqual([]);
    // Work that a killed process had leased is taken over within the next hour.
    if (quiet && before) expect(await seasonLeftUndone(scope, at), `hour ${hour}, ${clock}`).toEqual([]);
  }
  killOnMail.fill(false);
  for (const at of [TO, TO + HOUR]) await liveHour(at, null);
  await Promise.all(processes.map((one) => one.end()));

  const clubId = scope.club.id;
  const made = await reader().select().from(sits).where(eq(sits.clubId, clubId));
  const out = await reader().select().from(outings).where(eq(outings.clubId, clubId));
  const steps = await reader().select().from(overdueSteps).where(eq(overdueSteps.clubId, clubId));
  const mails = await reader().select().from(outbox).where(isNotNull(outbox.kind));

  // A season in which nothing happened would prove nothing.
  const count = (status: string) => made.filter((sit) => sit.status === status).length;
  expect(count('booked')).toBeGreaterThan(150);
  expect(count('lapsed')).toBeGreaterThan(20);
  expect(count('cancelled')).toBeGreaterThan(10);
  expect(out.filter((row) => row.moves > 0).length).toBeGreaterThan(10);
  for (const step of ['member', 'officers', 'contact'] as const) {
    expect(steps.filter((row) => row.step === step && row.outcome === 'mailed').length, step).toBeGreaterThan(10);
  }
  const kills = processes.reduce((sum, one) => sum + one.kills, 0);
  expect(kills).toBeGreaterThanOrEqual(KILLS_AT_WORK);

  // Every event has its one mail: booked, cancelled, lapsed, and each step for each of its readers.
  const keys = new Set(mails.map((mail) => mail.dedupeKey));
  const wanted = [
    ...made.map((sit) => `sit.booked:${sit.id}:0`),
    ...made.filter((sit) => sit.status !== 'booked').map((sit) => `sit.${sit.status}:${sit.id}:${sit.sequence}`),
    ...steps
      .filter((step) => step.step === 'member')
      .map((step) => `overdue:${step.id}:${out.find((row) => row.id === step.outingId)?.memberId}`),
    ...steps
      .filter((step) => step.step === 'contact' && step.outcome === 'mailed')
      .map((step) => `overdue:${step.id}:contact`),
  ];
  expect(wanted.filter((key) => !keys.has(key))).toEqual([]);

  // Every mail arrived. One whose process was killed before it heard so was sent again, under the same Message-ID.
  const arrived = servers.flatMap((server) => server.mails.map((mail) => mail.messageId ?? ''));
  expect([...new Set(arrived)].sort()).toEqual(mails.map((mail) => `<${mail.id}@localhost>`).sort());
  expect(mails.filter((mail) => mail.sentAt === null || mail.deadAt !== null)).toEqual([]);
  const again = new Set(arrived.filter((id, i) => arrived.indexOf(id) !== i));
  expect(arrived.length - mails.length).toBeLessThanOrEqual(kills);
  expect([...again].filter((id) => mails.find((mail) => id === `<${mail.id}@localhost>`)?.attempts === 1)).toEqual([]);

  // Nothing is held for a sit that does not stand.
  const held = await reader().select().from(claims).where(eq(claims.clubId, clubId));
  expect(held.filter((row) => made.find((sit) => sit.id === row.sitId)?.status !== 'booked')).toEqual([]);
}, 2_400_000);
