import { eq } from 'drizzle-orm';
import { simpleParser } from 'mailparser';
import { describe, expect, it } from 'vitest';
import { makeKeptMail } from '@/adapters/mail/kept';
import { GET as unsubscribeGet, POST as unsubscribePost } from '@/app/api/unsubscribe/[secret]/route';
import { saveChoicesAction } from '@/app/clubs/[club]/notices/actions';
import { swapSitAction } from '@/app/clubs/[club]/notices/swap/[sit]/actions';
import { DEFAULT_NOTICE_CHOICES, type NoticeKind } from '@/core/notices/notice-kinds';
import { reader, write } from '@/db/client';
import { closures, outbox, sitOutlooks } from '@/db/schema';
import { changeSit } from '@/features/bookings/change-sit';
import { findSit } from '@/features/bookings/data';
import { saveRules } from '@/features/clubs/save-club';
import { insertClosure } from '@/features/ground/closures-data';
import { sendDueMail } from '@/features/mail/send-due-mail';
import { findChoices, putChoices } from '@/features/notices/choices-data';
import { readSwap } from '@/features/notices/read-swap';
import { remindEvening } from '@/features/notices/remind-evening';
import { sendWeekly, weekdayOf } from '@/features/notices/send-weekly';
import { tellRested } from '@/features/notices/tell-rested';
import { tellRulesChanged } from '@/features/notices/tell-rules-changed';
import { type ForecastOf, tellWindTurned } from '@/features/notices/tell-wind-turned';
import { readNoticeLink } from '@/features/notices/unsubscribe';
import { setClock } from '@/server/clock';
import { book, SATURDAY } from '../helpers/book';
import { addMember, TEST_NOW, type TestMember } from '../helpers/make-club';
import { inRequest, newBrowser } from '../helpers/request';
import { eachSitsClub, HOUR, steady } from '../helpers/sits-club';

const made = eachSitsClub();

/** A steady wind as a forecast fetched so many hours after the first. */
const windAt =
  (fromDeg: number, hours: number): ForecastOf =>
  async () => {
    const kept = steady(fromDeg);
    if (!kept.forecast) throw new Error('no forecast was made');
    return { ...kept, forecast: { ...kept.forecast, fetchedAt: TEST_NOW + hours * HOUR } };
  };

const mails = async (kind?: NoticeKind) => {
  const rows = await reader().select().from(outbox).where(eq(outbox.clubId, made.club.id)).orderBy(outbox.createdAt);
  return rows.filter((row) => (kind ? row.kind === `notice.${kind}` : row.kind.startsWith('notice.')));
};

const choose = (who: TestMember, more: Partial<typeof DEFAULT_NOTICE_CHOICES>) =>
  write((tx) =>
    putChoices(
      tx,
      { clubId: who.scope.club.id, memberId: who.id, now: TEST_NOW },
      { ...DEFAULT_NOTICE_CHOICES, ...more },
    ),
  );

