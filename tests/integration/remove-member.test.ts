import { eq, sql } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { leaveAction } from '@/app/clubs/[club]/club/actions';
import { inviteAction, removeMemberAction } from '@/app/clubs/[club]/club/members/actions';
import { reader, write } from '@/db/client';
import { calendarFeeds, claims, memberships, sits } from '@/db/schema';
import { makeFeed } from '@/features/calendar/make-feed';
import { readMembers } from '@/features/clubs/read-members';
import { planRemoval } from '@/features/clubs/removal';
import { setClock } from '@/server/clock';
import { findScope } from '@/server/scope';
import { book, bookingRows, SATURDAY } from '../helpers/book';
import { invitationsOf, invited } from '../helpers/invite';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';

let club: TestClub;
let admin: TestMember;
let ann: TestMember;
let gus: TestMember;
let oak: string;
let elm: string;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub();
  admin = await addMember(club, 'admin', { name: 'Ada Lund' });
  ann = await addMember(club, 'member', { name: 'Ann Roe' });
  const days = { guestFrom: SATURDAY, guestTo: '2026-11-08' };
  gus = await addMember(club, 'guest', { name: 'Gus Moe', sponsorId: ann.id, ...days });
  oak = await addStand(club, { name: 'Oak Ladder' });
  elm = await addStand(club, { name: 'Elm Box' });
});

const remove = (memberId: string) => inRequest(admin.browser, () => removeMemberAction(club.slug, { memberId }));
const names = async () => (await readMembers(admin.scope, TEST_NOW)).map((member) => member.name);

