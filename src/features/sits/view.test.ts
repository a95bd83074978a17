import { describe, expect, it } from 'vitest';
import type { ScoredFeature, ScoredStand } from '@/core/ground-types';
import type { Caution, Verdict } from '@/core/verdict-types';
import { shapeDetail } from './detail-view';
import { hideFeatures } from './hide-features';
import { shapeRows, sharedCautions } from './view';

const START = Date.UTC(2026, 10, 7, 11, 14);
const club = { zone: 'America/New_York', units: 'us' } as const;

function stand(id: string): ScoredStand {
  return {
    id,
    name: `Stand ${id}`,
    kind: 'ladder',
    at: { eastM: 0, northM: 0 },
    seatHeightM: 5,
    facingDeg: null,
    shotSide: 'either',
    shotRangeM: { bow: 27 },
    shelter: 'open',
    arcs: [
      { fromDeg: 270, toDeg: 360, window: 'morning' },
      { fromDeg: 90, toDeg: 180, window: 'evening' },
    ],
    suitability: { morning: 'usable', evening: 'usable' },
    restDays: 3,
    drainBearingDeg: null,
    slopePercent: null,
  };
}

function verdict(standId: string, more: Partial<Verdict> = {}): Verdict {
  return {
    standId,
    day: '2026-11-07',
    window: 'morning',
    status: 'open',
    gates: [],
    quiet: 81.234,
    promise: 40,
    score: 60.06,
    word: 'Quiet',
    arcHold: {
      shareOfTime: 0.84,
      neverLeaves: 0.6,
      likeliestLeavingAt: Date.UTC(2026, 10, 7, 15),
      worstAt: START,
      worstShare: 0.5,
    },
    windedChance: 0.1,
    scentByFeature: [],
    approach: {
      approachId: 'a1',
      approachName: 'Creek Gate',
      parkingName: 'North lot',
      entry: 'before_light',
      leaveBy: START - 30 * 60_000,
      inBy: START - 9 * 60_000,
      walkSeconds: 1260.4,
      inChance: 0.1,
      outChance: 0.2,
      quiet: 81.234,
      score: 60.06,
      worst: null,
    },
    approachAlternatives: [],
    pressure: 0,
    meanFromDeg: 315,
    directionShares: Array.from({ length: 72 }, () => 1 / 72),
    reasons: [],
    counterfactuals: [],
    cautions: [],
    confidence: { level: 'fair', text: 'x', leadHours: 5, spreadDeg: 20, forecastAgeHours: 1 },
    timeline: [],
    ...more,
  };
}

const stands = new Map(['a', 'b', 'c'].map((id) => [id, stand(id)]));
const window = { startAt: START, endAt: START + 4 * 3_600_000 };
const context = { club, window, now: START - 3_600_000, stands, rows: { stands: [], approaches: [] }, shared: [] };

describe('shapeRows', () => {
  it('ranks open rows from 1, says the sentence in the club’s clock, and marks one’s own', () => {
    const { open } = shapeRows([verdict('a'), verdict('b')], 'b', context);
    expect(open.map(({ rank, standId, mine }) => ({ rank, standId, mine }))).toEqual([
      { rank: 1, standId: 'a', mine: false },
      { rank: 2, standId: 'b', mine: true },
    ]);
    expect(open[0]?.sentence).toBe('NW holds 84 % until 10; walk in by Creek Gate, in by 6:05');
    expect(open[0]?.arcs).toEqual([{ fromDeg: 270, toDeg: 360 }]);
    expect(open[0]?.score).toBe(60.1);
  });

  it('names no time of leaving when that is the start', () => {
    const hold = { shareOfTime: 0.5, neverLeaves: 0.1, likeliestLeavingAt: START, worstAt: START, worstShare: 0.1 };
    const { open } = shapeRows([verdict('a', { arcHold: hold })], null, context);
    expect(open[0]?.sentence).toMatch(/^NW holds 50 %; /);
  });

  it('keeps the rule, its holder and its end beside what is not open', () => {
    const gate = {
      code: 'resting' as const,
      text: 'Stand c is resting: Ada sat there on Fri 6 Nov.',
      endsOn: '2026-11-10',
    };
    const { open, blocked } = shapeRows(
      [verdict('a'), verdict('c', { status: 'blocked', gates: [gate] })],
      null,
      context,
    );
    expect(open).toHaveLength(1);
    expect(blocked[0]?.gates).toEqual([{ code: 'resting', text: gate.text, ends: 'Open again Tue 10 Nov' }]);
  });

  it('leaves out verdicts on stands that are gone', () => {
    expect(shapeRows([verdict('gone')], null, context)).toEqual({ open: [], blocked: [] });
  });
});

