import { and, eq, sql } from 'drizzle-orm';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { ClubRules } from '@/core/booking/rules';
import { reader, write } from '@/db/client';
import { approaches, claims, closures, type SitGuest, sits } from '@/db/schema';
import { bookSit } from '@/features/bookings/book-sit';
import { loadGates } from '@/features/bookings/load-gates';
import { newId } from '@/lib/ids';
import { setClock } from '@/server/clock';
import { systemScopeBySlug } from '@/server/scope';
import { book, bookingRows, refusal, SATURDAY, smallClub, wanted } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';

let club: TestClub;
let ann: TestMember;
let bert: TestMember;
let oak: string;

const rows = () => bookingRows(club.id);

async function setUp(rules: Partial<ClubRules> = {}) {
  ({ club, ann, bert, oak } = await smallClub(rules));
}

beforeAll(() => setClock(() => TEST_NOW));
beforeEach(() => setUp());

describe('booking', () => {
  it('writes sit, claim, audit row and mail together', async () => {
    const sit = await book(ann, oak, { windows: 'all_day', note: 'back by dark' });
    const made = await rows();
    expect(made.sits).toHaveLength(1);
    expect(sit).toMatchObject({ standName: 'Oak Ladder', memberName: 'Ann Roe', status: 'booked', sequence: 0 });
    expect(made.claims.map((claim) => claim.window).sort()).toEqual(['evening', 'morning']);
    expect(made.audit.map(({ action, actorName, subjectId }) => [action, actorName, subjectId])).toEqual([
      ['sit.booked', 'Ann Roe', sit.id],
    ]);
    expect(made.mail).toHaveLength(1);
    expect(made.mail[0]).toMatchObject({ toEmail: ann.email, kind: 'sit.booked' });
    expect(made.mail[0]?.message?.calendar?.method).toBe('REQUEST');
    expect(made.mail[0]?.message?.calendar?.content).toContain(`UID:${sit.id}@windrest`);
    expect(made.mail[0]?.message?.text).toContain('Oak Ladder');
  });

  it('leaves nothing behind when a part of it fails', async () => {
    await write((tx) =>
      tx.run(sql`create trigger no_mail before insert on outbox begin select raise(abort, 'no'); end`),
    );
    await expect(book(ann, oak)).rejects.toThrow();
    await write((tx) => tx.run(sql`drop trigger no_mail`));
    const left = await rows();
    expect([left.sits, left.claims, left.audit, left.mail].map((list) => list.length)).toEqual([0, 0, 0, 0]);
  });

  it('refuses a taken stand by its holder and the rule, and a second stand for the same member', async () => {
    await book(ann, oak, { windows: 'all_day' });
    const taken = await refusal(book(bert, oak, { windows: 'evening' }));
    expect(taken.code).toBe('conflict');
    expect(taken.message).toContain('Oak Ladder is taken on Sat 7 Nov, evening: Ann Roe has it.');
    const elm = await addStand(club, { name: 'Elm Box' });
    const busy = await refusal(book(ann, elm));
    expect(busy.message).toContain('Ann Roe already has Oak Ladder');
    expect((await rows()).sits).toHaveLength(1);
  });

  it('keeps the rest of a stand both ways (common practice: three full days, sat on the 7th, ready on the 11th)', async () => {
    await book(ann, oak);
    const early = await refusal(book(bert, oak, { day: '2026-11-10' }));
    expect(early.message).toMatch(/Oak Ladder is resting: Ann Roe sat there on Sat 7 Nov.*rests through Tue 10 Nov/);
    await book(bert, oak, { day: '2026-11-11' });
    const elm = await addStand(club, { name: 'Elm Box' });
    await book(bert, elm, { day: '2026-11-08' });
    const before = await refusal(book(ann, elm, { day: '2026-11-05' }));
    expect(before.message).toMatch(/Elm Box is booked by Bert Hale on Sun 8 Nov.*would break it/);
  });

  it('answers a second press of the button with the first sit, one after the other or at once', async () => {
    const input = wanted(oak);
    const first = await bookSit(ann.scope, input, TEST_NOW);
    expect((await bookSit(ann.scope, input, TEST_NOW + 5)).id).toBe(first.id);
    const elm = await addStand(club, { name: 'Elm Box' });
    const twice = wanted(elm, { day: '2026-11-06' });
    const ids = await Promise.all(Array.from({ length: 8 }, () => bookSit(ann.scope, twice, TEST_NOW)));
    expect(new Set(ids.map((sit) => sit.id)).size).toBe(1);
    const made = await rows();
    expect([made.sits.length, made.claims.length, made.audit.length, made.mail.length]).toEqual([2, 2, 2, 2]);
  });

  it('does not give one person the sit of another by their request key', async () => {
    const input = wanted(oak);
    await bookSit(ann.scope, input, TEST_NOW);
    expect((await refusal(bookSit(bert.scope, input, TEST_NOW))).code).toBe('conflict');
  });

  it('lets an admin book for a member, and nobody else', async () => {
    const admin = await addMember(club, 'admin', { name: 'Cora Pike' });
    expect((await refusal(book(ann, oak, { memberId: bert.id }))).code).toBe('forbidden');
    const sit = await book(admin, oak, { memberId: ann.id });
    expect(sit).toMatchObject({ memberName: 'Ann Roe', bookedBy: admin.id });
    const { mail, audit } = await rows();
    expect(mail[0]?.toEmail).toBe(ann.email);
    expect(mail[0]?.message?.text).toContain('Cora Pike booked Oak Ladder for you.');
    expect(audit[0]?.actorName).toBe('Cora Pike');
  });

  it("takes no stand, member or way in of another club, and no other stand's way in", async () => {
    const other = await makeClub();
    const stranger = await addMember(other);
    const far = await addStand(other);
    const admin = await addMember(club, 'admin');
    expect((await refusal(book(ann, far))).more.fields).toHaveProperty('standId');
    expect((await refusal(book(admin, oak, { memberId: stranger.id }))).more.fields).toHaveProperty('memberId');
    const elm = await addStand(club, { name: 'Elm Box' });
    const approachId = newId('approach');
    const points = [
      [-84, 34.2],
      [-84, 34.21],
    ];
    await write((tx) =>
      tx
        .insert(approaches)
        .values({ id: approachId, clubId: club.id, standId: elm, name: 'Creek', direction: 'both', points }),
    );
    expect((await refusal(book(ann, oak, { approachId }))).more.fields).toHaveProperty('approachId');
    expect(await book(ann, elm, { approachId })).toMatchObject({ approachName: 'Creek' });
  });

  it('refuses closed ground with its reason, until it ends or further notice', async () => {
    const close = (toDay: string | null, reason: string) =>
      write((tx) =>
        tx.insert(closures).values({
          id: newId('closure'),
          clubId: club.id,
          standId: null,
          fromDay: SATURDAY,
          toDay,
          reason,
          byMemberId: ann.id,
          createdAt: TEST_NOW,
        }),
      );
    await close('2026-11-08', 'logging');
    expect((await refusal(book(ann, oak))).message).toContain('The ground is closed until Sun 8 Nov: logging.');
    await book(ann, oak, { day: '2026-11-09' });
    await close(null, 'flood');
    const elm = await addStand(club, { name: 'Elm Box' });
    expect((await refusal(book(bert, elm, { day: '2026-11-12' }))).message).toContain('until further notice: flood');
  });

  it('refuses what is over, too far ahead or over the limit of live claims', async () => {
    await setUp({ maxLiveClaims: 1 });
    expect((await refusal(book(ann, oak, { day: '2026-11-03' }))).message).toContain('ended at');
    expect((await refusal(book(ann, oak, { day: '2026-11-30' }))).message).toContain('14 days ahead');
    await book(ann, oak);
    const elm = await addStand(club, { name: 'Elm Box' });
    expect((await refusal(book(ann, elm, { day: '2026-11-08' }))).message).toContain('Ann Roe holds Oak Ladder');
  });

  it('says who holds it even where only the index of claims knows', async () => {
    const sit = await book(ann, oak);
    await write((tx) => tx.update(sits).set({ status: 'cancelled' }).where(eq(sits.id, sit.id)));
    const stopped = await refusal(book(bert, oak));
    expect(stopped.code).toBe('conflict');
    expect(stopped.message).toContain('Ann Roe has Oak Ladder');
    expect((await rows()).sits).toHaveLength(1);
  });
});

