import type { Position } from 'geojson';
import type { Tx } from '@/db/client';
import type { MadeThing } from '@/db/schema';
import { tieEnds } from '@/features/ground/approach-schema';
import { insertApproach, insertFeature, insertMapItem, insertParking, insertStand } from '@/features/ground/data';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { tieDrawn } from '@/features/map/drawing/follow';
import type { NewKind } from '@/features/map/drawing/kinds';
import { drawnStandDefaults } from '@/features/map/new-stand';
import type { MapThing } from '@/features/map/thing';
import { newId } from '@/lib/ids';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { FreshNames } from './fresh-names';
import { IMPORT_ERRORS, PLAIN_NAMES } from './words/import';

/** What a way's end may lie off the stand or the parking place it belongs to. */
const TIE_M = 60;
const ALL_YEAR = [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12];

export interface Taken {
  row: number;
  name: string;
  notes: string;
  geometry: DrawnGeometry;
  kind: NewKind;
  label: string;
}

/** One import being saved. `ends`: the stands and parking places there are by now. */
export class Taking {
  readonly made: MadeThing[] = [];
  private readonly names: Record<'stand' | 'parking' | 'feature', FreshNames>;
  private readonly ways = new Map<string, FreshNames>();

  constructor(
    private readonly scope: ClubScope,
    private readonly tx: Tx,
    private readonly now: number,
    private readonly ends: MapThing[],
    taken: { stand: string[]; parking: string[]; feature: string[]; ways: { standId: string; name: string }[] },
  ) {
    this.names = {
      stand: new FreshNames(taken.stand),
      parking: new FreshNames(taken.parking),
      feature: new FreshNames(taken.feature),
    };
    for (const { standId } of taken.ways) {
      const own = taken.ways.filter((way) => way.standId === standId).map(({ name }) => name);
      if (!this.ways.has(standId)) this.ways.set(standId, new FreshNames(own));
    }
  }

  /** Ways must come after the stands and parking places they join. */
  async add(thing: Taken): Promise<void> {
    const { kind, geometry } = thing;
    if (kind.kind === 'stand' || kind.kind === 'parking') return this.addPlace(thing, kind);
    if (kind.kind === 'approach') return this.addWay(thing);
    const { scope, tx } = this;
    if (kind.kind === 'feature') {
      const id = newId('feature');
      const name = this.names.feature.take(thing.name, thing.label);
      const rest = { months: ALL_YEAR, use: null, notes: thing.notes };
      await insertFeature(scope, tx, { id, name, kind: kind.what, geometry, ...rest });
      this.made.push({ kind: 'feature', id, name });
      return;
    }
    const id = newId('mapItem');
    const props = kind.what === 'no_shoot' ? { sector: { fromDeg: 0, toDeg: 90, reachM: 200 } } : {};
    await insertMapItem(scope, tx, { id, name: thing.name, layer: kind.what, geometry, props, notes: thing.notes });
    this.made.push({ kind: 'item', id, name: thing.name || thing.label });
  }

  private async addPlace(thing: Taken, kind: Extract<NewKind, { kind: 'stand' | 'parking' }>): Promise<void> {
    const { scope, tx, now } = this;
    const [lon = 0, lat = 0] = thing.geometry.type === 'Point' ? thing.geometry.coordinates : [];
    const id = newId(kind.kind);
    const name = this.names[kind.kind].take(thing.name, PLAIN_NAMES[kind.kind]);
    const base = { id, version: 1, name, geometry: thing.geometry };
    if (kind.kind === 'stand') {
      const values = { ...drawnStandDefaults(kind.what), kind: kind.what, arcs: [], notes: thing.notes };
      await insertStand(scope, tx, { ...values, id, name, lat, lon, createdAt: now });
      this.ends.push({ ...base, kind: 'stand', what: kind.what, arcs: [], closed: '' });
    } else {
      await insertParking(scope, tx, { id, name, lat, lon, notes: thing.notes });
      this.ends.push({ ...base, kind: 'parking' });
    }
    this.made.push({ kind: kind.kind, id, name });
  }

  private async addWay(thing: Taken): Promise<void> {
    const { scope, tx, ends } = this;
    const line: Position[] = thing.geometry.type === 'LineString' ? thing.geometry.coordinates : [];
    const tied = tieDrawn(scope.club, ends, line, TIE_M);
    const place = (id: string | null) => {
      const end = ends.find((one) => one.id === id);
      if (end?.geometry.type !== 'Point') return undefined;
      const [lon = 0, lat = 0] = end.geometry.coordinates;
      return { name: end.name, lat, lon };
    };
    const stand = place(tied.standId);
    if (!stand || tied.standId === null) {
      throw new AppError('invalid', IMPORT_ERRORS.noStand(thing.row, thing.name));
    }
    const parking = place(tied.parkingId);
    const names = this.ways.get(tied.standId) ?? new FreshNames([]);
    this.ways.set(tied.standId, names);
    const id = newId('approach');
    const name = names.take(thing.name, parking ? PLAIN_NAMES.approachFrom(parking.name) : PLAIN_NAMES.approach);
    await insertApproach(scope, tx, {
      id,
      name,
      standId: tied.standId,
      parkingId: parking ? tied.parkingId : null,
      direction: 'both',
      points: tieEnds(scope.club, tied.line, { stand, parking }).points,
      vehicleToIndex: 0,
      notes: thing.notes,
    });
    this.made.push({ kind: 'approach', id, name });
  }
}
