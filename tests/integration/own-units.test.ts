import { beforeEach, describe, expect, it } from 'vitest';
import { changeUnitsAction } from '@/app/(account)/account/actions';
import { readMyUnits } from '@/features/accounts/reads';
import { readSits } from '@/features/sits/reads';
import { findScope } from '@/server/scope';
import { addMember, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
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
});
