import fc from 'fast-check';
import { z } from 'zod';

/** What a JSON schema node may hold, as far as it is read here. */
interface Shape {
  type?: string;
  const?: unknown;
  enum?: unknown[];
  anyOf?: Shape[];
  oneOf?: Shape[];
  allOf?: Shape[];
  properties?: Record<string, Shape>;
  items?: Shape;
  minimum?: number;
  maximum?: number;
}

/** Values that fit a field by its name: real ids among them, and ids of another club. */
export type Pools = [RegExp, unknown[]][];

export function shapeOf(takes: z.ZodType): Shape {
  return z.toJSONSchema(takes, { io: 'input', unrepresentable: 'any' }) as Shape;
}

/** A body that could be meant: the right keys, with values of the right kind and mostly of the right sort. */
function likely(shape: Shape, key: string, pools: Pools, depth = 0): fc.Arbitrary<unknown> {
  const choices = shape.anyOf ?? shape.oneOf ?? shape.allOf;
  if (choices && choices.length > 0) return fc.oneof(...choices.map((one) => likely(one, key, pools, depth)));
  if ('const' in shape) return fc.constant(shape.const);
  if (shape.enum) return fc.constantFrom(...shape.enum);
  const pool = pools.find(([name]) => name.test(key))?.[1];
  if (shape.type === 'object' && depth < 8) {
    const fields = Object.entries(shape.properties ?? {});
    return fc.record(Object.fromEntries(fields.map(([name, one]) => [name, likely(one, name, pools, depth + 1)])));
  }
  if (shape.type === 'array') {
    return fc.array(likely(shape.items ?? {}, key, pools, depth + 1), { maxLength: 3 });
  }
  if (shape.type === 'boolean') return fc.boolean();
  if (shape.type === 'null') return fc.constant(null);
  if (shape.type === 'integer' || shape.type === 'number') {
    return pool ? fc.constantFrom(...pool) : fc.integer({ min: -10, max: 400 });
  }
  return fc.constantFrom(...(pool ?? ['12', '12', '3', '', 'Old oak']));
}

const DEEP = Array.from({ length: 3000 }).reduce<unknown>((inner) => [inner], 'deep');
const DEEP_OBJECT = Array.from({ length: 3000 }).reduce<unknown>((inner) => ({ inner }), 'deep');
const POISONED: unknown = JSON.parse('{"__proto__":{"role":"admin"},"constructor":{"prototype":{"role":"admin"}}}');

const JUNK_TEXT = [
  '',
  ' ',
  '\u0000',
  '\ud800',
  '\u202eevil\u202c',
  '🦌'.repeat(40),
  'e\u0301'.repeat(500),
  'x'.repeat(20_000),
  "'; DROP TABLE sits; --",
  '../../../etc/passwd',
  '<script>alert(1)</script>',
  '{{7*7}}',
  '__proto__',
  'toString',
  '-1',
  '1e400',
  '9'.repeat(400),
  'NaN',
  '0x10',
  '2026-02-30',
  '0000-00-00',
  '99999-01-01',
  '-0001-01-01',
  '24:00',
  '91, 181',
  'std_nowhere',
];

const junk: fc.Arbitrary<unknown> = fc.oneof(
  { weight: 3, arbitrary: fc.constantFrom(...JUNK_TEXT) },
  {
    weight: 2,
    arbitrary: fc.constantFrom<unknown>(
      null,
      undefined,
      Number.NaN,
      Number.POSITIVE_INFINITY,
      -1,
      -0,
      0.5,
      1e308,
      2 ** 53,
      10n ** 30n,
      true,
      new Date(Number.NaN),
      new Date(0),
      new Map([['a', 1]]),
      [],
      {},
      DEEP,
      DEEP_OBJECT,
      POISONED,
    ),
  },
  { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 200 }) },
  { weight: 2, arbitrary: fc.anything({ withBigInt: true, withDate: true, withMap: true, withNullPrototype: true }) },
);

interface Harm {
  at: number;
  how: 'set' | 'drop' | 'add';
  with: unknown;
}

type Holder = Record<string, unknown> | unknown[];
const isHolder = (value: unknown): value is Holder =>
  typeof value === 'object' && value !== null && (Array.isArray(value) || Object.getPrototypeOf(value) !== null);

/** Every place in a body that can be replaced, as its holder and key. */
function placesIn(body: unknown, found: { holder: Holder; key: string }[] = []) {
  if (!isHolder(body) || found.length > 200) return found;
  for (const [key, value] of Object.entries(body)) {
    found.push({ holder: body, key });
    placesIn(value, found);
  }
  return found;
}

const STRANGE_KEYS = ['clubId', 'memberId', 'role', 'id', 'constructor', 'toString', ''];

function harmed(body: unknown, harms: Harm[]): unknown {
  const root = { body };
  for (const harm of harms) {
    const places = placesIn(root);
    const place = places[harm.at % places.length];
    if (!place) continue;
    const { holder, key } = place;
    if (harm.how === 'add' && isHolder(root.body)) {
      Object.assign(root.body, { [STRANGE_KEYS[harm.at % STRANGE_KEYS.length] ?? '']: harm.with });
    } else if (harm.how === 'drop' && !Array.isArray(holder)) delete holder[key];
    else Object.assign(holder, { [key]: harm.with });
  }
  return root.body;
}

/** Bodies for a door that are wrong in one to three places, some of them wrong altogether. */
export function badBodies(takes: z.ZodType, pools: Pools): fc.Arbitrary<unknown> {
  const harm: fc.Arbitrary<Harm> = fc.record({
    at: fc.nat(400),
    how: fc.constantFrom('set', 'set', 'set', 'drop', 'add'),
    with: junk,
  });
  const bent = fc
    .tuple(likely(shapeOf(takes), '', pools), fc.array(harm, { minLength: 1, maxLength: 3 }))
    .map(([body, harms]) => harmed(body, harms));
  // Nothing is broken here but whom it belongs to, whether it exists, and what the rules say.
  const foreign = likely(shapeOf(takes), '', pools);
  return fc.oneof({ weight: 6, arbitrary: bent }, { weight: 3, arbitrary: foreign }, { weight: 1, arbitrary: junk });
}

/** Query strings with at least one field that cannot be meant. */
export function badQueries(takes: z.ZodType, pools: Pools): fc.Arbitrary<string> {
  const names = Object.keys(shapeOf(takes).properties ?? {});
  const fields = names.length > 0 ? names : ['anything'];
  const text = fc.oneof(fc.constantFrom(...JUNK_TEXT), fc.string({ unit: 'binary', maxLength: 60 }));
  return fc
    .tuple(likely(shapeOf(takes), '', pools), fc.array(fc.tuple(fc.constantFrom(...fields), text), { minLength: 1 }))
    .map(([body, bad]) => {
      const query = new URLSearchParams();
      for (const [key, value] of Object.entries(body ?? {})) query.set(key, String(value));
      for (const [key, value] of bad) query.set(key, value);
      return query.toString();
    });
}

/** Text for a part of an address. */
export const badSegments: fc.Arbitrary<string> = fc.oneof(
  fc.constantFrom(...JUNK_TEXT),
  fc.string({ unit: 'binary', maxLength: 60 }),
);