describe('the wind turns on a booked sit', () => {
  it('is told once for each change, with what was thought before, and the best free stand in its place', async () => {
    const { ann, west } = made;
    const sit = await book(ann, west);
    await tellWindTurned(TEST_NOW, windAt(270, 0));
    await tellWindTurned(TEST_NOW + HOUR, windAt(275, 1));
    expect(await mails()).toEqual([]);
    await tellWindTurned(TEST_NOW + 2 * HOUR, windAt(90, 2));
    // The same forecast again, and the same wind in a newer one.
    await tellWindTurned(TEST_NOW + 2 * HOUR + 60_000, windAt(90, 2));
    await tellWindTurned(TEST_NOW + 3 * HOUR, windAt(92, 3));
    const [mail, ...more] = await mails();
    expect(more).toEqual([]);
    expect(mail).toMatchObject({ kind: 'notice.wind_turned', toEmail: ann.email });
    expect(mail?.subject).toBe('Wind turned: West Oak, Sat 7 Nov, morning');
    const text = mail?.message?.text ?? '';
    expect(text).toMatch(/Before: W wind, in its good winds \d+ % of the sit; quiet \d+/);
    expect(text).toMatch(/Now: E wind, in its good winds \d+ % of the sit; quiet \d+/);
    expect(text).toMatch(/Best free in its place: East Oak: E wind/);
    expect(text).toContain(`/clubs/${made.club.slug}/notices/swap/${sit.id}`);
    // Back to the west and east again: a second change.
    await tellWindTurned(TEST_NOW + 4 * HOUR, windAt(270, 4));
    await tellWindTurned(TEST_NOW + 5 * HOUR, windAt(90, 5));
    expect(await mails()).toHaveLength(2);
  });

  it('says nothing when it was booked on a wind known to be wrong, nor after the sit was moved', async () => {
    const { ann, west, east } = made;
    const wrong = await book(ann, east);
    await tellWindTurned(TEST_NOW, windAt(270, 0));
    await tellWindTurned(TEST_NOW + HOUR, windAt(268, 1));
    expect(await mails()).toEqual([]);
    const { day, windows, weapon, approachId, guests, note } = wrong;
    const to = { day, windows, weapon, approachId, guests, note };
    await changeSit(ann.scope, { ...to, sitId: wrong.id, sequence: 0, standId: west }, TEST_NOW + HOUR);
    await tellWindTurned(TEST_NOW + 2 * HOUR, windAt(90, 2));
    expect(await mails()).toEqual([]);
    await tellWindTurned(TEST_NOW + 3 * HOUR, windAt(270, 3));
    await tellWindTurned(TEST_NOW + 4 * HOUR, windAt(90, 4));
    expect((await mails()).map(({ toEmail }) => toEmail)).toEqual([ann.email]);
  });

  it('keeps to the points a member chose, and to their no', async () => {
    const { ann, west } = made;
    const sit = await book(ann, west);
    await choose(ann, { kinds: [] });
    await tellWindTurned(TEST_NOW, windAt(270, 0));
    await tellWindTurned(TEST_NOW + HOUR, windAt(90, 1));
    expect(await mails()).toEqual([]);
    const [kept] = await reader().select().from(sitOutlooks).where(eq(sitOutlooks.sitId, sit.id));
    expect(kept?.told).toBe(1);
  });

  it('waits for the end of quiet hours, but not past two hours before the sit', async () => {
    const { ann, west } = made;
    const sit = await book(ann, west);
    await tellWindTurned(TEST_NOW, windAt(270, 0));
    // 23:00 at the club on Thursday: held until five.
    const night = Date.UTC(2026, 10, 6, 4);
    await tellWindTurned(night, windAt(90, 24));
    expect((await mails())[0]?.nextAttemptAt).toBe(Date.UTC(2026, 10, 6, 10));
    await tellWindTurned(night + HOUR, windAt(270, 25));
    // 23:30 on the eve, with quiet hours far into the sit.
    await choose(ann, { quietTo: '09:00' });
    const eve = Date.UTC(2026, 10, 7, 4, 30);
    await tellWindTurned(eve, windAt(90, 48));
    expect((await mails())[1]?.nextAttemptAt).toBe(sit.startAt - 2 * HOUR);
  });

  it('is told once by two runs at the same moment', async () => {
    const { ann, west } = made;
    await book(ann, west);
    await tellWindTurned(TEST_NOW, windAt(270, 0));
    await Promise.all([1, 2, 3].map(() => tellWindTurned(TEST_NOW + HOUR, windAt(90, 1))));
    expect(await mails()).toHaveLength(1);
  });
});

describe('the swap', () => {
  const swap = (who: TestMember, values: { sitId: string; standId: string; sequence?: number }) =>
    inRequest(who.browser, () => swapSitAction(made.club.slug, { sequence: 0, approachId: null, ...values }));

  it('moves the sit in one tap and keeps the rest of it', async () => {
    const { ann, west, east } = made;
    const sit = await book(ann, west, { note: 'Out by noon.' });
    expect(await swap(ann, { sitId: sit.id, standId: east })).toMatchObject({
      ok: true,
      data: { standName: 'East Oak' },
    });
    expect(await findSit(ann.scope, sit.id)).toMatchObject({ standId: east, note: 'Out by noon.', sequence: 1 });
  });

  it('is checked like any booking: a stand taken or closed since then is refused', async () => {
    const { ann, bert, west, east } = made;
    const sit = await book(ann, west);
    await book(bert, east);
    const taken = await swap(ann, { sitId: sit.id, standId: east });
    expect(taken.ok ? '' : taken.error.message).toContain('Bert Hale');
    expect(await findSit(ann.scope, sit.id)).toMatchObject({ standId: west });
  });

  it("is for one's own sit: another member sees nothing and moves nothing", async () => {
    const { ann, bert, west, east } = made;
    const sit = await book(ann, west);
    expect(await readSwap(bert.scope, sit.id, TEST_NOW)).toBeNull();
    expect(await swap(bert, { sitId: sit.id, standId: east })).toMatchObject({
      ok: false,
      error: { code: 'forbidden' },
    });
  });
});

