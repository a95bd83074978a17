import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { ErrorBody } from '@/server/errors';
import { badQueries, badSegments } from '../helpers/bad-bodies';
import { type BadInputDemo, expectPlain, openBadInputDemo, tellFailure } from '../helpers/bad-input-demo';
import { type FoundDoor, findDoors } from '../helpers/list-doors';
import { inRequest } from '../helpers/request';

const QUERIES = 1000;
/** Reads without a query of their own answer every time: a few are enough. */
const QUERIES_WITHOUT_FIELDS = 20;
const SEGMENTS = 25;

const { doors } = await findDoors();
const routes = doors.filter(({ run }) => run.door.kind === 'route');
const pages = doors.filter(({ run }) => run.door.kind === 'page');
const named = (list: FoundDoor[]) => list.map((door) => ({ door, at: door.file }));

let bad: BadInputDemo;
beforeAll(async () => {
  bad = await openBadInputDemo();
});
afterAll(() => bad.kept.close());

const paramNames = (file: string) => [...file.matchAll(/\[(\w+)\]/g)].map(([, name]) => name ?? '');

function realParams(file: string): Record<string, string> {
  return Object.fromEntries(paramNames(file).map((name) => [name, bad.demo.params[name] ?? 'none']));
}

async function callRoute(door: FoundDoor, query: string, params: Record<string, string>): Promise<Response> {
  const request = new Request(`http://127.0.0.1/here?${query}`);
  const call = door.run as (...args: unknown[]) => Promise<Response>;
  const response = await inRequest(bad.admin(), () => call(request, { params: Promise.resolve(params) }));
  expect(response.status).toBeLessThan(500);
  if (response.status < 400) return response;
  const body: { error: ErrorBody } = await response.json();
  expectPlain(body.error);
  return response;
}

describe('routes', () => {
  it.each(named(routes))('$at answers bad queries plainly and changes nothing', async ({ door }) => {
    const { takes } = door.run.door;
    if (!takes) throw new Error('A route without a shape.');
    const hasFields = Object.keys('shape' in takes && takes.shape ? takes.shape : {}).length > 0;
    await bad.restart();
    await fc.assert(
      fc.asyncProperty(badQueries(takes, bad.pools), (query) =>
        tellFailure(query, async () => {
          const { ok } = await callRoute(door, query, realParams(door.file));
          // An answer may leave a trace, such as who took the audit log out; a refusal may not.
          return ok ? bad.restart() : bad.afterRefusal();
        }),
      ),
      { numRuns: hasFields ? QUERIES : QUERIES_WITHOUT_FIELDS, seed: 11, endOnFailure: true },
    );
  });

  it.each(named(routes.filter(({ file }) => file.includes('['))))(
    '$at answers bad addresses plainly',
    async ({ door }) => {
      await bad.restart();
      for (const name of paramNames(door.file)) {
        await fc.assert(
          fc.asyncProperty(badSegments, (text) =>
            tellFailure(text, async () => {
              await callRoute(door, '', { ...realParams(door.file), [name]: text });
            }),
          ),
          { numRuns: SEGMENTS, seed: 13, endOnFailure: true },
        );
      }
    },
  );
});

/** A page may show itself, send on, or say that there is nothing; anything else is our mistake. */
async function callPage(door: FoundDoor, params: Record<string, string>, search: object): Promise<void> {
  const props = { params: Promise.resolve(params), searchParams: Promise.resolve(search) };
  await inRequest(bad.admin(), () => door.run(props)).catch((error: unknown) => {
    const digest = error instanceof Error && 'digest' in error ? String(error.digest) : '';
    if (!/^NEXT_(REDIRECT|HTTP_ERROR_FALLBACK;404)/.test(digest)) throw error;
  });
}

describe('pages', () => {
  const searches = fc.dictionary(
    fc.constantFrom(
      'day',
      'window',
      'weapon',
      'next',
      'stand',
      'from',
      'to',
      'text',
      'person',
      'action',
      'page',
      'sent',
    ),
    fc.oneof(badSegments, fc.array(badSegments, { maxLength: 3 })),
    { minKeys: 1 },
  );

  it.each(named(pages))('$at stands up to bad searches and addresses', async ({ door }) => {
    await bad.restart();
    await fc.assert(
      fc.asyncProperty(searches, (search) => tellFailure(search, () => callPage(door, realParams(door.file), search))),
      { numRuns: SEGMENTS, seed: 17, endOnFailure: true },
    );
    for (const name of paramNames(door.file)) {
      await fc.assert(
        fc.asyncProperty(badSegments, (text) =>
          tellFailure(text, () => callPage(door, { ...realParams(door.file), [name]: text }, {})),
        ),
        { numRuns: SEGMENTS, seed: 19, endOnFailure: true },
      );
    }
  });
});
