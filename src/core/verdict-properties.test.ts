import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  at,
  makeApproach,
  makeFeature,
  makeForecast,
  makeInput,
  makeStand,
  windowOf,
} from '../../tests/helpers/small-ground';
import { normalizeDeg, toRad } from './angles';
import type { PressureEvent, PressureKind } from './condition-types';
import { PRESSURE_KINDS } from './condition-types';
import { pointAt } from './geometry';
import type { LocalShape, Point } from './ground-types';
import { FEATURE_KINDS } from './ground-types';
import { rankSits } from './rank';
import type { RankInput } from './rank-input';
import { scoreSit } from './verdict';
import type { Verdict } from './verdict-types';
import { rankWeek } from './week';

const HOUR = 3_600_000;
const runs = { numRuns: 60 };

/** Off whole metres, so that no point lies on a bound by construction: rounding would then decide. */
const coordinate = fc.integer({ min: -700, max: 700 }).map((n) => n * 1.0137 + 0.377);
const point = fc.record({ eastM: coordinate, northM: coordinate });
const deg = fc.integer({ min: 0, max: 359 });
const shape: fc.Arbitrary<LocalShape> = fc.oneof(
  point.map((p): LocalShape => ({ type: 'point', at: p })),
  fc.tuple(point, point).map(([a, b]): LocalShape => ({ type: 'line', points: [a, b] })),
  fc.tuple(point, fc.integer({ min: 20, max: 200 }), deg).map(
    ([p, r, d]): LocalShape => ({
      type: 'area',
      rings: [[0, 90, 200].map((turn, i) => pointAt(p, d + turn, r * (1 + 0.13 * i)))],
    }),
  ),
);
const arc = fc.record({ fromDeg: deg, toDeg: deg, window: fc.constant(null) });

interface World {
  input: RankInput;
  windDeg: number;
}

const world: fc.Arbitrary<World> = fc
  .record({
    stands: fc.array(fc.record({ p: point, facing: fc.option(deg), arcs: fc.array(arc, { maxLength: 2 }) }), {
      minLength: 1,
      maxLength: 3,
    }),
    features: fc.array(fc.record({ shape, kind: fc.constantFrom(...FEATURE_KINDS) }), { maxLength: 6 }),
    gate: point,
    windDeg: deg,
    speed: fc.double({ min: 0, max: 14, noNaN: true }),
    cloud: fc.integer({ min: 0, max: 100 }),
    window: fc.constantFrom('morning' as const, 'evening' as const),
    facts: fc.array(
      fc.record({ p: point, kind: fc.constantFrom(...PRESSURE_KINDS), hours: fc.integer({ min: 1, max: 200 }) }),
      {
        maxLength: 4,
      },
    ),
  })
  .map((w) => {
    const window = windowOf(w.window);
    const stands = w.stands.map((s, i) => makeStand({ id: `s${i}`, at: s.p, facingDeg: s.facing, arcs: s.arcs }));
    const input = makeInput({
      stands,
      features: w.features.map((f, i) => makeFeature(`f${i}`, f.kind, f.shape)),
      approaches: stands.map((s) => makeApproach(s.id, [w.gate, s.at])),
      events: w.facts.map((e) => eventAt(e.p, e.kind, window.startAt - e.hours * HOUR)),
      window,
      forecast: makeForecast(window, w.windDeg, w.speed, { cloudPercent: w.cloud }),
    });
    return { input, windDeg: w.windDeg };
  });

function eventAt(place: Point, kind: PressureKind, when: number): PressureEvent {
  return { at: when, kind, place, standId: null, bumped: 0 };
}

function turnPoint(p: Point, by: number): Point {
  const [c, s] = [Math.cos(toRad(by)), Math.sin(toRad(by))];
  return { eastM: p.eastM * c + p.northM * s, northM: p.northM * c - p.eastM * s };
}

function turnShape(shape: LocalShape, by: number): LocalShape {
  if (shape.type === 'point') return { type: 'point', at: turnPoint(shape.at, by) };
  if (shape.type === 'line') return { type: 'line', points: shape.points.map((p) => turnPoint(p, by)) };
  return { type: 'area', rings: shape.rings.map((ring) => ring.map((p) => turnPoint(p, by))) };
}

/** The whole world turned, but for the sun: facings are dropped, since the sun stays where it is. */
function turned({ input }: World, by: number): RankInput {
  const turn = (d: number) => normalizeDeg(d + by);
  return {
    ...input,
    stands: input.stands.map((s) => ({
      ...s,
      at: turnPoint(s.at, by),
      facingDeg: null,
      arcs: s.arcs.map((a) => ({ ...a, fromDeg: turn(a.fromDeg), toDeg: turn(a.toDeg) })),
    })),
    features: input.features.map((f) => ({ ...f, shape: turnShape(f.shape, by) })),
    approaches: input.approaches.map((a) => ({ ...a, points: a.points.map((p) => turnPoint(p, by)) })),
    events: input.events.map((e) => ({ ...e, place: turnPoint(e.place, by) })),
    forecast: input.forecast && {
      ...input.forecast,
      hours: input.forecast.hours.map((h) => ({
        ...h,
        windFromDeg: h.windFromDeg === null ? null : turn(h.windFromDeg),
      })),
    },
  };
}

const byId = (verdicts: Verdict[]) => new Map(verdicts.map((v) => [v.standId, v]));

