import { describe, expect, it } from 'vitest';
import {
  at,
  box,
  makeApproach,
  makeFeature,
  makeForecast,
  makeInput,
  makeStand,
  windowOf,
} from '../../tests/helpers/small-ground';
import type { GoodWindArc, ScoredStand } from './ground-types';
import { rankSits } from './rank';
import type { RankInput } from './rank-input';
import type { Verdict } from './verdict-types';

/** What clubs and land managers say of their own ground (common practice, no study), on a small layout made up for it. */

const west: GoodWindArc[] = [{ fromDeg: 225, toDeg: 315, window: null }];
const both = (rating: 'prime' | 'usable' | 'avoid') => ({ morning: rating, evening: rating });
const plot = makeFeature('North Plot', 'food_plot', box(-80, 0, 160, 60));
const pool = makeFeature('Timber Pool', 'water', { type: 'point', at: at(230, 20) });
const cedar = makeFeature('Cedar Bedding', 'bedding', box(-260, -700, 120, 140));
const laurel = makeFeature('Laurel Bedding', 'bedding', box(60, -700, 120, 140));
const ground = [plot, pool, cedar, laurel];

function rank(over: Partial<RankInput> & Pick<RankInput, 'stands'>): Verdict[] {
  return rankSits(makeInput({ features: ground, ...over }));
}

function of(verdicts: Verdict[], id: string): Verdict {
  const found = verdicts.find((v) => v.standId === id);
  if (!found) throw new Error(`no verdict for ${id}`);
  return found;
}

const options = (v: Verdict) => [...(v.approach ? [v.approach] : []), ...v.approachAlternatives];
const entry = (v: Verdict, name: string) => {
  const found = options(v).find((o) => o.entry === name);
  if (!found) throw new Error(`no entry ${name}`);
  return found;
};

const plotStand = makeStand({ id: 'plot', at: at(0, -15), arcs: west, suitability: both('prime') });
const poolStand = makeStand({ id: 'pool', at: at(250, 5), arcs: west, suitability: both('prime') });
const plotWays = [makeApproach('plot', [at(0, 700), at(0, 120), at(0, -15)])];
const poolWays = [makeApproach('pool', [at(800, 0), at(400, -10), at(250, 5)])];

describe('a food plot in the morning', () => {
  const verdicts = rank({ stands: [plotStand, poolStand], approaches: [...plotWays, ...poolWays] });

  it('(a) entered in the dark ranks below the water in the timber off its end', () => {
    expect(entry(of(verdicts, 'plot'), 'before_light').score).toBeLessThan(of(verdicts, 'pool').score);
    expect(verdicts[0]?.standId).toBe('pool');
  });

  it('(b) is quieter entered half an hour after daybreak than in the dark, and quieter still later', () => {
    const v = of(verdicts, 'plot');
    const dark = entry(v, 'before_light').quiet;
    expect(entry(v, 'after_daybreak_30').quiet).toBeGreaterThan(dark);
    expect(entry(v, 'after_daybreak_60').quiet).toBeGreaterThan(entry(v, 'after_daybreak_30').quiet);
    expect(v.approach?.entry).not.toBe('before_light');
  });

  it('charges the plot, by name, for going in through it', () => {
    const reason = of(verdicts, 'plot').reasons.find((r) => r.code === 'walk_in');
    expect(reason?.change).toBeLessThan(-3);
    expect(reason?.text).toContain('North Plot');
  });
});

describe('a clean way in', () => {
  const great = makeStand({ id: 'great', at: at(250, 5), arcs: west, suitability: both('prime') });
  const poor = makeStand({ id: 'poor', at: at(800, 600), arcs: west, suitability: both('usable') });

  it('(c) puts a poor stand above a great one that is reached through deer', () => {
    const dirty = makeApproach('great', [at(-200, -900), at(-200, -630), at(0, 30), at(250, 5)]);
    const clean = makeApproach('poor', [at(1100, 700), at(800, 600)]);
    const verdicts = rank({ stands: [great, poor], approaches: [dirty, clean] });
    expect(of(verdicts, 'great').promise).toBeGreaterThan(1.3 * of(verdicts, 'poor').promise);
    expect(verdicts.map((v) => v.standId)).toEqual(['poor', 'great']);
  });
});

describe('a stand between bedding areas', () => {
  const gap = makeStand({ id: 'gap', at: at(-40, -630), arcs: west, suitability: both('prime') });
  const way = makeApproach('gap', [at(-40, -1200), at(-40, -900), at(-40, -630)]);

  it('(d) is charged for the walk between them, in and out', () => {
    const [between] = rank({ stands: [gap], approaches: [way] });
    const [alone] = rank({ stands: [gap], approaches: [way], features: [plot, pool] });
    expect(between?.approach?.inChance).toBeGreaterThan((alone?.approach?.inChance ?? 1) + 0.1);
    expect(between?.approach?.outChance).toBeGreaterThan((alone?.approach?.outChance ?? 1) + 0.2);
    expect(between?.approach?.worst?.featureName).toMatch(/Bedding/);
    expect(between?.quiet).toBeLessThan((alone?.quiet ?? 0) - 20);
    const changes = between?.reasons.filter((r) => r.code === 'walk_in' || r.code === 'walk_out') ?? [];
    expect(changes).toHaveLength(2);
    for (const r of changes) expect(r.change).toBeLessThan(-3);
  });
});

describe('a seat that faces the rising sun', () => {
  const facing = (facingDeg: number): ScoredStand => ({ ...poolStand, id: `f${facingDeg}`, facingDeg });
  const promiseAt = (cloudPercent: number) => {
    const window = windowOf('morning');
    const forecast = makeForecast(window, 270, 4, { cloudPercent });
    const stands = [facing(120), facing(300)];
    const verdicts = rank({
      stands,
      approaches: stands.map((s) => makeApproach(s.id, [at(800, 0), at(400, -10), at(250, 5)])),
      window,
      forecast,
    });
    return { east: of(verdicts, 'f120'), west: of(verdicts, 'f300') };
  };

  it('(e) loses promise on a clear morning, and only then', () => {
    const clear = promiseAt(0);
    expect(clear.east.promise).toBeLessThan(0.9 * clear.west.promise);
    expect(clear.east.reasons.some((r) => r.code === 'sun' && r.change < 0)).toBe(true);
    expect(clear.east.timeline.some((t) => t.sunInEyes)).toBe(true);
    const overcast = promiseAt(100);
    expect(overcast.east.promise).toBeCloseTo(overcast.west.promise, 10);
    expect(overcast.east.timeline.some((t) => t.sunInEyes)).toBe(false);
  });
});
