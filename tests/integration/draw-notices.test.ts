import { and, eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { DEFAULT_NOTICE_CHOICES, type NoticeChoices } from '@/core/notices/notice-kinds';
import { reader, write } from '@/db/client';
import { drawResults, noticeLinks, outbox } from '@/db/schema';
import type { OpenDrawInput } from '@/features/draws/draw-schema';
import { enterDraw } from '@/features/draws/enter-draw';
import { cancelDraw, openDraw } from '@/features/draws/open-draw';
import { publishDraw } from '@/features/draws/publish-draw';
import { runDraw } from '@/features/draws/run-draw';
import { acceptSwap, offerSwap } from '@/features/draws/swap-sits';
import { putChoices } from '@/features/notices/choices-data';
import { kindsFor } from '@/features/notices/kinds-for';
import { tellDraws } from '@/features/notices/tell-draws';
import { setClock } from '@/server/clock';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { near } from '../helpers/sits-club';

const DAY = '2026-11-10';
const MINUTE = 60_000;
/** Entries closed the evening before. */
const AFTER = TEST_NOW + 4 * 86_400_000;

let club: TestClub;
let admin: TestMember;
let ada: TestMember;
let ben: TestMember;
let cal: TestMember;
let creek: string;
let ridge: string;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub();
  admin = await addMember(club, 'admin', { name: 'Fay Admin' });
  ada = await addMember(club, 'member', { name: 'Ada' });
  ben = await addMember(club, 'member', { name: 'Ben' });
  cal = await addMember(club, 'member', { name: 'Cal' });
  const guestDates = { sponsorId: ada.id, guestFrom: '2026-11-01', guestTo: '2026-11-30' };
  await addMember(club, 'guest', { name: 'Gil Guest', ...guestDates });
  await addMember(club, 'landowner', { name: 'Lee Owner' });
  creek = await addStand(club, { name: 'Creek', ...near(0) });
  ridge = await addStand(club, { name: 'Ridge', ...near(0.02) });
});

const mails = async () =>
  (await reader().select().from(outbox).where(eq(outbox.clubId, club.id)).orderBy(outbox.createdAt)).filter(
    ({ kind }) => kind === 'notice.draw_changed',
  );
/** Subjects that begin so, by who got them. */
const told = async (start: string) =>
  (await mails())
    .filter(({ subject }) => subject.startsWith(start))
    .map(({ toEmail }) => toEmail)
    .sort();
const emails = (...who: TestMember[]) => who.map(({ email }) => email).sort();

const choose = (who: TestMember, more: Partial<NoticeChoices>) =>
  write((tx) =>
    putChoices(tx, { clubId: club.id, memberId: who.id, now: TEST_NOW }, { ...DEFAULT_NOTICE_CHOICES, ...more }),
  );

async function open(more: Partial<OpenDrawInput> = {}, now = TEST_NOW): Promise<string> {
  const points = { pointsPerMiss: 1, resetOnGiven: true, workHoursPerPoint: 0 };
  const closes = { closesDay: '2026-11-07', closesClock: '17:00' };
  const what = { slots: [{ day: DAY, windows: 'morning' as const }], standIds: [creek, ridge], note: 'Opening day.' };
  return (await openDraw(admin.scope, { ...what, ...closes, ...points, ...more }, now)).id;
}

/** Three want two stands; the sums share them out and an officer publishes. */
async function publish(): Promise<{ drawId: string; won: TestMember[]; lost: TestMember }> {
  const drawId = await open();
  for (const who of [ada, ben, cal]) {
    const wishes = {
      drawId,
      weapon: 'bow' as const,
      slots: [0],
      choices: [creek, ridge],
      anyByScore: false,
      guests: [],
    };
    await enterDraw(who.scope, wishes, TEST_NOW);
  }
  setClock(() => AFTER);
  await runDraw(admin.scope, drawId, AFTER);
  await publishDraw(admin.scope, drawId, AFTER);
  const entries = await reader().select().from(drawResults).where(eq(drawResults.drawId, drawId));
  const standOf = (who: TestMember) => entries.find(({ memberId }) => memberId === who.id)?.standId ?? null;
  const won = [ada, ben, cal].filter((who) => standOf(who) !== null);
  const lost = [ada, ben, cal].find((who) => standOf(who) === null);
  if (won.length !== 2 || !lost) throw new Error('two of three were to draw a stand');
  return { drawId, won, lost };
}

