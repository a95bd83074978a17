import type { MapLayer } from '@/core/map-layers';
import { FEATURE_KIND_WORDS, STAND_KIND_WORDS } from '@/features/ground/words/kinds';
import type { MapThing, ThingKind } from '../thing';

export const LAYER_WORDS: Record<MapLayer, string> = {
  boundary: 'Boundary',
  wood: 'Wood',
  field: 'Field',
  crop: 'Farm field',
  swamp: 'Swamp',
  water: 'Water',
  road: 'Road',
  trail: 'Trail',
  closed_area: 'Closed area',
  no_shoot: 'No-shoot sector',
  camera: 'Camera',
  hazard: 'Hazard',
  gate: 'Gate',
  signal: 'Phone signal',
};

export const KIND_WORDS: Record<ThingKind, string> = {
  stand: 'Stand',
  parking: 'Parking place',
  approach: 'Approach',
  feature: 'Feature',
  item: 'Land',
};

/** 'Ladder stand', 'Bedding', 'Wood'. */
export function whatOf(thing: MapThing): string {
  if (thing.kind === 'stand') return STAND_KIND_WORDS[thing.what];
  if (thing.kind === 'feature') return FEATURE_KIND_WORDS[thing.what];
  if (thing.kind === 'item') return LAYER_WORDS[thing.what];
  return KIND_WORDS[thing.kind];
}

/** Its own name, or what it is. */
export function nameOf(thing: MapThing): string {
  return thing.name || whatOf(thing);
}