function numbersIn(value: unknown, path = ''): [string, number][] {
  if (typeof value === 'number') return [[path, value]];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, `${path}.${key}`));
}

describe('a verdict', () => {
  it('is the same when the whole world is turned by a whole number of table bins, and within the tables by any angle', () => {
    fc.assert(
      fc.property(
        world,
        fc.oneof(
          fc.integer({ min: 1, max: 23 }).map((n) => n * 15),
          deg,
        ),
        (w, by) => {
          const still = byId(rankSits(turned(w, 0)));
          const exact = by % 15 === 0;
          for (const v of rankSits(turned(w, by))) {
            const u = still.get(v.standId);
            expect(Math.abs(v.score - (u?.score ?? -1))).toBeLessThan(exact ? 0.01 : 1);
            expect(v.arcHold?.shareOfTime ?? 0).toBeCloseTo(u?.arcHold?.shareOfTime ?? 0, 6);
          }
        },
      ),
      runs,
    );
  });

  it('never scores better for pressure that is more recent or nearer', () => {
    fc.assert(
      fc.property(
        world,
        fc.constantFrom(...PRESSURE_KINDS),
        fc.integer({ min: 1, max: 150 }),
        fc.nat(100),
        fc.nat(600),
        fc.nat(300),
        (w, kind, hours, sooner, metres, nearer) => {
          const stand = w.input.stands[0];
          if (!stand) return;
          const scoreWith = (h: number, m: number) => {
            const event = eventAt(pointAt(stand.at, 40, m), kind, w.input.window.startAt - h * HOUR);
            return scoreSit({ ...w.input, stand, gates: [], events: [...w.input.events, event], detail: 'list' }).score;
          };
          const before = scoreWith(hours, metres);
          expect(scoreWith(Math.max(0, hours - sooner), metres)).toBeLessThanOrEqual(before + 1e-9);
          expect(scoreWith(hours, Math.max(0, metres - nearer))).toBeLessThanOrEqual(before + 1e-9);
        },
      ),
      runs,
    );
  });

  it('never scores better for a wind turned from inside an arc to one that blows on a bedding area', () => {
    fc.assert(
      fc.property(deg, fc.integer({ min: 60, max: 400 }), fc.integer({ min: 3, max: 10 }), (good, metres, speed) => {
        const window = windowOf('morning');
        const bad = normalizeDeg(good + 180);
        // Bedding lies where a wind from the bad side carries scent: towards `good`.
        const beds = makeFeature('beds', 'bedding', { type: 'point', at: pointAt(at(0, 0), good, metres) });
        const stand = makeStand({
          id: 's',
          arcs: [{ fromDeg: normalizeDeg(good - 40), toDeg: normalizeDeg(good + 40), window: null }],
        });
        const way = makeApproach('s', [pointAt(at(0, 0), good + 90, 600), at(0, 0)]);
        const scoreIn = (fromDeg: number) =>
          rankSits(
            makeInput({
              stands: [stand],
              features: [beds],
              approaches: [way],
              window,
              forecast: makeForecast(window, fromDeg, speed),
            }),
          )[0];
        const [inside, onBeds] = [scoreIn(good), scoreIn(bad)];
        expect(onBeds?.score).toBeLessThanOrEqual(inside?.score ?? -1);
        expect(onBeds?.windedChance ?? -1).toBeGreaterThanOrEqual(inside?.windedChance ?? 2);
      }),
      runs,
    );
  });

  it('holds only finite numbers, chances from 0 to 1 and scores from 0 to 100, whatever comes in', () => {
    const odd = fc.constantFrom(null, 0, -1, 1e9, 359.999, 720, -90);
    fc.assert(
      fc.property(world, odd, odd, odd, odd, fc.boolean(), (w, direction, speed, rain, cloud, none) => {
        const { window } = w.input;
        const forecast = none
          ? null
          : makeForecast(window, 0, 0, (hour) => ({
              windFromDeg: direction,
              windSpeedMps: speed,
              gustMps: speed,
              precipMm: hour % (2 * HOUR) === 0 ? rain : null,
              cloudPercent: cloud,
              tempC: speed,
            }));
        for (const v of rankSits({ ...w.input, forecast })) {
          for (const [path, n] of numbersIn(v)) expect(Number.isFinite(n), path).toBe(true);
          for (const n of [v.quiet, v.promise, v.score]) expect(n >= 0 && n <= 100).toBe(true);
          for (const n of [v.windedChance ?? 0, v.approach?.inChance ?? 0, v.approach?.outChance ?? 0])
            expect(n >= 0 && n <= 1).toBe(true);
          if (v.arcHold) expect(v.arcHold.neverLeaves).toBeLessThanOrEqual(1 + 1e-12);
        }
      }),
      runs,
    );
  });

  it('is the same each time, alone or in a week, and for stands in any order', () => {
    fc.assert(
      fc.property(world, ({ input }) => {
        const once = rankSits(input);
        expect(rankSits({ ...input, stands: [...input.stands].reverse() })).toEqual(once);
        const gatesFor = () => [];
        const week = rankWeek({ ...input, windows: [input.window], gatesFor, detail: 'full' });
        expect(week[0]?.verdicts).toEqual(once);
        const list = rankWeek({ ...input, windows: [input.window], gatesFor });
        expect(list[0]?.verdicts.map((v) => [v.standId, v.score, v.quiet])).toEqual(
          once.map((v) => [v.standId, v.score, v.quiet]),
        );
      }),
      runs,
    );
  });
});
