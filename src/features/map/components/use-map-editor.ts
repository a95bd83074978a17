'use client';

import type { Position } from 'geojson';
import { useEffect, useMemo, useRef, useState } from 'react';
import type { GoodWindArc } from '@/core/ground-types';
import type { DrawnShape } from '@/core/map-layers';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { touchedCorner, withoutCorner } from '../drawing/corners';
import { addThing, removeThing, replaceThing, setThings } from '../drawing/drawing';
import { followMove } from '../drawing/follow';
import { freshName, makeThing, type NewKind } from '../drawing/kinds';
import { isDrawn } from '../drawing/list-changes';
import { splitArea, splitLine } from '../drawing/split';
import type { MapThing, MapView } from '../thing';
import { MAP_EDITOR_WORDS } from '../words/screen';
import { whatOf } from '../words/things';
import type { Here } from './here-panel';
import type { MapHandle, MapTool } from './map-canvas';
import { newThingId, type useDrawing } from './use-drawing';

/** What the person is about. */
export type Doing =
  | { mode: 'look' }
  | { mode: 'add'; kind: NewKind; shape: DrawnShape }
  | { mode: 'here'; kind: NewKind }
  /** Taken up anew with each round: the shape was changed by other means than the hand. */
  | { mode: 'reshape'; id: string; round: number }
  | { mode: 'split'; id: string; shape: DrawnShape }
  | { mode: 'measure' };

const LOOK: Doing = { mode: 'look' };

function toolOf(doing: Doing): MapTool {
  switch (doing.mode) {
    case 'add':
      return { mode: 'draw', shape: doing.shape };
    case 'split':
      return { mode: 'draw', shape: doing.shape === 'area' ? 'line' : 'point' };
    case 'reshape':
      return { mode: 'reshape', id: doing.id, round: doing.round };
    case 'measure':
      return { mode: 'measure' };
    default:
      return { mode: 'look' };
  }
}

/** Everything a hand does on the map, turned into steps of the drawing. */
export function useMapEditor(
  view: Pick<MapView, 'club'>,
  state: ReturnType<typeof useDrawing>,
  firstId: string | null,
) {
  const { club } = view;
  const { things, change } = state;
  const map = useRef<MapHandle>(null);
  const [selectedId, setSelectedId] = useState(firstId);
  const [doing, setDoing] = useState<Doing>(LOOK);
  const [progress, setProgress] = useState<DrawnGeometry | null>(null);
  const [measured, setMeasured] = useState<readonly Position[]>([]);
  const [here, setHere] = useState<Here | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const [corner, setCorner] = useState<Position | null>(null);
  const selected = things.find((thing) => thing.id === selectedId) ?? null;
  const tool = useMemo(() => toolOf(doing), [doing]);

  function begin(next: Doing): void {
    setProgress(null);
    setProblem(null);
    setHere(null);
    setCorner(null);
    setDoing(next);
  }

  useEffect(() => {
    if (doing.mode === 'look') return;
    const stop = (event: KeyboardEvent) => {
      if (event.key === 'Escape') setDoing(LOOK);
    };
    window.addEventListener('keydown', stop);
    return () => window.removeEventListener('keydown', stop);
  }, [doing]);

  function add(kind: NewKind, geometry: DrawnGeometry): void {
    const standId = selected?.kind === 'stand' ? selected.id : null;
    const made = makeThing(kind, geometry, { id: newThingId(), things, club, standId });
    begin(LOOK);
    if (!made.ok) {
      setProblem(made.message);
      return;
    }
    change((drawing) => addThing(drawing, made.thing));
    setSelectedId(made.thing.id);
  }

  /** Puts a thing in its own place; what is tied to it follows. */
  function put(thing: MapThing, tag: string | null): void {
    const before = things.find((one) => one.id === thing.id);
    const followers = before && before.geometry !== thing.geometry ? followMove(club, things, before, thing) : [];
    change((drawing) => setThings(drawing, [thing, ...followers], tag));
  }

  function split(id: string, cut: DrawnGeometry): void {
    begin(LOOK);
    const thing = things.find((one) => one.id === id);
    if (!thing || !isDrawn(thing.geometry)) return;
    const { geometry } = thing;
    const parts =
      geometry.type === 'LineString' && cut.type === 'Point'
        ? splitLine(club, geometry, cut.coordinates)
        : geometry.type === 'Polygon' && cut.type === 'LineString'
          ? splitArea(club, geometry, cut.coordinates)
          : null;
    if (!parts) return;
    if (!parts.ok) {
      setProblem(parts.message);
      return;
    }
    const pieces: MapThing[] = [];
    parts.parts.forEach((part, i) => {
      if (i === 0) pieces.push({ ...thing, geometry: part });
      else {
        const name = thing.name === '' ? '' : freshName([...things, ...pieces], thing.name || whatOf(thing));
        pieces.push({ ...thing, id: newThingId(), version: 0, name, geometry: part });
      }
    });
    change((drawing) => replaceThing(drawing, id, pieces));
  }

  return {
    map,
    tool,
    doing,
    begin,
    stop: () => begin(LOOK),
    selected,
    selectedId: selected ? selectedId : null,
    select(id: string | null): void {
      setProblem(null);
      setSelectedId(id);
    },
    choose(id: string): void {
      setSelectedId(id);
      const thing = things.find((one) => one.id === id);
      if (thing) map.current?.show(thing);
    },
    progress,
    setProgress,
    measured,
    setMeasured,
    here,
    setHere,
    problem,
    setProblem,
    add,
    put,
    remove(id: string): void {
      change((drawing) => removeThing(drawing, id));
      setSelectedId(null);
      begin(LOOK);
    },
    drawn(geometry: DrawnGeometry): void {
      if (doing.mode === 'add') add(doing.kind, geometry);
      else if (doing.mode === 'split') split(doing.id, geometry);
    },
    reshaped(geometry: DrawnGeometry): void {
      const thing = doing.mode === 'reshape' ? things.find((one) => one.id === doing.id) : undefined;
      if (!thing) return;
      setCorner(isDrawn(thing.geometry) ? touchedCorner(thing.geometry, geometry) : null);
      put({ ...thing, geometry }, null);
    },
    /** The corner of the shape in hand that was moved last. */
    corner,
    takeOut(at: Position): void {
      if (doing.mode !== 'reshape') return;
      const thing = things.find((one) => one.id === doing.id);
      const geometry = thing && isDrawn(thing.geometry) ? withoutCorner(thing.geometry, at) : null;
      if (!thing || !geometry) {
        setProblem(MAP_EDITOR_WORDS.noMoreCorners);
        return;
      }
      put({ ...thing, geometry }, null);
      begin({ ...doing, round: doing.round + 1 });
    },
    turn(arcs: GoodWindArc[]): void {
      if (selected?.kind === 'stand') put({ ...selected, arcs }, `turn:${selected.id}`);
    },
    renamed(ids: Record<string, string>): void {
      setSelectedId((id) => (id === null ? null : (ids[id] ?? id)));
    },
  };
}
export type MapEditor = ReturnType<typeof useMapEditor>;
