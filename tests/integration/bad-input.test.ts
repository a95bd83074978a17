import fc from 'fast-check';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { ActionResult } from '@/server/doors';
import { badBodies, badSegments } from '../helpers/bad-bodies';
import { type BadInputDemo, expectPlain, openBadInputDemo, tellFailure } from '../helpers/bad-input-demo';
import { findDoors } from '../helpers/list-doors';
import { inRequest } from '../helpers/request';

const BODIES = 1000;
/** Tries are counted: every so many bodies the counts begin anew. */
const AT_ONCE = 100;
const SEGMENTS = 25;

const { doors } = await findDoors();
const actions = doors
  .filter(({ run }) => run.door.kind === 'action')
  .map((door) => ({ door, at: `${door.name} of ${door.file}` }));

let bad: BadInputDemo;
beforeAll(async () => {
  bad = await openBadInputDemo();
});
afterAll(() => bad.kept.close());

it.each(actions)('$at answers bad bodies plainly and keeps nothing of them', async ({ door }) => {
  const { takes, who } = door.run.door;
  if (!takes) throw new Error('An action without a shape.');
  const call = (body: unknown) => (who === 'club' ? door.run(bad.demo.slug, body) : door.run(body));
  const ends: Record<string, number> = {};
  for (let from = 0; from < BODIES; from += AT_ONCE) {
    await bad.restart();
    await fc.assert(
      fc.asyncProperty(badBodies(takes, bad.pools), (body) =>
        tellFailure(body, async () => {
          const result = (await inRequest(bad.admin(), () => call(body))) as ActionResult<unknown>;
          const end = result.ok ? 'ok' : result.error.code;
          ends[end] = (ends[end] ?? 0) + 1;
          if (result.ok) return bad.restart();
          expectPlain(result.error);
          return bad.afterRefusal();
        }),
      ),
      { numRuns: AT_ONCE, seed: from + 1, endOnFailure: true },
    );
  }
  // Bodies that are wrong altogether are among them: a door that takes everything takes too much.
  expect(ends.invalid ?? 0).toBeGreaterThan(BODIES / 10);
});

it.each(actions.filter(({ door }) => door.run.door.who === 'club'))(
  '$at hides from bad addresses',
  async ({ door }) => {
    await bad.restart();
    await fc.assert(
      fc.asyncProperty(fc.oneof(badSegments, fc.anything()), async (slug) => {
        const result = (await inRequest(bad.admin(), () => door.run(slug, {}))) as ActionResult<unknown>;
        expect(result).toMatchObject({ ok: false, error: { code: 'not_found' } });
      }),
      { numRuns: SEGMENTS, seed: 7 },
    );
  },
);