describe('guests', () => {
  const guest = (name: string, memberId: string | null = null): SitGuest => ({ name, memberId });

  it('needs seats, and counts guest days of the host, those of sponsored guests too', async () => {
    await setUp({ guestDaysPerSeason: 2, guestsAtOnce: 2, restDaysDefault: 0 });
    expect((await refusal(book(ann, oak, { guests: [guest('Gil')] }))).message).toContain(
      'has 1 seat, and this sit needs 2',
    );
    const box = await addStand(club, { name: 'Elm Box', seats: 3 });
    await book(ann, box, { guests: [guest('Gil')] });
    const sponsored = await addMember(club, 'guest', {
      name: 'Hob Lane',
      sponsorId: ann.id,
      guestFrom: '2026-11-08',
      guestTo: '2026-11-10',
    });
    expect((await refusal(book(sponsored, oak, { day: '2026-11-11' }))).message).toContain('Hob Lane may not sit');
    await book(sponsored, oak, { day: '2026-11-08' });
    const over = await refusal(book(ann, box, { day: '2026-11-09', guests: [guest('Gil')] }));
    expect(over.message).toContain('Ann Roe has used 2 of 2 guest days');
    expect((await refusal(book(sponsored, oak, { day: '2026-11-09' }))).message).toContain('Ann Roe has used 2 of 2');
  });

  it('refuses a guest named twice, oneself, and an account of another club', async () => {
    const box = await addStand(club, { name: 'Elm Box', seats: 3 });
    const stranger = await addMember(await makeClub());
    for (const guests of [[guest('Gil'), guest('gil ')], [guest('Ann', ann.id)], [guest('Stranger', stranger.id)]]) {
      expect((await refusal(book(ann, box, { guests }))).more.fields).toHaveProperty('guests');
    }
  });
});

