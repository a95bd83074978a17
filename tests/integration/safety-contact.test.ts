import { eq } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { reader } from '@/db/client';
import { safetyContacts } from '@/db/schema';
import { answerContact, readContactAsk } from '@/features/outings/answer-contact';
import type { OutingDetail } from '@/features/outings/data';
import { readSitLink } from '@/features/outings/read-sit-link';
import { saveContact } from '@/features/outings/save-contact';
import { signOut } from '@/features/outings/sign-out';
import { revokeSitLinks, shareSit } from '@/features/outings/sit-links';
import { tellOverdue } from '@/features/outings/tell-overdue';
import { setClock } from '@/server/clock';
import { refusal, smallClub } from '../helpers/book';
import { addMember, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { HOUR, MINUTE } from '../helpers/outings';
import { agree, asUser, lastMail, overdueKinds, secretIn, stageOverdue } from '../helpers/overdue';

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

describe('the safety contact', () => {
  it('is asked, may say yes, and later no; the member is told each time', async () => {
    const secret = await agree(ann);
    expect(await readContactAsk(secret, TEST_NOW + 400 * 24 * HOUR)).toMatchObject({ answer: 'yes' });
    expect(await lastMail('contact.answered')).toContain('has agreed');
    await answerContact({ secret, answer: 'no' }, TEST_NOW + 1);
    expect(await lastMail('contact.answered')).toContain('does not want');
    await tellOverdue(due + HOUR);
    expect(await overdueKinds(club.id)).not.toContain('overdue.contact');
    const again = refusal(saveContact(asUser(ann), { name: 'May', email: 'wife@example.test' }, TEST_NOW + 2));
    expect((await again).more.fields).toHaveProperty('email');
  });

  it('cannot answer by a link that is too old, made up, or of an earlier asking', async () => {
    await saveContact(asUser(ann), { name: 'May', email: 'wife@example.test' }, TEST_NOW);
    const old = secretIn(await lastMail('contact.asked'), 'contact');
    const late = answerContact({ secret: old, answer: 'yes' }, TEST_NOW + 14 * 24 * HOUR);
    expect((await refusal(late)).code).toBe('not_found');
    await saveContact(asUser(ann), { name: 'Joe', email: 'joe@example.test' }, TEST_NOW + 1);
    expect((await refusal(answerContact({ secret: old, answer: 'yes' }, TEST_NOW + 2))).code).toBe('not_found');
    const madeUp = answerContact({ secret: 'a'.repeat(32), answer: 'yes' }, TEST_NOW + 2);
    expect((await refusal(madeUp)).code).toBe('not_found');
  });

  it('is somebody else, is asked only in a confirmed name, five times a day at most, and stays asked on a new name', async () => {
    const own = refusal(saveContact(asUser(ann), { name: 'Me', email: ann.email }, TEST_NOW));
    expect((await own).more.fields).toHaveProperty('email');
    const unconfirmed = { ...asUser(ann), emailVerifiedAt: null };
    expect((await refusal(saveContact(unconfirmed, { name: 'X', email: 'x@example.test' }, TEST_NOW))).code).toBe(
      'conflict',
    );
    await agree(ann);
    expect(await saveContact(asUser(ann), { name: 'May R', email: 'wife@example.test' }, TEST_NOW)).toEqual({
      asked: false,
    });
    for (const n of [2, 3, 4, 5]) await saveContact(asUser(ann), { name: 'N', email: `n${n}@example.test` }, TEST_NOW);
    const sixth = saveContact(asUser(ann), { name: 'N', email: 'n6@example.test' }, TEST_NOW);
    expect((await refusal(sixth)).code).toBe('limit');
    const [row] = await reader().select().from(safetyContacts).where(eq(safetyContacts.userId, ann.userId));
    expect(row).toMatchObject({ email: 'n5@example.test', consentedAt: null });
  });
});

describe('the page without an account', () => {
  it('shows the one sit and its facts, no position by default, and little once the person is out', async () => {
    await agree(ann);
    await tellOverdue(due + 30 * MINUTE);
    const secret = secretIn(await lastMail('overdue.contact'), 'overdue');
    const shown = await readSitLink(secret, due + HOUR);
    expect(shown).toMatchObject({ memberName: 'Ann Roe', state: 'overdue', place: null, mayStop: true });
    expect(JSON.stringify(shown)).toContain('grey truck, GA 123');
    expect(JSON.stringify(shown)).not.toMatch(/@|34\.1|-84/);
    expect(shown?.told).toHaveLength(3);
    await signOut(ann.scope, { outingId: outing.id }, due + HOUR);
    expect(await readSitLink(secret, due + 2 * HOUR)).toMatchObject({ state: 'out', facts: [], told: [], place: null });
  });

  it('shows the position only where the club says so', async () => {
    await setUp({ overdueShowsPlace: true });
    const { url } = await shareSit(ann.scope, { outingId: outing.id }, outing.signedInAt);
    const shown = await readSitLink(secretIn(url, 'overdue'), outing.signedInAt);
    expect(shown?.place).toMatchObject({ lon: -84 });
    expect(shown?.mayStop).toBe(false);
  });

  it('is made for oneself only, ends three days after the back-by, and can be turned off', async () => {
    expect((await refusal(shareSit(officer.scope, { outingId: outing.id }, due))).code).toBe('forbidden');
    const secret = secretIn((await shareSit(ann.scope, { outingId: outing.id }, outing.signedInAt)).url, 'overdue');
    expect(await readSitLink(secret, outing.backBy + 72 * HOUR - 1)).not.toBeNull();
    expect(await readSitLink(secret, outing.backBy + 72 * HOUR)).toBeNull();
    expect(await readSitLink('b'.repeat(32), due)).toBeNull();
    const stranger = (await smallClub()).ann;
    expect((await refusal(revokeSitLinks(stranger.scope, { outingId: outing.id }, due))).code).toBe('not_found');
    const other = await addMember(club);
    expect((await refusal(revokeSitLinks(other.scope, { outingId: outing.id }, due))).code).toBe('forbidden');
    expect(await revokeSitLinks(officer.scope, { outingId: outing.id }, due)).toEqual({ revoked: 1 });
    expect(await readSitLink(secret, due)).toBeNull();
  });

  it("lets a contact stop by the overdue mail's link, and nobody by a shared one", async () => {
    await agree(ann);
    await tellOverdue(due + 30 * MINUTE);
    const shared = secretIn((await shareSit(ann.scope, { outingId: outing.id }, due)).url, 'overdue');
    expect((await refusal(answerContact({ secret: shared, answer: 'no' }, due))).code).toBe('not_found');
    const secret = secretIn(await lastMail('overdue.contact'), 'overdue');
    await answerContact({ secret, answer: 'no' }, due + HOUR);
    const [row] = await reader().select().from(safetyContacts).where(eq(safetyContacts.userId, ann.userId));
    expect(row).toMatchObject({ consentedAt: null, declinedAt: due + HOUR });
  });
});
