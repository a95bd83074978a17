import { Geodesic } from 'geographiclib-geodesic';
import { describe, expect, it } from 'vitest';
import type { GroundRows } from './data';
import { closedDaysOf, groundToBooking, groundToCore, localShapes } from './to-core';

const club = { lat: 38.6, lon: -83.2, rules: { restDaysDefault: 3 } };

const stand: GroundRows['stands'][number] = {
  id: 'std_1',
  clubId: 'clb_1',
  name: 'Creek Bend',
  kind: 'ladder',
  lat: 38.605,
  lon: -83.195,
  seatHeightM: 4.5,
  facingDeg: 45,
  shotSide: 'left',
  shotRangeM: { bow: 27, rifle: 120 },
  shelter: 'edge',
  seats: 1,
  arcs: [{ fromDeg: 303.75, toDeg: 11.25, window: null }],
  morning: 'prime',
  evening: 'avoid',
  restDays: null,
  mostSitsSeason: 6,
  drainBearingDeg: 200,
  slopePercent: null,
  allowedMemberIds: ['mbr_1'],
  notes: '',
  version: 1,
  createdAt: 0,
  removedAt: null,
};

const approach: GroundRows['approaches'][number] = {
  id: 'app_1',
  clubId: 'clb_1',
  standId: 'std_1',
  parkingId: 'prk_1',
  name: 'Creek path',
  direction: 'both',
  points: [
    [-83.2, 38.6],
    [-83.195, 38.605],
  ],
  vehicleToIndex: 0,
  notes: '',
  version: 1,
  removedAt: null,
};

const parking: GroundRows['parkings'][number] = {
  id: 'prk_1',
  clubId: 'clb_1',
  name: 'Creek Gate',
  lat: 38.6,
  lon: -83.2,
  notes: '',
  version: 1,
  removedAt: null,
};

const closure: GroundRows['closures'][number] = {
  id: 'cls_1',
  clubId: 'clb_1',
  standId: 'std_1',
  fromDay: '2026-11-07',
  toDay: null,
  reason: 'strap',
  byMemberId: 'mbr_1',
  createdAt: 0,
  removedAt: null,
};

const rows: GroundRows = {
  stands: [stand, { ...stand, id: 'std_2', name: 'Oak Flat', restDays: 0 }],
  approaches: [
    approach,
    { ...approach, id: 'app_2', standId: 'std_gone' },
    { ...approach, id: 'app_3', parkingId: 'prk_gone' },
  ],
  features: [],
  parkings: [parking],
  closures: [closure, { ...closure, id: 'cls_2', standId: null, toDay: '2026-12-01', reason: 'logging' }],
};

describe('groundToCore', () => {
  const core = groundToCore(club, rows);

  it('places a stand as far from the centre as the geodesic says', () => {
    // Karney (2013) through geographiclib; the local plane is good to 0.1 %.
    const s12 = Geodesic.WGS84.Inverse(club.lat, club.lon, stand.lat, stand.lon).s12 ?? 0;
    const at = core.stands[0]?.at ?? { eastM: 0, northM: 0 };
    expect(Math.abs(Math.hypot(at.eastM, at.northM) - s12)).toBeLessThan(s12 * 0.001);
    expect(at.eastM).toBeGreaterThan(0);
    expect(at.northM).toBeGreaterThan(0);
  });

  it("takes the club's rest days where a stand has none, and keeps a stand's own nought", () => {
    expect(core.stands.map((s) => s.restDays)).toEqual([3, 0]);
  });

  it('names the parking place, and gives no approach to a stand that is gone', () => {
    expect(core.approaches.map((a) => [a.id, a.parkingName])).toEqual([
      ['app_1', 'Creek Gate'],
      ['app_3', null],
    ]);
    expect(core.approaches[0]?.points[0]).toEqual({ eastM: 0, northM: 0 });
  });
});

describe('localShapes', () => {
  it('drops the point that closes a ring and keeps holes', () => {
    const ring = [
      [-83.2, 38.6],
      [-83.19, 38.6],
      [-83.19, 38.61],
      [-83.2, 38.6],
    ];
    const [shape] = localShapes(club, { type: 'Polygon', coordinates: [ring, ring] });
    expect(shape?.type === 'area' && shape.rings.map((r) => r.length)).toEqual([3, 3]);
  });

  it('gives one shape for each part', () => {
    const point = { type: 'Point' as const, coordinates: [-83.2, 38.6] };
    expect(localShapes(club, { type: 'GeometryCollection', geometries: [point, point] })).toHaveLength(2);
    expect(localShapes(club, { type: 'MultiPoint', coordinates: [[-83.2, 38.6]] })).toEqual([
      { type: 'point', at: { eastM: 0, northM: 0 } },
    ]);
  });
});

describe('for the booking rules', () => {
  it('keeps weapons, closures and approaches with their stand', () => {
    const [first, second] = groundToBooking(club, rows);
    expect(first?.weapons).toEqual(['bow', 'rifle']);
    expect(first?.closures.map((c) => c.reason)).toEqual(['strap']);
    expect(first?.approaches).toHaveLength(2);
    expect(second?.closures).toEqual([]);
    expect(second?.restDays).toBe(0);
  });

  it('takes only closures of the whole ground as closed days', () => {
    expect(closedDaysOf(rows)).toEqual([{ fromDay: '2026-11-07', toDay: '2026-12-01', reason: 'logging' }]);
  });
});
