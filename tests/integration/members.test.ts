import { and, eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import {
  changeMemberAction,
  inviteAction,
  resendInvitationAction,
  revokeInvitationAction,
} from '@/app/clubs/[club]/club/members/actions';
import { joinAction, joinNewAction } from '@/app/invite/[token]/actions';
import { reader, write } from '@/db/client';
import { auditLog, memberships, users } from '@/db/schema';
import { readInvitation } from '@/features/clubs/read-invitation';
import { readMembers } from '@/features/clubs/read-members';
import { newId } from '@/lib/ids';
import { setClock } from '@/server/clock';
import { findScope } from '@/server/scope';
import { currentUser, startSession } from '@/server/session';
import { book, SATURDAY } from '../helpers/book';
import { invitationsOf, invitationToken, invite, invited } from '../helpers/invite';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest, newBrowser } from '../helpers/request';

const DAY = 24 * 3_600_000;
const PASSWORD = 'quiet oak ridge';

let at = TEST_NOW;
let club: TestClub;
let admin: TestMember;

beforeEach(async () => {
  at = TEST_NOW;
  setClock(() => at);
  club = await makeClub();
  admin = await addMember(club, 'admin', { name: 'Ada Lund' });
});

const asAdmin = <T>(work: () => Promise<T>) => inRequest(admin.browser, work);
const joinAs = (token: string, name = 'Ida Cole', browser = newBrowser()) =>
  inRequest(browser, () => joinNewAction({ token, name, password: PASSWORD }));

/** An account that is in no club yet, with a signed-in browser. */
async function addPerson(email: string) {
  const id = newId('user');
  const row = { id, email, name: 'Nils Berg', passwordHash: 'none', emailVerifiedAt: TEST_NOW, createdAt: TEST_NOW };
  await write((tx) => tx.insert(users).values(row));
  const browser = newBrowser();
  await inRequest(browser, () => startSession(id));
  return { id, browser };
}