describe('gates of all stands at once', () => {
  const ask = { day: SATURDAY, window: 'morning' as const, weapon: 'bow' as const, now: TEST_NOW };

  it('gives each stand its rules and says who holds what', async () => {
    const elm = await addStand(club, { name: 'Elm Box', restDays: 5 });
    const ash = await addStand(club, { name: 'Ash Tripod', shotRangeM: { rifle: 100 } });
    const sit = await book(ann, oak);
    await book(bert, elm, { day: '2026-11-12' });
    const { gatesByStand, takenBy } = await loadGates(bert.scope, { ...ask, memberId: bert.id });
    const codes = (id: string) => gatesByStand.get(id)?.map((gate) => gate.code);
    expect(codes(oak)).toEqual(['taken']);
    expect(codes(elm)).toEqual(['breaks_later_rest']);
    expect(codes(ash)).toEqual(['weapon']);
    expect(takenBy.get(oak)).toEqual({ sitId: sit.id, memberId: ann.id, memberName: 'Ann Roe' });
    expect(takenBy.has(elm)).toBe(false);
  });

  it('leaves rules about the person out where nobody is named', async () => {
    const kept = await addStand(club, { allowedMemberIds: [bert.id] });
    const scope = await systemScopeBySlug(club.slug);
    const open = await loadGates(scope, { ...ask, memberId: null });
    expect(open.gatesByStand.get(kept)).toEqual([]);
    const closed = await loadGates(ann.scope, { ...ask, memberId: ann.id });
    expect(closed.gatesByStand.get(kept)?.map((gate) => gate.code)).toEqual(['not_permitted']);
  });

  it('sees nothing of another club', async () => {
    const other = await makeClub();
    const far = await addStand(other);
    const carl = await addMember(other);
    await book(carl, far);
    const { gatesByStand, takenBy } = await loadGates(ann.scope, { ...ask, memberId: ann.id });
    expect([...gatesByStand.keys()]).toEqual([oak]);
    expect(takenBy.size).toBe(0);
    const theirs = await reader()
      .select()
      .from(claims)
      .where(and(eq(claims.clubId, other.id), eq(claims.standId, far)));
    expect(theirs).toHaveLength(1);
  });
});
