import { beforeEach, describe, expect, it } from 'vitest';
import { GET } from '@/app/api/clubs/[club]/coverage/seat/route';
import { tryStand } from '@/core/coverage/try-stand';
import { unpackWinds } from '@/features/coverage/pack-winds';
import { readCoverage } from '@/features/coverage/reads';
import { setClock } from '@/server/clock';
import { addFeature } from '../helpers/add-ground';
import {
  addMember,
  addStand,
  makeClub,
  TEST_NOW,
  TEST_PLACE,
  type TestClub,
  type TestMember,
} from '../helpers/make-club';
import { inRequest } from '../helpers/request';

let club: TestClub;
let member: TestMember;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  club = await makeClub();
  member = await addMember(club, 'member');
});

const both = { morning: 'usable', evening: 'usable' } as const;
const arcs = [{ fromDeg: 90, toDeg: 200, window: null }];

async function seat(query: Record<string, string>, who = member) {
  const url = `http://127.0.0.1/api/clubs/${club.slug}/coverage/seat?${new URLSearchParams(query)}`;
  const response = await inRequest(who.browser, () =>
    GET(new Request(url), { params: Promise.resolve({ club: club.slug }) }),
  );
  return { status: response.status, body: await response.json() };
}

describe('winds of a season in the browser', () => {
  it('give a trial the very gain that its stand has once it hangs', async () => {
    await addStand(club, { name: 'Oak', arcs: [{ fromDeg: 180, toDeg: 270, window: null }] });
    const before = await readCoverage(member.scope, TEST_NOW);
    const gains = tryStand(unpackWinds(before.winds), { arcs, suitability: both });
    expect(gains).toHaveLength(2);
    expect(gains.every(({ added }) => added > 0)).toBe(true);
    await addStand(club, { name: 'Trial', arcs });
    const after = await readCoverage(member.scope, TEST_NOW);
    for (const [i, gain] of gains.entries()) {
      expect(gain.covered).toBeCloseTo(before.windows[i]?.covered ?? -1, 12);
      expect(gain.covered + gain.added).toBeCloseTo(after.windows[i]?.covered ?? -1, 12);
    }
    const hung = after.stands.find(({ name }) => name === 'Trial');
    expect([hung?.morning, hung?.evening]).toEqual(gains.map(({ hours }) => hours));
    expect(hung?.alone).toBe(gains.reduce((sum, { alone }) => sum + alone, 0));
  });
});

describe('the seat of a trial', () => {
  const at = { lat: String(TEST_PLACE.lat), lon: String(TEST_PLACE.lon) };

  it('is judged by the core, and worse with beds downwind', async () => {
    const quiet = (text: string) => Number(/quiet (\d+), promise \d+/.exec(text)?.[1]);
    const clear = await seat({ trial: '350-10', window: 'morning', ...at });
    expect(clear.status).toBe(200);
    expect(clear.body.text).toMatch(/^Where it stands, its seat would be \w+ on N mornings: quiet \d+, promise \d+/);
    await addFeature(club, 'Beds', 'bedding', { lat: TEST_PLACE.lat - 0.0006, lon: TEST_PLACE.lon });
    const winded = await seat({ trial: '350-10', window: 'morning', ...at });
    expect(quiet(winded.body.text)).toBeLessThan(quiet(clear.body.text));
  });

  it('has nothing to say of winds that cannot be read, and refuses a place off the earth', async () => {
    expect((await seat({ trial: 'sideways', window: 'both', ...at })).body).toEqual({ text: null });
    expect((await seat({ trial: 'N', window: 'both', lat: '99', lon: '0' })).status).toBe(400);
    const stranger = await addMember(await makeClub(), 'admin');
    expect((await seat({ trial: 'N', window: 'both', ...at }, stranger)).status).toBe(404);
  });
});
