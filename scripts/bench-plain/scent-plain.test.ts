import { describe, expect, it } from 'vitest';
import { STABILITY_CLASSES, type StabilityClass } from '@/core/air/stability-types';
import { normalizeDeg } from '@/core/angles';
import { pointAt } from '@/core/geometry';
import type { LocalShape, Point } from '@/core/ground-types';
import { scentGround, sourceGeometry } from '@/core/scent/scent-ground';
import { seatScent } from '@/core/scent/seat-scent';
import { DEFAULT_SETTINGS } from '@/core/settings';
import type { ScenarioSet } from '@/core/wind/scenario-types';
import { plainSeatScent } from './scent-plain';

const SEAT: Point = { eastM: 0, northM: 0 };
const near = (bearing: number, d: number): Point => pointAt(SEAT, bearing, d);
const SHAPES: LocalShape[] = [
  { type: 'point', at: near(170, 120) },
  { type: 'area', rings: [[near(190, 110), near(215, 130), near(210, 280), near(185, 260)]] },
  { type: 'area', rings: [[near(20, 60), near(60, 60), near(50, 130), near(30, 130)]] },
  { type: 'line', points: [near(120, 400), near(230, 300)] },
  { type: 'point', at: near(185, 700) },
];

function windSet(turns: (number | null)[], mps: number, bundle: number): ScenarioSet {
  const at = [0, 1, 2, 3].map((t) => t * 1_800_000);
  return {
    at,
    known: at.map(() => true),
    scenarios: turns.map((turn) => ({
      weight: 1 / turns.length,
      steps: at.map((_, t) => ({ fromDeg: turn === null ? null : normalizeDeg(10 + turn + 3 * t), speedMps: mps })),
    })),
    scatterDeg: at.map(() => 14),
    bundleDeg: at.map(() => bundle),
    leadHours: 12,
    source: 'error_model',
    level: 'seat',
  };
}

function both(set: ScenarioSet, c: StabilityClass) {
  const ground = scentGround(
    SHAPES.map((shape) => ({ shape })),
    DEFAULT_SETTINGS.scent,
  );
  const deer = new Float64Array(SHAPES.length * set.at.length).fill(0.3);
  const stability = set.at.map(() => c);
  const source = sourceGeometry(ground, SEAT, 5);
  return {
    fast: seatScent({ source, set, stability, deer, minutes: 30, detail: 'list' }),
    plain: plainSeatScent({ ground, at: SEAT, heightM: 5, set, stability, deer, minutes: 30 }),
  };
}

describe.each(STABILITY_CLASSES)('scent from tables and straight from the formulas, class %s', (c) => {
  it.each([
    ['a spread wind', windSet([-40, -25, -10, 0, 10, 25, 40], 4, 6)],
    ['a light, wide wind', windSet([-80, -50, -20, 0, 20, 50, 80], 1.2, 13)],
    ['no direction', windSet([null], 0.3, 0)],
  ])('agree within 1 % in %s', (_, set) => {
    const { fast, plain } = both(set, c);
    expect(plain.windedChance).toBeGreaterThan(0.01);
    expect(Math.abs((fast.windedChance ?? 0) / plain.windedChance - 1)).toBeLessThan(0.01);
    plain.byFeature.forEach((p, f) => {
      expect(Math.abs((fast.byFeature[f] ?? 0) - p)).toBeLessThan(0.01);
    });
  });
});
