import type { Position } from 'geojson';
import { FEATURE_KINDS, type FeatureKind, STAND_KINDS, type StandKind } from '@/core/ground-types';
import { type DrawnShape, LAYER_SHAPES, MAP_LAYERS, type MapLayer } from '@/core/map-layers';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { FEATURE_KIND_WORDS, STAND_KIND_WORDS } from '@/features/ground/words/kinds';
import type { MapClub, MapThing } from '../thing';
import { NEW_THING_WORDS } from '../words/drawing';
import { LAYER_WORDS } from '../words/things';
import { tieDrawn } from './follow';

/** What may be drawn: 'stand:ladder', 'parking', 'approach', 'feature:bedding', 'item:wood'. */
export type NewKind =
  | { kind: 'stand'; what: StandKind }
  | { kind: 'parking' }
  | { kind: 'approach' }
  | { kind: 'feature'; what: FeatureKind }
  | { kind: 'item'; what: MapLayer };

const FEATURE_SHAPES: Record<FeatureKind, readonly DrawnShape[]> = {
  bedding: ['area', 'point'],
  food_plot: ['area', 'point'],
  crop: ['area'],
  mast: ['area', 'point', 'line'],
  water: ['point', 'area', 'line'],
  scrape: ['point'],
  rub_line: ['line', 'point'],
  travel_line: ['line'],
  crossing: ['point'],
  sanctuary: ['area'],
};

export function shapesOf(kind: NewKind): readonly DrawnShape[] {
  switch (kind.kind) {
    case 'stand':
    case 'parking':
      return ['point'];
    case 'approach':
      return ['line'];
    case 'feature':
      return FEATURE_SHAPES[kind.what];
    case 'item':
      return LAYER_SHAPES[kind.what];
  }
}

export interface KindGroup {
  label: string;
  kinds: { value: string; label: string; kind: NewKind }[];
}

/** Everything that may be drawn by somebody with these rights, in the order a steward begins. */
export function kindGroups(may: { stands: boolean; features: boolean; approaches: boolean }): KindGroup[] {
  const groups: KindGroup[] = [];
  if (may.stands) {
    groups.push({
      label: NEW_THING_WORDS.stand,
      kinds: STAND_KINDS.map((what) => ({
        value: `stand:${what}`,
        label: STAND_KIND_WORDS[what],
        kind: { kind: 'stand', what },
      })),
    });
  }
  const ways: KindGroup['kinds'] = [];
  if (may.features) ways.push({ value: 'parking', label: NEW_THING_WORDS.parking, kind: { kind: 'parking' } });
  if (may.approaches) ways.push({ value: 'approach', label: NEW_THING_WORDS.approach, kind: { kind: 'approach' } });
  if (ways.length > 0) groups.push({ label: NEW_THING_WORDS.waysIn, kinds: ways });
  if (may.features) {
    groups.push({
      label: NEW_THING_WORDS.whatDeerUse,
      kinds: FEATURE_KINDS.map((what) => ({
        value: `feature:${what}`,
        label: FEATURE_KIND_WORDS[what],
        kind: { kind: 'feature', what },
      })),
    });
    groups.push({
      label: NEW_THING_WORDS.land,
      kinds: MAP_LAYERS.map((what) => ({
        value: `item:${what}`,
        label: LAYER_WORDS[what],
        kind: { kind: 'item', what },
      })),
    });
  }
  return groups;
}

const ALL_YEAR = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12];
/** An end drawn this near to a stand or parking place is meant to be there. */
const TIE_M = 60;

/** A name nobody has yet: 'Ladder stand 2'. */
export function freshName(things: readonly MapThing[], what: string): string {
  const taken = new Set(things.map((thing) => thing.name.toLowerCase()));
  for (let n = 1; ; n++) {
    const name = `${what} ${n}`;
    if (!taken.has(name.toLowerCase())) return name;
  }
}

export type Made = { ok: true; thing: MapThing } | { ok: false; message: string };

function makeApproach(
  base: { id: string; version: 0 },
  line: Position[],
  things: readonly MapThing[],
  club: MapClub,
  standId: string | null,
): Made {
  const tied = tieDrawn(club, things, line, TIE_M);
  const stand = tied.standId ?? standId ?? things.find((thing) => thing.kind === 'stand')?.id;
  if (!stand) return { ok: false, message: NEW_THING_WORDS.approachNeedsStand };
  const parking = things.find((thing) => thing.id === tied.parkingId);
  return {
    ok: true,
    thing: {
      ...base,
      kind: 'approach',
      name: freshName(
        things,
        parking ? NEW_THING_WORDS.fromParking(parking.name.slice(0, 40)) : NEW_THING_WORDS.approach,
      ).replace(/ 1$/, ''),
      geometry: { type: 'LineString', coordinates: tied.line },
      standId: stand,
      parkingId: tied.parkingId,
      direction: 'both',
      vehicleToIndex: 0,
    },
  };
}

/** A thing of what was drawn, under a name to be changed. `standId`: where a way leads when no stand lies at its end. */
export function makeThing(
  kind: NewKind,
  geometry: DrawnGeometry,
  at: { id: string; things: readonly MapThing[]; club: MapClub; standId: string | null },
): Made {
  const { id, things, club } = at;
  const base = { id, version: 0 as const };
  switch (kind.kind) {
    case 'stand':
      return {
        ok: true,
        thing: {
          ...base,
          kind: 'stand',
          name: freshName(things, NEW_THING_WORDS.stand),
          geometry,
          what: kind.what,
          arcs: [],
          closed: '',
        },
      };
    case 'parking':
      return {
        ok: true,
        thing: { ...base, kind: 'parking', name: freshName(things, NEW_THING_WORDS.parkingName), geometry },
      };
    case 'approach':
      return geometry.type === 'LineString'
        ? makeApproach(base, geometry.coordinates, things, club, at.standId)
        : { ok: false, message: NEW_THING_WORDS.approachIsLine };
    case 'feature': {
      const name = freshName(things, FEATURE_KIND_WORDS[kind.what]);
      return {
        ok: true,
        thing: { ...base, kind: 'feature', name, geometry, what: kind.what, months: ALL_YEAR, crop: null },
      };
    }
    case 'item': {
      const props = kind.what === 'no_shoot' ? { sector: { fromDeg: 0, toDeg: 90, reachM: 200 } } : {};
      return { ok: true, thing: { ...base, kind: 'item', name: '', geometry, what: kind.what, props } };
    }
  }
}
