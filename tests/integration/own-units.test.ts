import { beforeEach, describe, expect, it } from 'vitest';
import { changeUnitsAction } from '@/app/(account)/account/actions';
import { readMyUnits } from '@/features/accounts/reads';
import { bookSit } from '@/features/bookings/book-sit';
import { readSits } from '@/features/sits/reads';
import { findScope } from '@/server/scope';
import { bookingRows, wanted } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';
import { MORNING, steady } from '../helpers/sits-club';

let club: TestClub;
let ann: TestMember;
let bert: TestMember;

beforeEach(async () => {
  club = await makeClub();
  ann = await addMember(club, 'admin', { name: 'Ann Roe' });
  bert = await addMember(club, 'member', { name: 'Bert Hale' });
});

const choose = (units: string) => inRequest(ann.browser, () => changeUnitsAction({ units: units as 'us' }));
const clubOf = async (who: TestMember) => (await findScope(club.slug, who.userId))?.club;

describe('units of one’s own', () => {
  it('change what one reads, and neither the club nor anybody else', async () => {
    expect((await choose('metric')).ok).toBe(true);
    expect(await clubOf(ann)).toMatchObject({ units: 'metric', clubUnits: 'us' });
    expect(await clubOf(bert)).toMatchObject({ units: 'us', clubUnits: 'us' });
    const scope = await findScope(club.slug, ann.userId);
    if (!scope) throw new Error('Ann is no member.');
    const view = await readSits(scope, MORNING, TEST_NOW, { forecast: steady(270) });
    expect(view.weather?.wind).toContain('km/h');
    expect(await readMyUnits({ id: ann.userId })).toBe('metric');
  });

  it('go back to the club’s, and refuse what is no choice', async () => {
    await choose('metric');
    expect((await choose('club')).ok).toBe(true);
    expect((await clubOf(ann))?.units).toBe('us');
    expect(await readMyUnits({ id: ann.userId })).toBe('club');
    const answer = await choose('furlongs');
    expect(answer).toMatchObject({ ok: false, error: { code: 'invalid' } });
  });

  it('are those of the reader in a mail of a sit, whoever booked it, and the zone is named', async () => {
    const standId = await addStand(club, { name: 'Oak Ladder' });
    await choose('metric');
    const scope = await findScope(club.slug, ann.userId);
    if (!scope) throw new Error('Ann is no member.');
    await bookSit(scope, wanted(standId, { memberId: bert.id }), TEST_NOW);
    await bookSit(scope, wanted(standId, { windows: 'evening' }), TEST_NOW);
    const { mail } = await bookingRows(club.id);
    const clubTime = (name: string) =>
      /^Club time: (.*)$/m.exec(mail.find((one) => one.toName === name)?.message?.text ?? '')?.[1];
    expect(clubTime('Bert Hale')).toMatch(/^\d{1,2}:\d\d AM to \d{1,2}:\d\d AM \(America\/New York\)$/);
    expect(clubTime('Ann Roe')).toMatch(/^\d\d:\d\d to \d\d:\d\d \(America\/New York\)$/);
  });
});