describe('notices of draws', () => {
  it('tell those who may enter that one opened, once, but not whoever opened it', async () => {
    const drawId = await open();
    await tellDraws(TEST_NOW + MINUTE);
    await tellDraws(TEST_NOW + 11 * MINUTE);
    await Promise.all([1, 2].map(() => tellDraws(TEST_NOW + 21 * MINUTE)));
    const sent = await mails();
    expect(sent.map(({ toEmail }) => toEmail).sort()).toEqual(emails(ada, ben, cal));
    expect(sent[0]?.subject).toBe('Draw open: Tue 10 Nov, morning');
    const text = sent[0]?.message?.text ?? '';
    expect(text).toContain('Fay Admin opened the draw');
    expect(text).toContain('Entries close: Sat 7 Nov 2026, 5:00 PM');
    expect(text).toContain('Note: Opening day.');
    expect(text).toContain(`/clubs/${club.slug}/draws/${drawId}`);
    expect(text).toMatch(/Stop this kind of mail: .*\/unsubscribe\//);
    const links = and(eq(noticeLinks.clubId, club.id), eq(noticeLinks.kind, 'draw_changed'));
    expect(await reader().select().from(noticeLinks).where(links)).toHaveLength(3);
  });

  it('are told once by two runs at the same moment', async () => {
    await open();
    await Promise.all([1, 2, 3].map(() => tellDraws(TEST_NOW + MINUTE)));
    expect(await told('Draw open')).toEqual(emails(ada, ben, cal));
  });

  it('tell each entrant what they drew, or that they drew nothing and why', async () => {
    const { drawId, won, lost } = await publish();
    await tellDraws(AFTER + MINUTE);
    await tellDraws(AFTER + 11 * MINUTE);
    const sent = await mails();
    expect(sent.map(({ toEmail }) => toEmail).sort()).toEqual(emails(ada, ben, cal));
    expect(await told('Drawn: ')).toEqual(emails(...won));
    expect(await told('No stand drawn: Tue 10 Nov, morning')).toEqual([lost.email]);
    const entries = await reader().select().from(drawResults).where(eq(drawResults.drawId, drawId));
    for (const who of [ada, ben, cal]) {
      const entry = entries.find(({ memberId }) => memberId === who.id);
      const text = sent.find(({ toEmail }) => toEmail === who.email)?.message?.text ?? '';
      const name = entry?.standId === creek ? 'Creek' : 'Ridge';
      expect(text).toContain(who === lost ? 'You drew no stand.' : `Your stand: ${name}.`);
      expect(entry?.reasons?.length).toBeGreaterThan(0);
      for (const reason of entry?.reasons ?? []) expect(text).toContain(reason);
      expect(text).toContain(`/clubs/${club.slug}/draws/${drawId}`);
    }
  });

  it('tell that one was called off, and no longer that it opened', async () => {
    const drawId = await open();
    await cancelDraw(admin.scope, drawId, TEST_NOW + MINUTE);
    await tellDraws(TEST_NOW + 2 * MINUTE);
    await tellDraws(TEST_NOW + 12 * MINUTE);
    expect(await told('Draw called off: Tue 10 Nov, morning')).toEqual(emails(ada, ben, cal));
    expect(await mails()).toHaveLength(3);
  });

  it('tell the member a swap is offered to, once however often it is pressed', async () => {
    const { drawId, won } = await publish();
    const [one = ada, two = ben] = won;
    await tellDraws(AFTER + MINUTE);
    await offerSwap(one.scope, { drawId, memberId: two.id, slot: 0 }, AFTER + 2 * MINUTE);
    await tellDraws(AFTER + 3 * MINUTE);
    await offerSwap(one.scope, { drawId, memberId: two.id, slot: 0 }, AFTER + 4 * MINUTE);
    await tellDraws(AFTER + 5 * MINUTE);
    expect(await told('Swap offered: ')).toEqual([two.email]);
    const text = (await mails()).find(({ subject }) => subject.startsWith('Swap'))?.message?.text ?? '';
    expect(text).toMatch(new RegExp(`${one.name} offers you (Creek for your Ridge|Ridge for your Creek), Tue 10 Nov`));
    expect(await mails()).toHaveLength(4);
  });

  it('say nothing of an offer taken before it was told', async () => {
    const { drawId, won } = await publish();
    const [one = ada, two = ben] = won;
    await offerSwap(one.scope, { drawId, memberId: two.id, slot: 0 }, AFTER + MINUTE);
    await acceptSwap(two.scope, { drawId, memberId: one.id, slot: 0 }, AFTER + 2 * MINUTE);
    await tellDraws(AFTER + 3 * MINUTE);
    expect(await told('Swap offered: ')).toEqual([]);
    expect(await told('Drawn: ')).toEqual(emails(...won));
  });

  it('reach nobody who chose them off, whatever happens', async () => {
    for (const who of [ada, ben, cal]) await choose(who, { kinds: ['weekly'] });
    await open({ slots: [{ day: '2026-11-13', windows: 'morning' }] });
    await tellDraws(TEST_NOW + MINUTE);
    expect(await mails()).toEqual([]);
    const { drawId, won } = await publish();
    const [one = ada, two = ben] = won;
    await offerSwap(one.scope, { drawId, memberId: two.id, slot: 0 }, AFTER + MINUTE);
    const next = await open({ slots: [{ day: '2026-11-14', windows: 'morning' }], closesDay: '2026-11-12' }, AFTER);
    await cancelDraw(admin.scope, next, AFTER + MINUTE);
    await choose(cal, { kinds: ['draw_changed'] });
    await tellDraws(AFTER + 2 * MINUTE);
    expect(new Set((await mails()).map(({ toEmail }) => toEmail))).toEqual(new Set([cal.email]));
  });

  it('wait for the end of quiet hours, but not past two hours before entries close', async () => {
    await choose(ada, { quietFrom: '09:00', quietTo: '12:00' });
    // 10:00 at the club; entries close on Saturday at 17:00.
    await choose(ben, { quietFrom: '09:00', quietTo: '08:00' });
    await open();
    await tellDraws(TEST_NOW + MINUTE);
    const at = new Map((await mails()).map((mail) => [mail.toEmail, mail.nextAttemptAt]));
    expect(at.get(ada.email)).toBe(Date.UTC(2026, 10, 4, 17));
    expect(at.get(ben.email)).toBe(Date.UTC(2026, 10, 5, 13));
    // Another whose entries close at 13:00 of the same day.
    await open(
      { slots: [{ day: DAY, windows: 'evening' }], closesDay: '2026-11-04', closesClock: '13:00' },
      TEST_NOW + MINUTE,
    );
    await tellDraws(TEST_NOW + 2 * MINUTE);
    const late = (await mails()).find(({ toEmail, subject }) => toEmail === ben.email && subject.includes('evening'));
    expect(late?.nextAttemptAt).toBe(Date.UTC(2026, 10, 4, 16));
  });

  it('are offered to those who may enter alone', () => {
    expect(kindsFor('member')).toContain('draw_changed');
    expect(kindsFor('guest')).not.toContain('draw_changed');
    expect(kindsFor('landowner')).not.toContain('draw_changed');
  });
});