describe('the evening before', () => {
  const evening = Date.UTC(2026, 10, 6, 23, 10);

  it('tells when to leave, by which way and in what light, once', async () => {
    const { ann, bert, west, east } = made;
    await book(ann, west);
    await book(bert, east, { day: '2026-11-09' });
    await remindEvening(evening - 2 * HOUR);
    expect(await mails()).toEqual([]);
    await remindEvening(evening);
    await remindEvening(evening + 600_000);
    const [mail, ...more] = await mails('evening_before');
    expect(more).toEqual([]);
    expect(mail?.toEmail).toBe(ann.email);
    const text = mail?.message?.text ?? '';
    expect(text).toMatch(/Leave by: \d+:\d\d AM/);
    expect(text).toMatch(/Way in: Creek way, \d+ min; in by \d+:\d\d AM/);
    expect(text).toMatch(/Sun: up 7:0\d AM/);
    expect(text).toContain('Harness on from ground to ground');
  });

  it('tells a guest no name of a feature', async () => {
    const { club, ann, west } = made;
    const dates = { sponsorId: ann.id, guestFrom: '2026-11-01', guestTo: '2026-11-30' };
    const guest = await addMember(club, 'guest', { name: 'Gil Fern', ...dates });
    await book(guest, west);
    await remindEvening(evening);
    const mail = (await mails('evening_before')).find(({ toEmail }) => toEmail === guest.email);
    expect(mail?.message?.text).toContain('West Oak');
    expect(mail?.message?.text).not.toContain('Hidden Hollow');
  });
});

describe('the other notices', () => {
  it('tells of a stand on the first day after its rest, to those who asked, and not while it is closed', async () => {
    const { ann, bert, west } = made;
    await choose(ann, { kinds: ['rest_over'] });
    await book(bert, west);
    // Saturday's sit and three full days of rest: ready on Wednesday 11 November (facts of the trade).
    const at = (day: number) => Date.UTC(2026, 10, day, 13);
    await tellRested(at(10));
    expect(await mails('rest_over')).toEqual([]);
    await tellRested(at(11));
    await tellRested(at(11) + HOUR);
    await tellRested(at(12));
    expect((await mails('rest_over')).map(({ toEmail, subject }) => [toEmail, subject])).toEqual([
      [ann.email, 'Rested: West Oak'],
    ]);
  });

  it('says nothing of a rested stand that is closed', async () => {
    const { ann, bert, west } = made;
    await choose(ann, { kinds: ['rest_over'] });
    await book(bert, west);
    const closed = { standId: west, fromDay: SATURDAY, toDay: null, reason: 'Loose strap' };
    await write((tx) => insertClosure(bert.scope, tx, { ...closed, id: `cls_${west}`, createdAt: TEST_NOW }));
    expect(await reader().select().from(closures).where(eq(closures.standId, west))).toHaveLength(1);
    await tellRested(Date.UTC(2026, 10, 11, 13));
    expect(await mails('rest_over')).toEqual([]);
  });

  it('tells everyone but its author once of a changed rule', async () => {
    const { club, ann, bert } = made;
    const admin = await addMember(club, 'admin', { name: 'Ada Admin' });
    const rules = { ...admin.scope.club.rules, restDaysDefault: 5 };
    await saveRules(admin.scope, { version: admin.scope.club.version, rules }, TEST_NOW);
    await tellRulesChanged(TEST_NOW + 60_000);
    await tellRulesChanged(TEST_NOW + 120_000);
    const sent = await mails('rules_changed');
    expect(sent.map(({ toEmail }) => toEmail).sort()).toEqual([ann.email, bert.email].sort());
    expect(sent[0]?.message?.text).toContain('Ada Admin changed the rules');
    expect(sent[0]?.message?.text).toMatch(/before: .*3[\s\S]*now: .*5/);
  });

  it('writes the week ahead on Thursday evening, once', async () => {
    const { ann, west } = made;
    await choose(ann, { kinds: ['weekly'] });
    await book(ann, west);
    // 5 November 2026 is a Thursday (calendar).
    expect(weekdayOf('2026-11-05')).toBe(4);
    await sendWeekly(Date.UTC(2026, 10, 4, 23, 30));
    await sendWeekly(Date.UTC(2026, 10, 5, 23, 30));
    await sendWeekly(Date.UTC(2026, 10, 6, 0, 30));
    const [mail, ...more] = await mails('weekly');
    expect(more).toEqual([]);
    expect(mail?.message?.text).toContain('West Oak: Sat 7 Nov, morning');
  });
});