describe('removing a member', () => {
  it('says before what goes, and does that: sits, claims, guests, invitations, feeds, mails, record', async () => {
    await book(ann, oak, { windows: 'all_day' });
    await book(gus, elm);
    await makeFeed(ann.scope, { scope: 'own', withPlace: false }, TEST_NOW);
    const values = invited({
      name: 'Una Vik',
      role: 'guest',
      sponsorId: ann.id,
      guestFrom: SATURDAY,
      guestTo: SATURDAY,
    });
    await inRequest(admin.browser, () => inviteAction(club.slug, values));

    expect(await planRemoval(admin.scope, ann.id, TEST_NOW)).toEqual({
      name: 'Ann Roe',
      lastAdmin: false,
      sits: ['Oak Ladder, Sat 7 Nov 2026, all day'],
      guests: [{ name: 'Gus Moe', sits: ['Elm Box, Sat 7 Nov 2026, morning'] }],
      invitations: ['Una Vik'],
    });
    expect(await remove(ann.id)).toEqual({
      ok: true,
      data: { name: 'Ann Roe', cancelledSits: 2, guests: ['Gus Moe'] },
    });

    const left = await bookingRows(club.id);
    expect(left.claims).toEqual([]);
    expect(left.sits.map((sit) => [sit.status, sit.sequence])).toEqual([
      ['cancelled', 1],
      ['cancelled', 1],
    ]);
    expect(await names()).toEqual(['Ada Lund']);
    for (const gone of [ann, gus]) expect(await findScope(club.slug, gone.userId)).toBeNull();
    expect((await invitationsOf(club)).map((row) => row.revokedAt)).toEqual([TEST_NOW]);
    const feeds = await reader().select().from(calendarFeeds).where(eq(calendarFeeds.memberId, ann.id));
    expect(feeds.map((feed) => feed.revokedAt)).toEqual([TEST_NOW]);

    const mailsTo = (email: string) => left.mail.filter((mail) => mail.toEmail === email).map((mail) => mail.kind);
    expect(mailsTo(ann.email).sort()).toEqual(['club.removed', 'sit.booked', 'sit.cancelled']);
    expect(mailsTo(gus.email).sort()).toEqual(['club.removed', 'sit.booked', 'sit.cancelled']);
    const cancelled = left.mail.find((mail) => mail.kind === 'sit.cancelled' && mail.toEmail === ann.email);
    expect(cancelled?.message?.calendar?.method).toBe('CANCEL');
    const actions = left.audit.map((row) => row.action).filter((action) => action !== 'sit.booked');
    expect(actions.sort()).toEqual([
      'feed.made',
      'member.invited',
      'member.removed',
      'member.removed',
      'sit.cancelled',
      'sit.cancelled',
    ]);
  });

  it('frees the stand for the others and keeps sits that are past', async () => {
    const [past] = await reader()
      .select()
      .from(sits)
      .where(eq(sits.id, (await book(ann, oak)).id));
    await write((tx) =>
      tx
        .update(sits)
        .set({ endAt: TEST_NOW - 1, startAt: TEST_NOW - 2 })
        .where(eq(sits.id, past?.id ?? '')),
    );
    await book(ann, elm, { windows: 'evening' });
    expect(await remove(ann.id)).toMatchObject({ ok: true, data: { cancelledSits: 1 } });
    const kept = await reader()
      .select()
      .from(sits)
      .where(eq(sits.id, past?.id ?? ''));
    expect(kept[0]?.status).toBe('booked');
    expect((await book(admin, elm, { windows: 'evening' })).status).toBe('booked');
  });

  it('changes nothing at all when a part of it fails', async () => {
    await book(ann, oak);
    await write((tx) =>
      tx.run(
        sql`create trigger no_removal before insert on outbox when new.kind = 'club.removed' begin select raise(abort, 'no'); end`,
      ),
    );
    const answer = await remove(ann.id);
    await write((tx) => tx.run(sql`drop trigger no_removal`));
    expect(answer).toMatchObject({ ok: false, error: { code: 'internal' } });
    expect(await names()).toEqual(['Ada Lund', 'Ann Roe', 'Gus Moe']);
    expect(await reader().select().from(claims).where(eq(claims.clubId, club.id))).toHaveLength(1);
  });

  it('refuses the last admin, whether removed or leaving', async () => {
    expect(await remove(admin.id)).toMatchObject({ ok: false, error: { code: 'conflict' } });
    const leave = await inRequest(admin.browser, () => leaveAction(club.slug, {}));
    expect(leave).toMatchObject({ ok: false, error: { code: 'conflict' } });
    expect((await planRemoval(admin.scope, admin.id, TEST_NOW))?.lastAdmin).toBe(true);
    await addMember(club, 'admin');
    expect(await inRequest(admin.browser, () => leaveAction(club.slug, {}))).toMatchObject({ ok: true });
  });

  it('keeps one admin when two remove each other at once', async () => {
    const second = await addMember(club, 'admin', { name: 'Bo Dahl' });
    const answers = await Promise.all([
      remove(second.id),
      inRequest(second.browser, () => removeMemberAction(club.slug, { memberId: admin.id })),
    ]);
    expect(answers.filter((answer) => answer.ok)).toHaveLength(1);
    const rows = await reader().select().from(memberships).where(eq(memberships.clubId, club.id));
    expect(rows.filter((row) => row.role === 'admin' && row.removedAt === null)).toHaveLength(1);
  });

  it("finds nobody of another club's id, and is for admins", async () => {
    const stranger = await addMember(await makeClub(), 'member');
    expect(await remove(stranger.id)).toMatchObject({ ok: false, error: { code: 'not_found' } });
    const byAnn = await inRequest(ann.browser, () => removeMemberAction(club.slug, { memberId: gus.id }));
    expect(byAnn).toMatchObject({ ok: false, error: { code: 'forbidden' } });
  });
});

describe('leaving', () => {
  it("cancels one's sits, takes one's guests along and writes no farewell to oneself", async () => {
    await book(ann, oak);
    const answer = await inRequest(ann.browser, () => leaveAction(club.slug, {}));
    expect(answer).toMatchObject({ ok: true, data: { cancelledSits: 1, guests: ['Gus Moe'] } });
    const left = await bookingRows(club.id);
    expect(left.claims).toEqual([]);
    expect(left.mail.filter((mail) => mail.kind === 'club.removed').map((mail) => mail.toEmail)).toEqual([gus.email]);
    expect(left.audit.map((row) => row.action)).toContain('member.left');
    expect(await names()).toEqual(['Ada Lund']);
  });
});