describe('an invitation', () => {
  it('leads from the mail to a new account in the club, once', async () => {
    const values = invited({ name: 'Ida C.' });
    const token = await invite(club, admin, values);
    expect(await readInvitation(token, null, at)).toMatchObject({
      kind: 'open',
      email: values.email,
      hasAccount: false,
    });
    expect(JSON.stringify(await invitationsOf(club))).not.toContain(token);

    const browser = newBrowser();
    const answer = await joinAs(token, 'Ida Cole', browser);
    expect(answer).toEqual({ ok: true, data: { slug: club.slug } });
    const user = await inRequest(browser, currentUser);
    expect(user).toMatchObject({ email: values.email, name: 'Ida Cole' });
    expect(user?.emailVerifiedAt).toBe(at);
    expect((await findScope(club.slug, user?.id ?? ''))?.member).toMatchObject({ role: 'member', name: 'Ida Cole' });

    const again = await joinAs(token, 'Eve');
    expect(again).toMatchObject({ ok: false, error: { code: 'invalid' } });
    expect(await readInvitation(token, null, at)).toEqual({ kind: 'dead' });
    expect(await readInvitation(token, user, at)).toMatchObject({ kind: 'in', clubSlug: club.slug });
    const rows = await reader().select().from(auditLog).where(eq(auditLog.clubId, club.id));
    expect(rows.map((row) => row.action).sort()).toEqual(['member.invited', 'member.joined']);
  });

  it('lets a signed-in account join with one press, and back in after it was removed', async () => {
    const values = invited();
    const person = await addPerson(values.email);
    const token = await invite(club, admin, values);
    expect(await readInvitation(token, null, at)).toMatchObject({ kind: 'open', hasAccount: true });
    expect((await joinAs(token)).ok).toBe(false);
    expect(await inRequest(person.browser, () => joinAction({ token }))).toMatchObject({ ok: true });
    await write((tx) => tx.update(memberships).set({ removedAt: at }).where(eq(memberships.userId, person.id)));
    expect(await findScope(club.slug, person.id)).toBeNull();

    const second = await invite(club, admin, { ...values, role: 'steward' });
    expect(await inRequest(person.browser, () => joinAction({ token: second }))).toMatchObject({ ok: true });
    expect((await findScope(club.slug, person.id))?.member.role).toBe('steward');
  });

  it('does not let a signed-out visitor join by the action of accounts', async () => {
    const token = await invite(club, admin, invited());
    const answer = await inRequest(newBrowser(), () => joinAction({ token }));
    expect(answer).toMatchObject({ ok: false, error: { code: 'signed_out' } });
  });

  it('gives the same account to one of two who press at once', async () => {
    const token = await invite(club, admin, invited());
    const answers = await Promise.all([joinAs(token, 'One'), joinAs(token, 'Two')]);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    expect(await readMembers(admin.scope, at)).toHaveLength(2);
  });

  it('is dead after 14 days, when revoked, and when a newer one was sent', async () => {
    const old = invited();
    const oldToken = await invite(club, admin, old);
    at = TEST_NOW + 14 * DAY;
    expect(await readInvitation(oldToken, null, at)).toEqual({ kind: 'dead' });
    expect(await joinAs(oldToken)).toMatchObject({ ok: false, error: { code: 'invalid' } });

    const [row] = await invitationsOf(club);
    await asAdmin(() => resendInvitationAction(club.slug, { id: row?.id ?? '' }));
    const newToken = await invitationToken(old.email);
    expect(newToken).not.toBe(oldToken);
    expect(await readInvitation(oldToken, null, at)).toEqual({ kind: 'dead' });
    expect(await readInvitation(newToken, null, at)).toMatchObject({ kind: 'open' });

    await asAdmin(() => revokeInvitationAction(club.slug, { id: row?.id ?? '' }));
    expect(await joinAs(newToken)).toMatchObject({ ok: false });
    expect(await reader().select().from(users).where(eq(users.email, old.email))).toEqual([]);
  });

  it('refuses a password that the invited address gives away, beside its field, and stays open', async () => {
    const values = invited();
    const token = await invite(club, admin, values);
    const answer = await inRequest(newBrowser(), () =>
      joinNewAction({ token, name: 'Ida Cole', password: values.email }),
    );
    expect(answer).toMatchObject({ ok: false, error: { code: 'invalid', fields: { password: expect.any(String) } } });
    expect(await readInvitation(token, null, at)).toMatchObject({ kind: 'open' });
  });

  it('is refused for a member, and for an address that waits already, beside the e-mail field', async () => {
    const known = await asAdmin(() => inviteAction(club.slug, invited({ email: admin.email })));
    expect(known).toMatchObject({
      ok: false,
      error: { code: 'conflict', fields: { email: expect.stringContaining('Ada Lund') } },
    });
    const values = invited();
    await invite(club, admin, values);
    const twice = await asAdmin(() => inviteAction(club.slug, { ...values, email: values.email.toUpperCase() }));
    expect(twice).toMatchObject({ ok: false, error: { code: 'conflict', fields: { email: expect.any(String) } } });
    at += 15 * DAY;
    expect(await asAdmin(() => inviteAction(club.slug, values))).toMatchObject({ ok: true });
    expect((await invitationsOf(club)).filter((row) => row.revokedAt === null)).toHaveLength(1);
  });

  it('is counted: 30 an hour for a club', async () => {
    for (let i = 0; i < 30; i++) await invite(club, admin, invited());
    const over = await asAdmin(() => inviteAction(club.slug, invited()));
    expect(over).toMatchObject({ ok: false, error: { code: 'limit' } });
    at += 3_600_000;
    expect(await asAdmin(() => inviteAction(club.slug, invited()))).toMatchObject({ ok: true });
  });

  it('is for admins whose own address is confirmed, and only of their own club', async () => {
    const steward = await addMember(club, 'steward');
    const other = await addMember(await makeClub(), 'admin');
    const as = (who: TestMember) => inRequest(who.browser, () => inviteAction(club.slug, invited()));
    expect(await as(steward)).toMatchObject({ ok: false, error: { code: 'forbidden' } });
    expect(await as(other)).toMatchObject({ ok: false, error: { code: 'not_found' } });
    await write((tx) => tx.update(users).set({ emailVerifiedAt: null }).where(eq(users.id, admin.userId)));
    expect(await as(admin)).toMatchObject({ ok: false, error: { code: 'forbidden' } });

    expect(await invitationsOf(club)).toEqual([]);
  });
});

