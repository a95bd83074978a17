import type { LocalShape, ScoredApproach, ScoredFeature, ScoredStand } from '../ground-types';
import { sectorName } from '../sectors';
import type { Units } from '../units';
import { formatDistance } from '../units';
import type { Finding } from './setup-types';

const round = (p: { eastM: number; northM: number }) => [Math.round(p.eastM), Math.round(p.northM)];

function shapeFacts(shape: LocalShape): unknown {
  if (shape.type === 'point') return round(shape.at);
  return shape.type === 'line' ? shape.points.map(round) : shape.rings.map((ring) => ring.map(round));
}

export const featureFacts = (f: ScoredFeature): unknown => [f.id, f.kind, shapeFacts(f.shape), f.months, f.use];

export const standFacts = (s: ScoredStand): unknown => [
  s.id,
  round(s.at),
  s.facingDeg,
  s.shotSide,
  s.shotRangeM,
  s.arcs,
  s.suitability,
];

export const approachFacts = (a: ScoredApproach): unknown => [a.id, a.direction, a.points.map(round), a.vehicleToIndex];

/** FNV-1a, 32 bits, of facts as text: the same facts, the same print. */
export function printOf(facts: unknown): string {
  let hash = 0x811c9dc5;
  for (const char of JSON.stringify(facts)) {
    hash ^= char.codePointAt(0) ?? 0;
    hash = Math.imul(hash, 0x01000193);
  }
  return (hash >>> 0).toString(16).padStart(8, '0');
}

/** '62 yd NW' of a seat. */
export function away(metres: number, bearing: number, units: Units): string {
  return `${formatDistance(metres, units)} ${sectorName(bearing)}`;
}

/** A finding with its key and print; `facts` are what it rests on. */
export function makeFinding(
  found: Omit<Finding, 'key' | 'print' | 'evidence' | 'also'> & { also?: Finding['also'] },
  facts: unknown[],
): Finding {
  const key = [found.code, found.subject.id, found.stand?.id ?? ''].join(':');
  return { also: [], ...found, key, print: printOf(facts), evidence: 'practice' };
}