describe('stopping mail', () => {
  async function windMail() {
    const { ann, west } = made;
    await book(ann, west);
    await tellWindTurned(TEST_NOW, windAt(270, 0));
    await tellWindTurned(TEST_NOW + HOUR, windAt(90, 1));
    const raws: string[] = [];
    const port = makeKeptMail('Windrest <windrest@club.test>', async ({ raw, subject }) => {
      if (subject.startsWith('Wind turned')) raws.push(raw);
    });
    setClock(() => TEST_NOW + 2 * HOUR);
    await sendDueMail(TEST_NOW + 2 * HOUR, port);
    setClock(() => TEST_NOW);
    const mail = await simpleParser(raws.at(-1) ?? '');
    const secret = /unsubscribe\/([\w-]+)/.exec(mail.text ?? '')?.[1] ?? '';
    return { ann, mail, secret, raw: raws.at(-1) ?? '' };
  }
  const press = (secret: string) =>
    inRequest(newBrowser(), () =>
      unsubscribePost(
        new Request(`http://127.0.0.1/api/unsubscribe/${secret}`, {
          method: 'POST',
          body: new URLSearchParams({ 'List-Unsubscribe': 'One-Click' }),
        }),
        { params: Promise.resolve({ secret }) },
      ),
    );

  it('carries the two headers of RFC 8058, and the same words as text and as HTML', async () => {
    const { mail, raw, secret } = await windMail();
    expect(secret).not.toBe('');
    const unfolded = raw.replace(/\r\n[ \t]+/g, ' ');
    expect(unfolded).toMatch(/^List-Unsubscribe-Post: List-Unsubscribe=One-Click$/m);
    expect(unfolded).toMatch(new RegExp(`^List-Unsubscribe: <https?://[^>]+/api/unsubscribe/${secret}>`, 'm'));
    expect(mail.text).toContain('Before: W wind');
    expect(mail.html).toContain('W wind');
    expect(mail.html).toContain(`/unsubscribe/${secret}`);
  });

  it('is done by one press without an account, for that kind alone, and any number of times', async () => {
    const { ann, secret } = await windMail();
    expect((await press(secret)).status).toBe(204);
    expect((await press(secret)).status).toBe(204);
    const { kinds } = await findChoices(ann.scope, ann.id);
    expect(kinds).toEqual(['evening_before', 'rules_changed', 'draw_changed']);
    expect(await readNoticeLink(secret)).toMatchObject({ kind: 'wind_turned', stopped: true });
  });

  it('is not done by opening the address', async () => {
    const { ann, secret } = await windMail();
    const response = await inRequest(newBrowser(), () =>
      unsubscribeGet(new Request('http://127.0.0.1/here'), { params: Promise.resolve({ secret }) }),
    );
    expect([response.status, response.headers.get('location')]).toEqual([
      303,
      expect.stringContaining(`/unsubscribe/${secret}`),
    ]);
    expect((await findChoices(ann.scope, ann.id)).kinds).toContain('wind_turned');
  });

  it('knows no secret that was never mailed', async () => {
    expect((await press('x'.repeat(32))).status).toBe(404);
  });

  it('is chosen on the page too, and what is chosen is kept', async () => {
    const { ann } = made;
    const form = { kinds: ['weekly' as const], windPoints: '20', quietFrom: '22:00', quietTo: '06:00' };
    const saved = await inRequest(ann.browser, () => saveChoicesAction(made.club.slug, form));
    expect(saved).toMatchObject({ ok: true });
    expect(await findChoices(ann.scope, ann.id)).toEqual({ ...form, windPoints: 20 });
    const wrong = await inRequest(ann.browser, () => saveChoicesAction(made.club.slug, { ...form, quietTo: '25:00' }));
    expect(wrong.ok ? null : wrong.error.fields?.quietTo).toBe('Give a time.');
  });
});
