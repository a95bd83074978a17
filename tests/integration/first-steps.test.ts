import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { bearingDeg, distanceM, toLocal } from '@/core/geometry';
import { reader } from '@/db/client';
import { auditLog, stands } from '@/db/schema';
import { listStands } from '@/features/ground/stands-data';
import { hideFirstSteps } from '@/features/onboarding/hide-first-steps';
import { laySamples } from '@/features/onboarding/lay-samples';
import { readFirstSteps } from '@/features/onboarding/read-first-steps';
import { removeSamples } from '@/features/onboarding/remove-samples';
import { sampleGround } from '@/features/onboarding/sample-ground';
import { readSits } from '@/features/sits/reads';
import { setClock } from '@/server/clock';
import { book, refusal, SATURDAY } from '../helpers/book';
import { addMember, addStand, makeClub, TEST_NOW, TEST_PLACE, type TestMember } from '../helpers/make-club';

let admin: TestMember;

beforeEach(async () => {
  setClock(() => TEST_NOW);
  admin = await addMember(await makeClub(), 'admin', { name: 'Cora Pike' });
});

const doneOf = async (who: TestMember) =>
  (await readFirstSteps(who.scope))?.steps.filter((step) => step.done).map((step) => step.title) ?? null;

describe('the first steps of a club', () => {
  it('are ticked as they are done, and gone when all are', async () => {
    expect(await doneOf(admin)).toEqual(['The place']);
    const club = admin.scope.club;
    const standId = await addStand(club, { name: 'Oak Ladder' });
    expect(await doneOf(admin)).toContain('The first stand');
    await addMember(club, 'member', { name: 'Ann Roe' });
    expect(await doneOf(admin)).toContain('The others');
    await book(admin, standId);
    expect(await doneOf(admin)).toContain('The first sit');
  });

  it('are for admins alone, and put away for all of them by one, on record', async () => {
    const member = await addMember(admin.scope.club, 'member');
    expect(await readFirstSteps(member.scope)).toBeNull();
    await hideFirstSteps(admin.scope, TEST_NOW);
    await hideFirstSteps(admin.scope, TEST_NOW);
    const other = await addMember(admin.scope.club, 'admin');
    expect(await readFirstSteps(other.scope)).toBeNull();
    const rows = await reader().select().from(auditLog).where(eq(auditLog.clubId, admin.scope.club.id));
    expect(rows.filter(({ action }) => action === 'club.first_steps_hidden')).toHaveLength(1);
  });
});

describe('sample stands', () => {
  it('give a ranked list at once, marked as samples, and tick nothing', async () => {
    await laySamples(admin.scope, TEST_NOW);
    const view = await readSits(admin.scope, { day: SATURDAY, window: 'morning' }, TEST_NOW);
    const names = [...view.open, ...view.blocked].map(({ name }) => name);
    expect(names).toHaveLength(3);
    for (const name of names) expect(name).toMatch(/^Sample: /);
    expect(await doneOf(admin)).toEqual(['The place']);
    expect((await readFirstSteps(admin.scope))?.samples).toBe(true);
    expect((await refusal(laySamples(admin.scope, TEST_NOW))).code).toBe('conflict');
  });

  it('go together, and leave what is the club’s own', async () => {
    const own = await addStand(admin.scope.club, { name: 'Oak Ladder' });
    await laySamples(admin.scope, TEST_NOW);
    expect(await removeSamples(admin.scope, TEST_NOW)).toEqual({ removed: 3 });
    expect((await listStands(admin.scope)).map(({ id }) => id)).toEqual([own]);
    await laySamples(admin.scope, TEST_NOW);
    expect(await listStands(admin.scope)).toHaveLength(4);
  });

  it('stay, all of them, while one is booked', async () => {
    await laySamples(admin.scope, TEST_NOW);
    const [first] = await listStands(admin.scope);
    await book(admin, first?.id ?? '');
    const error = await refusal(removeSamples(admin.scope, TEST_NOW));
    expect(error.message).toContain('is booked');
    expect(await listStands(admin.scope)).toHaveLength(3);
  });

  it('never take away a stand of another club', async () => {
    const other = await addMember(await makeClub(), 'admin');
    await laySamples(other.scope, TEST_NOW);
    expect(await removeSamples(admin.scope, TEST_NOW)).toEqual({ removed: 0 });
    const theirs = await reader().select().from(stands).where(eq(stands.clubId, other.scope.club.id));
    expect(theirs.filter(({ removedAt }) => removedAt === null)).toHaveLength(3);
  });

  it('lie where they are said to, about the club’s place', () => {
    for (const { stand, approach } of sampleGround(TEST_PLACE).stands) {
      const at = toLocal(TEST_PLACE, stand);
      const gate = { eastM: 0, northM: 0 };
      expect(distanceM(gate, at)).toBeGreaterThan(300);
      expect(distanceM(gate, at)).toBeLessThan(600);
      expect(bearingDeg(gate, at)).toBeGreaterThan(0);
      expect(approach.points.at(-1)).toEqual([stand.lon, stand.lat]);
    }
  });
});
