import { describe, expect, it } from 'vitest';
import {
  at,
  box,
  makeApproach,
  makeFeature,
  makeForecast,
  makeInput,
  makeStand,
  PLACE,
  windowOf,
} from '../../tests/helpers/small-ground';
import type { Forecast } from './condition-types';
import { formatClock } from './day-time';
import { rankSits } from './rank';
import { sentence } from './sentence';
import type { Gate } from './verdict-types';

const clock = (when: number) => formatClock(when, PLACE.zone);
const arcs = [{ fromDeg: 225, toDeg: 315, window: null }];
const beds = makeFeature('Cedar Bedding', 'bedding', box(-40, 150, 80, 80));
const stand = makeStand({ id: 'oak', name: 'Oak', arcs });
const ways = [
  makeApproach('oak', [at(0, -500), at(0, 0)], { id: 'a', name: 'Creek Gate' }),
  makeApproach('oak', [at(0, 600), at(0, 0)], { id: 'b', name: 'Ridge Gate' }),
];
const base = { stands: [stand], features: [beds], approaches: ways };
const one = (over: Parameters<typeof makeInput>[0]) => {
  const [v] = rankSits(makeInput(over));
  if (!v) throw new Error('no verdict');
  return v;
};

describe('a verdict', () => {
  it('walks in by the way that keeps off the beds, and says what the other would cost', () => {
    const v = one(base);
    expect(v.approach?.approachName).toBe('Creek Gate');
    expect(v.approach?.leaveBy).toBe((v.approach?.inBy ?? 0) - 1000 * (v.approach?.walkSeconds ?? 0));
    expect(v.counterfactuals.find((c) => c.code === 'other_way')?.text).toMatch(
      /^By Ridge Gate instead: quiet \d+, not \d+$/,
    );
    const other = v.approachAlternatives.find((a) => a.approachName === 'Ridge Gate');
    expect(other?.quiet).toBeLessThan(v.quiet - 10);
    expect(other?.worst?.featureName).toBe('Cedar Bedding');
  });

  it('reads as one plain line', () => {
    const [v] = [one({ ...base, forecast: makeForecast(windowOf('morning'), 315, 6) })];
    expect(sentence(v, clock)).toMatch(/^NW holds \d+ %( until \d\d:\d\d)?; walk in by Creek Gate, in by \d\d:\d\d$/);
    expect(sentence(one({ ...base, forecast: null }), clock)).toMatch(/^No forecast; walk in by/);
    expect(sentence(one({ ...base, approaches: [] }), clock)).toContain('no way in is drawn');
  });

  it('recommends no way in whose time has passed, while another is left; then says that it is too late', () => {
    const window = windowOf('morning');
    const first = one({ ...base, now: window.startAt - 6 * 3_600_000 });
    const leaveBy = first.approach?.leaveBy ?? 0;
    expect(first.approach?.entry).toBe('before_light');
    expect(one({ ...base, now: leaveBy }).approach).toEqual(first.approach);
    const later = one({ ...base, now: leaveBy + 60_000 });
    expect(later.approach?.leaveBy).toBeGreaterThan(leaveBy);
    expect(later.approachAlternatives.every((way) => way.leaveBy > leaveBy)).toBe(true);
    expect(later.score).toBeLessThanOrEqual(first.score);
    const last = window.endAt - 60_000;
    const late = one({ ...base, now: last });
    expect(sentence(late, clock, last)).toMatch(/; too late to walk in, it was to be in by \d\d:\d\d$/);
    expect(one({ ...base, now: window.endAt }).approach).toEqual(first.approach);
  });

  it('warns of the turn of the wind that brings scent to the beds', () => {
    // From the west the scent goes east; the beds lie north, so a wind that backs to the south reaches them.
    const v = one({ ...base, forecast: makeForecast(windowOf('morning'), 250, 3) });
    expect(v.counterfactuals.find((c) => c.code === 'wind_scent')?.text).toMatch(
      /backs to S.*scent reaches Cedar Bedding/,
    );
  });

  it('sizes each reason by the score without that part, greatest first', () => {
    const v = one({ ...base, forecast: makeForecast(windowOf('morning'), 180, 3) });
    const sizes = v.reasons.map((r) => Math.abs(r.change));
    expect([...sizes].sort((a, b) => b - a)).toEqual(sizes);
    const seat = v.reasons.find((r) => r.code === 'seat_scent');
    expect(seat?.text).toContain('Cedar Bedding');
    const without = one({ ...base, features: [], forecast: makeForecast(windowOf('morning'), 180, 3) });
    expect(seat?.change).toBeLessThan(0);
    expect(without.score).toBeGreaterThan(v.score);
  });

  it('is blocked by a gate yet scored the same, ranked after every open one, and says the gate', () => {
    const gate: Gate = { code: 'resting', text: 'Oak rests until 12 Dec', endsOn: '2023-12-12' };
    const poor = makeStand({ id: 'poor', suitability: { morning: 'avoid', evening: 'avoid' } });
    const input = makeInput({ ...base, stands: [stand, poor], gatesByStand: new Map([['oak', [gate]]]) });
    const verdicts = rankSits(input);
    expect(verdicts.map((v) => [v.standId, v.status])).toEqual([
      ['poor', 'open'],
      ['oak', 'blocked'],
    ]);
    expect(verdicts[1]?.score).toBe(one(base).score);
    expect(verdicts[1] && sentence(verdicts[1], clock)).toBe('Oak rests until 12 Dec');
  });

  it('without a forecast stands on arcs, pressure and the way in', () => {
    const v = one({ ...base, forecast: null });
    expect(v.confidence.level).toBe('none');
    expect(v.cautions.map((c) => c.code)).toContain('no_forecast');
    expect([v.arcHold, v.windedChance, v.meanFromDeg]).toEqual([null, null, null]);
    expect(v.timeline.every((t) => t.arcHold === null && t.directionShares === null)).toBe(true);
    expect(v.approach?.approachName).toBe('Creek Gate');
    const wide = one({
      ...base,
      stands: [{ ...stand, arcs: [{ fromDeg: 0, toDeg: 360, window: null }] }],
      forecast: null,
    });
    expect(wide.score).toBeGreaterThan(v.score);
  });

  it('takes a forecast that ends before the window for none', () => {
    const window = windowOf('morning');
    const old: Forecast = makeForecast(windowOf('morning', '2023-12-01'), 270, 4);
    expect(one({ ...base, window, forecast: old }).confidence.level).toBe('none');
  });

  it('breaks ties by name, then by id', () => {
    const twins = ['b', 'a', 'c'].map((id) => makeStand({ id, name: id === 'c' ? 'Ash' : 'Elm' }));
    expect(rankSits(makeInput({ stands: twins })).map((v) => v.standId)).toEqual(['c', 'a', 'b']);
  });

  it('is moved by sightings, pressure and rain in the ways their names say', () => {
    const plain = one(base);
    const seen = (deer: number) =>
      one({
        ...base,
        sightings: [
          { standId: 'oak', sits: 20, hours: 60, deer },
          { standId: 'x', sits: 20, hours: 60, deer: 40 },
        ],
      });
    expect(seen(90).promise).toBeGreaterThan(seen(5).promise);
    const window = windowOf('morning');
    const event = {
      at: window.startAt - 20 * 3_600_000,
      kind: 'sit' as const,
      place: at(0, 0),
      standId: 'oak',
      bumped: 0,
    };
    const pressed = one({ ...base, events: [event] });
    expect(pressed.score).toBeLessThan(plain.score);
    expect(pressed.reasons.map((r) => r.code)).toContain('pressure');
    expect(pressed.counterfactuals.map((c) => c.code)).toContain('rested');
    const wet = one({ ...base, forecast: makeForecast(window, 270, 4, { precipMm: 6 }) });
    expect(wet.promise).toBeLessThan(plain.promise);
    expect(wet.quiet).toBeCloseTo(plain.quiet, 9);
  });

  it('is not moved by moon or barometer (weights 0: Webb et al. 2010)', () => {
    const window = windowOf('morning');
    const at1000 = one({ ...base, forecast: makeForecast(window, 270, 4, { pressureHpa: 1000 }) });
    const at1035 = one({ ...base, forecast: makeForecast(window, 270, 4, { pressureHpa: 1035 }) });
    expect(at1000).toEqual(at1035);
  });
});