describe('guests', () => {
  const days = { guestFrom: SATURDAY, guestTo: '2026-11-08' };

  it('join under a sponsor with their days, and are out when the last day is over', async () => {
    const token = await invite(club, admin, invited({ role: 'guest', sponsorId: admin.id, ...days }));
    const browser = newBrowser();
    await joinAs(token, 'Gus Moe', browser);
    const user = await inRequest(browser, currentUser);
    const scope = await findScope(club.slug, user?.id ?? '');
    expect(scope?.member).toMatchObject({ role: 'guest', sponsorId: admin.id, ...days });
    expect((await readMembers(admin.scope, at)).find((one) => one.name === 'Gus Moe')).toMatchObject({
      sponsorName: 'Ada Lund',
      guestText: 'Sat 7 Nov 2026 to Sun 8 Nov 2026',
    });
    at = TEST_NOW + 6 * DAY;
    expect(await findScope(club.slug, user?.id ?? '')).toBeNull();
  });

  it('need a sponsor who hunts here, and days that are not over', async () => {
    const landowner = await addMember(club, 'landowner');
    const stranger = await addMember(await makeClub(), 'member');
    for (const sponsorId of [landowner.id, stranger.id, 'mbr_nobody']) {
      const answer = await asAdmin(() => inviteAction(club.slug, invited({ role: 'guest', sponsorId, ...days })));
      expect(answer).toMatchObject({
        ok: false,
        error: { code: 'invalid', fields: { sponsorId: expect.any(String) } },
      });
    }
    const past = invited({ role: 'guest', sponsorId: admin.id, guestFrom: '2026-11-01', guestTo: '2026-11-02' });
    expect(await asAdmin(() => inviteAction(club.slug, past))).toMatchObject({
      ok: false,
      error: { fields: { guestTo: expect.any(String) } },
    });
    expect(await invitationsOf(club)).toEqual([]);
  });

  it('cannot join when their days have gone by, even with a fresh link', async () => {
    const token = await invite(club, admin, invited({ role: 'guest', sponsorId: admin.id, ...days }));
    at = TEST_NOW + 6 * DAY;
    expect(await joinAs(token)).toMatchObject({ ok: false, error: { code: 'conflict' } });
  });
});

describe('changing a member', () => {
  const change = (memberId: string, role: 'admin' | 'member' | 'guest' | 'landowner', more = {}) =>
    asAdmin(() =>
      changeMemberAction(club.slug, { memberId, role, sponsorId: '', guestFrom: '', guestTo: '', ...more }),
    );

  it('takes effect at once and is on record with before and after', async () => {
    const ann = await addMember(club, 'member', { name: 'Ann Roe' });
    expect(await change(ann.id, 'admin')).toEqual({ ok: true, data: { name: 'Ann Roe', changed: true } });
    expect((await findScope(club.slug, ann.userId))?.can('rules.write')).toBe(true);
    const [row] = await reader()
      .select()
      .from(auditLog)
      .where(and(eq(auditLog.clubId, club.id), eq(auditLog.action, 'member.changed')));
    expect(row?.summary).toBe('Ada Lund made Ann Roe an admin; before, a member.');
    expect(row?.detail).toMatchObject({ before: { role: 'member' }, after: { role: 'admin' } });
    expect(await change(ann.id, 'admin')).toMatchObject({ data: { changed: false } });
  });

  it('never leaves the club without an admin', async () => {
    expect(await change(admin.id, 'member')).toMatchObject({ ok: false, error: { code: 'conflict' } });
    const second = await addMember(club, 'admin');
    expect(await change(admin.id, 'member')).toMatchObject({ ok: true });
    expect((await findScope(club.slug, second.userId))?.member.role).toBe('admin');
  });

  it('names the sits and the guests that stand in the way', async () => {
    const oak = await addStand(club, { name: 'Oak Ladder' });
    const ann = await addMember(club, 'member', { name: 'Ann Roe' });
    await addMember(club, 'guest', { name: 'Gus Moe', sponsorId: ann.id, guestFrom: SATURDAY, guestTo: SATURDAY });
    const guests = await change(ann.id, 'landowner');
    expect(guests).toMatchObject({ ok: false, error: { message: expect.stringContaining('answers for Gus Moe') } });
    const bert = await addMember(club, 'member', { name: 'Bert Hale' });
    await book(bert, oak);
    expect(await change(bert.id, 'landowner')).toMatchObject({
      ok: false,
      error: { code: 'conflict', message: expect.stringContaining('Oak Ladder, Sat 7 Nov 2026, morning') },
    });
    const inDays = { sponsorId: ann.id, guestFrom: SATURDAY, guestTo: SATURDAY };
    expect(await change(bert.id, 'guest', { ...inDays, guestFrom: '2026-11-08', guestTo: '2026-11-09' })).toMatchObject(
      { ok: false },
    );
    expect(await change(bert.id, 'guest', { ...inDays, sponsorId: bert.id })).toMatchObject({ ok: false });
    expect(await change(bert.id, 'guest', inDays)).toMatchObject({ ok: true });
  });

  it("finds nobody of another club's id", async () => {
    const stranger = await addMember(await makeClub(), 'member');
    expect(await change(stranger.id, 'admin')).toMatchObject({ ok: false, error: { code: 'not_found' } });
  });
});
