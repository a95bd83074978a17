import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { closeAction } from '@/app/clubs/[club]/closures/actions';
import { reader } from '@/db/client';
import { outbox } from '@/db/schema';
import { setClock } from '@/server/clock';
import { book, SATURDAY } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';

const SUNDAY = '2026-11-08';

let club: TestClub;
let owner: TestMember;
let steward: TestMember;
let ann: TestMember;
let bert: TestMember;
let oak: string;
let ash: string;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub({
    restDaysDefault: 0,
    spacingM: { bow: 0, crossbow: 0, muzzleloader: 0, shotgun: 0, rifle: 0 },
  });
  owner = await addMember(club, 'landowner', { name: 'Lew Land' });
  steward = await addMember(club, 'steward', { name: 'Ada Steward' });
  ann = await addMember(club, 'member', { name: 'Ann Roe' });
  bert = await addMember(club, 'member', { name: 'Bert Hale' });
  oak = await addStand(club, { name: 'Oak Ladder' });
  ash = await addStand(club, { name: 'Ash Ladder' });
});

const close = (who: TestMember, more: Record<string, string> = {}) =>
  inRequest(who.browser, () =>
    closeAction(club.slug, { standId: '', fromDay: SATURDAY, toDay: SUNDAY, reason: 'Cattle are moved', ...more }),
  );

const closureMails = async () => {
  const rows = await reader().select().from(outbox).where(eq(outbox.clubId, club.id));
  return rows.filter(({ kind }) => kind.startsWith('days.closed'));
};

describe('closed days', () => {
  it('are told once to each member with booked sits on them, and to the officers, and to nobody else', async () => {
    await book(ann, oak);
    await book(ann, oak, { day: SUNDAY });
    await book(bert, ash, { day: '2026-11-09' });
    expect(await close(owner)).toMatchObject({ ok: true });
    const mails = await closureMails();
    expect(mails.map(({ toEmail, kind }) => [toEmail, kind])).toEqual([
      [ann.email, 'days.closed_member'],
      [steward.email, 'days.closed_officer'],
    ]);
    const [toAnn, toAda] = mails.map(({ message }) => message?.text ?? '');
    expect(mails[0]?.subject).toBe('Closed: the whole ground, Sat 7 Nov 2026 to Sun 8 Nov 2026');
    expect(toAnn).toContain('Lew Land has closed the whole ground, and 2 sits of yours fall on it.');
    expect(toAnn).toContain('Why: Cattle are moved');
    expect(toAnn).toContain('Your sit: Oak Ladder, Sun 8 Nov 2026, morning');
    expect(toAnn).toContain('stays booked until you or an admin cancels it');
    expect(toAda).toContain('2 booked sits fall on it and stay booked; the members have been told.');
    expect(toAda).toContain('Ann Roe: Oak Ladder, Sat 7 Nov 2026, morning');
  });

  it('of one stand are told to those booked there, and not to whoever closes it', async () => {
    const admin = await addMember(club, 'admin', { name: 'Ida Kern' });
    await book(ann, oak);
    await book(bert, ash);
    await book(steward, oak, { day: '2026-11-12' });
    expect(await close(steward, { standId: oak, toDay: '' })).toMatchObject({ ok: true });
    const mails = await closureMails();
    expect(mails.map(({ toEmail }) => toEmail)).toEqual([ann.email, admin.email]);
    expect(mails[0]?.subject).toBe('Closed: Oak Ladder, from Sat 7 Nov 2026 until opened again');
    expect(mails[1]?.message?.text).toContain('Ada Steward: Oak Ladder, Thu 12 Nov 2026, morning');
  });

  it('that touch no booked sit are told to nobody', async () => {
    await book(ann, oak, { day: '2026-11-12' });
    expect(await close(owner)).toMatchObject({ ok: true });
    expect(await closureMails()).toEqual([]);
  });
});
