import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { makeSmtpMail } from '@/adapters/mail/smtp';
import { reader, write } from '@/db/client';
import { auditLog, memberships, outbox, users } from '@/db/schema';
import { cancelSitsOf } from '@/features/bookings/cancel-sits-of';
import { sendDueMail } from '@/features/mail/send-due-mail';
import type { OutingDetail } from '@/features/outings/data';
import { moveBackBy } from '@/features/outings/move-back-by';
import { readSitLink } from '@/features/outings/read-sit-link';
import { saveContact, switchContact } from '@/features/outings/save-contact';
import { signOut } from '@/features/outings/sign-out';
import { tellOverdue } from '@/features/outings/tell-overdue';
import { setClock } from '@/server/clock';
import { systemScopeById } from '@/server/scope';
import { book, smallClub } from '../helpers/book';
import { TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { goIn, HOUR, MINUTE, outingRows } from '../helpers/outings';
import { agree, asUser, lastMail, overdueKinds, secretIn, stageOverdue } from '../helpers/overdue';
import { serveSmtp, type TestSmtp } from '../helpers/smtp-server';

let club: TestClub;
let ann: TestMember;
let officer: TestMember;
let outing: OutingDetail;
let due: number;

async function setUp(...how: Parameters<typeof stageOverdue>) {
  ({ club, ann, officer, outing, due } = await stageOverdue(...how));
}

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(() => setUp());

describe('the steps', () => {
  it('go to the member, then officers, then the contact who agreed: one mail each, whoever runs them', async () => {
    await agree(ann);
    await tellOverdue(due - 1);
    expect(await overdueKinds(club.id)).toEqual([]);
    await Promise.all([tellOverdue(due), tellOverdue(due), tellOverdue(due + 1)]);
    expect(await overdueKinds(club.id)).toEqual(['overdue.member']);
    await tellOverdue(due + 15 * MINUTE - 1);
    expect(await overdueKinds(club.id)).toHaveLength(1);
    await tellOverdue(due + 15 * MINUTE);
    await tellOverdue(due + 29 * MINUTE);
    expect(await overdueKinds(club.id)).toEqual(['overdue.member', 'overdue.officers']);
    await tellOverdue(due + 30 * MINUTE);
    await tellOverdue(due + 300 * HOUR);
    expect(await overdueKinds(club.id)).toEqual(['overdue.member', 'overdue.officers', 'overdue.contact']);
    const { mail, steps } = await outingRows(club.id);
    expect(mail.filter((one) => /overdue/.test(one.kind)).map((one) => one.toEmail)).toEqual([
      ann.email,
      officer.email,
      'wife@example.test',
    ]);
    expect(steps.map((row) => [row.step, row.outcome])).toEqual([
      ['member', 'mailed'],
      ['officers', 'mailed'],
      ['contact', 'mailed'],
    ]);
    const told = await reader().select().from(auditLog).where(eq(auditLog.subjectId, outing.id));
    expect(told.filter((entry) => entry.action === 'outing.told')).toHaveLength(3);
  });

  it('that were missed while nothing ran are all taken at once, over midnight and over the change of clocks', async () => {
    await agree(ann);
    await tellOverdue(due + 200 * HOUR);
    expect(await overdueKinds(club.id)).toEqual(['overdue.member', 'overdue.officers', 'overdue.contact']);
    const { club: other, ann: night, oak } = await smallClub({ backByMinutes: 60 });
    // The US puts clocks back on 1 November 2026 at 2:00: 1:30 comes twice that night, 25 hours after the one before.
    const evening = await book(night, oak, { day: '2026-10-31', windows: 'evening' }, Date.UTC(2026, 9, 31, 20));
    const late = await goIn(night, evening.id, Date.UTC(2026, 9, 31, 21), { backBy: '01:30' });
    expect(late.backBy).toBe(Date.UTC(2026, 10, 1, 5, 30));
    await tellOverdue(late.backBy + HOUR - 1);
    const rows = async () => (await outingRows(other.id)).steps.map((row) => row.step);
    expect(await rows()).toEqual([]);
    await tellOverdue(late.backBy + HOUR);
    expect(await rows()).toEqual(['member']);
  });

  it('start anew from a moved back-by; those told hear of it, and of the sign-out that alone ends it', async () => {
    await agree(ann);
    await tellOverdue(due + 30 * MINUTE);
    const moved = await moveBackBy(
      ann.scope,
      { outingId: outing.id, minutes: '60', tracking: true },
      due + 40 * MINUTE,
    );
    const told = async (kind: string) =>
      (await outingRows(club.id)).mail.filter((one) => one.kind === kind).map((one) => one.toEmail);
    expect(await told('overdue.moved')).toEqual([officer.email, 'wife@example.test']);
    expect(await lastMail('overdue.moved')).toContain('tracking a deer');
    await tellOverdue(moved.backBy + HOUR - 1);
    expect(await told('overdue.member')).toHaveLength(1);
    await tellOverdue(moved.backBy + HOUR);
    await tellOverdue(moved.backBy + HOUR);
    expect(await told('overdue.member')).toHaveLength(2);
    await signOut(officer.scope, { outingId: outing.id }, moved.backBy + HOUR + 1);
    expect(await told('overdue.out')).toEqual([officer.email, 'wife@example.test']);
    await tellOverdue(moved.backBy + 500 * HOUR);
    expect(await told('overdue.officers')).toHaveLength(1);
  });

  it('tell nobody of a sign-out when only the member was told', async () => {
    await tellOverdue(due);
    await signOut(ann.scope, { outingId: outing.id }, due + 1);
    expect(await overdueKinds(club.id)).toEqual(['overdue.member']);
  });

  it('skip a contact who has not agreed, is switched off, or is left out this time, and tell officers so', async () => {
    const outcome = async () =>
      (await outingRows(club.id)).steps.filter((row) => row.step === 'contact').map((row) => row.outcome);
    await saveContact(asUser(ann), { name: 'May Roe', email: 'wife@example.test' }, TEST_NOW);
    await tellOverdue(due + HOUR);
    expect(await outcome()).toEqual(['no_consent']);
    expect(await lastMail('overdue.officers')).toContain('no safety contact who agreed');
    await setUp();
    await agree(ann);
    await switchContact(asUser(ann), { off: true }, TEST_NOW);
    await tellOverdue(due + HOUR);
    expect(await outcome()).toEqual(['off']);
    await setUp({}, true);
    await agree(ann);
    await tellOverdue(due + HOUR);
    expect(await outcome()).toEqual(['off']);
    expect(await overdueKinds(club.id)).toEqual(['overdue.member', 'overdue.officers']);
  });

  it('go on when the sit is cancelled from under the person, or they are removed from the club', async () => {
    const scope = await systemScopeById(club.id);
    await write((tx) => cancelSitsOf(tx, scope, ann.id, 'removed', outing.signedInAt + 1));
    await write((tx) =>
      tx
        .update(memberships)
        .set({ removedAt: due - 1 })
        .where(eq(memberships.id, ann.id)),
    );
    await tellOverdue(due + 15 * MINUTE);
    expect(await overdueKinds(club.id)).toEqual(['overdue.member', 'overdue.officers']);
    await signOut(officer.scope, { outingId: outing.id }, due + HOUR);
    await tellOverdue(due + 9 * HOUR);
    expect(await overdueKinds(club.id)).not.toContain('overdue.contact');
  });

  it('say so where there is no other officer', async () => {
    await write((tx) =>
      tx
        .update(memberships)
        .set({ removedAt: due - 1 })
        .where(eq(memberships.id, officer.id)),
    );
    await tellOverdue(due + 15 * MINUTE);
    expect((await outingRows(club.id)).steps.map((row) => row.outcome)).toEqual(['mailed', 'nobody']);
  });
});

describe('over a real mail server', () => {
  let smtp: TestSmtp;
  beforeAll(async () => {
    smtp = await serveSmtp();
  });
  afterAll(() => smtp.close());

  it('an overdue mail arrives whole: stand, way in, parking, vehicle, last sign, and its link', async () => {
    await agree(ann);
    await write((tx) => tx.delete(outbox));
    await write((tx) => tx.update(users).set({ name: 'Änn "Roe"' }).where(eq(users.id, ann.userId)));
    await tellOverdue(due + 30 * MINUTE);
    await sendDueMail(due + 30 * MINUTE, makeSmtpMail({ url: smtp.url, from: 'Windrest <windrest@localhost>' }));
    const mails = smtp.mails.filter((mail) => mail.subject?.startsWith('Overdue'));
    expect(mails).toHaveLength(2);
    expect(smtp.mails).toHaveLength(3);
    const mail = mails.find((one) => JSON.stringify(one.to).includes('wife@example.test'));
    expect(mail?.subject).toBe(`Overdue: Änn "Roe", ${(await systemScopeById(club.id)).club.name}`);
    for (const words of ['Oak Ladder', 'Way in', 'Parked at', 'grey truck, GA 123', 'Signed in', 'Last sign']) {
      expect(mail?.text).toContain(words);
      expect(mail?.html).toContain(words);
    }
    expect(mail?.text).toContain('no rescue service');
    expect(mail?.headerLines.map((line) => line.line)).toContain('Importance: high');
    expect(await readSitLink(secretIn(mail?.text ?? '', 'overdue'), due + HOUR)).toMatchObject({ state: 'overdue' });
    const left = await reader().select().from(outbox).where(eq(outbox.clubId, club.id));
    expect(left.filter((row) => row.sentAt === null || row.message !== null)).toEqual([]);
  });
});
