import { Geodesic, PolygonArea } from 'geographiclib-geodesic';
import { describe, expect, it } from 'vitest';
import { formatArcs, formatClosed, formatDays, formatSize, formatWinds } from './view';

describe('closures in words', () => {
  const closed = (fromDay: string, toDay: string | null, reason = 'strap') => ({ fromDay, toDay, reason });

  it('says what holds today before what is to come', () => {
    const both = [closed('2026-11-20', '2026-11-21', 'logging'), closed('2026-11-01', '2026-11-08')];
    expect(formatClosed(both, '2026-11-07')).toBe('Closed until Sun 8 Nov: strap');
    expect(formatClosed(both, '2026-11-09')).toBe('Closes Fri 20 Nov: logging');
    expect(formatClosed(both, '2026-11-22')).toBe('');
    expect(formatClosed([closed('2026-11-01', null)], '2027-01-01')).toBe('Closed until opened again: strap');
  });

  it('writes one day once', () => {
    expect(formatDays(closed('2026-11-07', '2026-11-07'))).toBe('Sat 7 Nov 2026');
    expect(formatDays(closed('2026-11-07', '2026-11-08'))).toBe('Sat 7 Nov 2026 to Sun 8 Nov 2026');
  });
});

describe('winds in words', () => {
  it('joins arcs that overlap and shows points and degrees', () => {
    const arcs = [
      { fromDeg: 303.75, toDeg: 348.75 },
      { fromDeg: 326.25, toDeg: 11.25 },
    ];
    expect(formatArcs(arcs)).toBe('NW-N · 304°–11°');
    expect(formatWinds(arcs)).toBe('NW-N');
    expect(formatArcs([])).toBe('None set');
  });
});

describe('sizes', () => {
  const centre = { lat: 38.6, lon: -83.2 };
  const ring = [
    [-83.2, 38.6],
    [-83.198, 38.6],
    [-83.198, 38.602],
    [-83.2, 38.602],
    [-83.2, 38.6],
  ];

  it('agrees with the geodesic area', () => {
    // Karney (2013) polygon area through geographiclib.
    const polygon = new PolygonArea.PolygonArea(Geodesic.WGS84, false);
    for (const [lon = 0, lat = 0] of ring.slice(0, -1)) polygon.AddPoint(lat, lon);
    const acres = Math.abs(polygon.Compute(false, true).area ?? 0) / 4046.8564224;
    const shown = Number.parseFloat(formatSize({ type: 'Polygon', coordinates: [ring] }, centre, 'us'));
    expect(Math.abs(shown - acres)).toBeLessThan(0.06);
  });

  it('takes holes away and gives a point no size', () => {
    expect(formatSize({ type: 'Polygon', coordinates: [ring, ring] }, centre, 'metric')).toBe('0.0 ha');
    expect(formatSize({ type: 'Point', coordinates: [-83.2, 38.6] }, centre, 'us')).toBe('');
  });
});
