import L from 'leaflet';
import { type LabelWish, placeLabels } from '../drawing/place-labels';
import type { MapThing } from '../thing';
import { boundsOf, CLOSE_ZOOM } from './make-map';

const HEIGHT_PX = 15;
const STAND_CLEAR_PX = 13;
const MARK_CLEAR_PX = 9;
/** Names of ways are for a close look. */
const WAYS_FROM_ZOOM = 16;
/** Land without room for its name on the screen keeps it for itself, px across. */
const LEAST_LAND_PX = 40;

function rankOf(thing: MapThing, selectedId: string | null): number {
  if (thing.id === selectedId) return 0;
  return { stand: 1, parking: 2, feature: 3, item: 4, approach: 5 }[thing.kind];
}

function classOf(thing: MapThing): string {
  if (thing.kind === 'item') return 'm-label m-label-land';
  return thing.kind === 'feature' ? 'm-label m-label-feature' : 'm-label';
}

function bracketed(thing: MapThing, zoom: number): boolean {
  return thing.kind === 'stand' && thing.arcs.length > 0 && zoom >= CLOSE_ZOOM;
}

/** Words beside the marks, chosen anew after each move so that none lies on another. */
export function paintLabels(map: L.Map) {
  let things: readonly MapThing[] = [];
  let selectedId: string | null = null;
  const pane = map.getPane('labels');
  const brush = document.createElement('canvas').getContext('2d');
  const widths = new Map<string, number>();

  function widthOf(text: string): number {
    const known = widths.get(text);
    if (known !== undefined) return known;
    if (brush) brush.font = `600 12px ${getComputedStyle(map.getContainer()).fontFamily}`;
    const width = Math.ceil(brush?.measureText(text).width ?? text.length * 7) + 2;
    widths.set(text, width);
    return width;
  }

  function wishOf(thing: MapThing, zoom: number): LabelWish | null {
    const text = thing.kind === 'feature' && thing.crop ? `${thing.name}: ${thing.crop}` : thing.name;
    if (text === '' || (thing.kind === 'approach' && zoom < WAYS_FROM_ZOOM)) return null;
    const size = { id: thing.id, width: widthOf(text), height: HEIGHT_PX, must: thing.id === selectedId };
    if (thing.geometry.type === 'Point') {
      const [lon = 0, lat = 0] = thing.geometry.coordinates;
      const { x, y } = map.latLngToContainerPoint([lat, lon]);
      return { ...size, x, y, clear: bracketed(thing, zoom) ? 26 : MARK_CLEAR_PX };
    }
    if (thing.geometry.type === 'LineString') {
      const middle = thing.geometry.coordinates[Math.floor(thing.geometry.coordinates.length / 2)];
      const { x, y } = map.latLngToContainerPoint([middle?.[1] ?? 0, middle?.[0] ?? 0]);
      return { ...size, x, y, clear: 2 };
    }
    const bounds = boundsOf([thing.geometry]);
    const [a, b] = [
      map.latLngToContainerPoint(bounds.getNorthWest()),
      map.latLngToContainerPoint(bounds.getSouthEast()),
    ];
    if (b.x - a.x < LEAST_LAND_PX) return null;
    if (thing.kind === 'item' && thing.what === 'boundary') return null;
    return { ...size, x: (a.x + b.x) / 2, y: (a.y + b.y) / 2, clear: 0, centred: true };
  }

  function paint(): void {
    if (!pane) return;
    const zoom = map.getZoom();
    const { x: width, y: height } = map.getSize();
    const seen = ({ x, y }: { x: number; y: number }) => x > -60 && y > -20 && x < width + 60 && y < height + 20;
    const marks = things.flatMap((thing) => {
      if (thing.geometry.type !== 'Point') return [];
      const [lon = 0, lat = 0] = thing.geometry.coordinates;
      const at = map.latLngToContainerPoint([lat, lon]);
      return seen(at) ? [{ ...at, clear: thing.kind === 'stand' ? STAND_CLEAR_PX : MARK_CLEAR_PX }] : [];
    });
    const wishes = things
      .toSorted((a, b) => rankOf(a, selectedId) - rankOf(b, selectedId))
      .flatMap((thing) => {
        const wish = wishOf(thing, zoom);
        return wish && seen(wish) ? [wish] : [];
      });
    const byId = new Map(things.map((thing) => [thing.id, thing]));
    pane.replaceChildren(
      ...placeLabels(wishes, marks, { width, height }).flatMap(({ id, left, top }) => {
        const thing = byId.get(id);
        if (!thing) return [];
        const label = document.createElement('div');
        label.className = classOf(thing);
        label.textContent = thing.kind === 'feature' && thing.crop ? `${thing.name}: ${thing.crop}` : thing.name;
        L.DomUtil.setPosition(label, map.containerPointToLayerPoint([left, top]));
        return [label];
      }),
    );
  }

  map.on('moveend zoomend resize viewreset', paint);
  return {
    update(next: readonly MapThing[], selected: string | null): void {
      things = next;
      selectedId = selected;
      paint();
    },
    destroy(): void {
      map.off('moveend zoomend resize viewreset', paint);
    },
  };
}