describe('sharedCautions', () => {
  const thunder: Caution = { code: 'thunder', level: 'stop', text: 'Thunder from 7' };
  const raised: Caution = { code: 'wind_raised', level: 'caution', text: 'Raised seat: wind' };
  const harness: Caution = { code: 'harness', level: 'note', text: 'Harness on' };

  it('takes what every stand has, notes apart', () => {
    const both = [
      verdict('a', { cautions: [thunder, raised, harness] }),
      verdict('b', { cautions: [thunder, harness] }),
    ];
    expect(sharedCautions(both).map((caution) => caution.code)).toEqual(['thunder']);
    const { open } = shapeRows(both, null, { ...context, shared: sharedCautions(both) });
    expect(open.map((row) => row.cautions.map((caution) => caution.code))).toEqual([
      ['wind_raised', 'harness'],
      ['harness'],
    ]);
    expect(sharedCautions([])).toEqual([]);
  });
});

describe('hideFeatures', () => {
  it('leaves nothing but the kind', () => {
    const feature: ScoredFeature = {
      id: 'f',
      name: 'Cedar Bedding',
      kind: 'bedding',
      shape: { type: 'point', at: { eastM: 1, northM: 2 } },
      months: [11],
      use: null,
    };
    expect(hideFeatures([feature])[0]?.name).toBe('a bedding area');
  });
});

describe('shapeDetail', () => {
  const sitWindow = { day: '2026-11-07', window: 'morning' as const, ...window };
  const approach = {
    id: 'a1',
    name: 'Creek Gate',
    standId: 'a',
    parkingName: 'North lot',
    direction: 'both' as const,
    points: [
      { eastM: -500, northM: 0 },
      { eastM: -300, northM: 0 },
      { eastM: 0, northM: 0 },
      { eastM: 0, northM: 400 },
    ],
    vehicleToIndex: 1,
  };
  const ask = {
    stand: stand('a'),
    window: sitWindow,
    approaches: [approach],
    seeSightings: false,
    declinationDeg: -10.4,
    now: START - 3_600_000,
  };

  it('walks from where the driving ends: length along the line, bearing straight to the stand', () => {
    const { ways } = shapeDetail(verdict('a'), ask);
    // 300 m east then 400 m north: 700 m walked; straight it is atan2(300, 400) = 36.87 degrees.
    expect(ways[0]).toMatchObject({ walkM: 700, bearingDeg: 37, cost: 0, entry: 'in before light', passed: false });
  });

  it('gives the compass bearing: true less declination, west of north being below nought', () => {
    // 36.87 + 10.4 = 47.27; with 40 east it is 356.87, a little west of magnetic north.
    const magnetic = (declinationDeg: number | null) =>
      shapeDetail(verdict('a'), { ...ask, declinationDeg }).ways[0]?.magneticDeg;
    expect([magnetic(-10.4), magnetic(40), magnetic(null)]).toEqual([47, 357, null]);
  });

  it('says that a way is too late from the minute one had to leave, until the window ends', () => {
    const passed = (now: number) => shapeDetail(verdict('a'), { ...ask, now }).ways[0]?.passed;
    const leaveBy = START - 30 * 60_000;
    expect([leaveBy, leaveBy + 1, window.endAt - 1, window.endAt].map(passed)).toEqual([false, true, true, false]);
  });

  it('tells what each other way costs against the best', () => {
    const best = verdict('a').approach;
    if (!best) throw new Error('The example has a way in.');
    const later = { ...best, entry: 'midday' as const, score: 52.06 };
    expect(shapeDetail(verdict('a', { approachAlternatives: [later] }), ask).ways[1]).toMatchObject({
      cost: -8,
      entry: 'in around midday',
    });
  });

  it('keeps a log’s figures from those who may not see them', () => {
    const reason = {
      code: 'sightings',
      text: 'Seen from it: 0.40 deer an hour',
      change: 3,
      part: 'promise' as const,
      evidence: 'club log' as const,
    };
    const told = (seeSightings: boolean) =>
      shapeDetail(verdict('a', { reasons: [reason] }), { ...ask, seeSightings }).reasons[0]?.text;
    expect(told(true)).toContain('0.40');
    expect(told(false)).toBe('What was seen from it in past sits');
  });
});
