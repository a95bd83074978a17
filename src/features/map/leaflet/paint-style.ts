import type { PathOptions } from 'leaflet';
import type { MapThing } from '../thing';

/** The pane each kind lies in, from the ground up. */
export const PANES = { cover: 401, contours: 405, features: 410, scent: 415, ways: 420, labels: 560 } as const;
export type PaneName = keyof typeof PANES;

export function paneOf(thing: MapThing): PaneName {
  if (thing.kind === 'feature') return 'features';
  if (thing.kind === 'approach') return 'ways';
  if (thing.kind === 'item' && ['boundary', 'road', 'trail', 'no_shoot'].includes(thing.what)) return 'ways';
  return 'cover';
}

/** The classes that map.css dresses a line or an area by. */
export function classOf(thing: MapThing): string {
  switch (thing.kind) {
    case 'feature':
      return `m-path m-feature ${['crop', 'water'].includes(thing.what) ? `m-feature-${thing.what}` : `m-${thing.what}`}`;
    case 'item': {
      const area = thing.geometry.type === 'Polygon' || thing.geometry.type === 'MultiPolygon';
      const cut = thing.what === 'wood' && thing.props.cutYear !== undefined;
      return `m-path ${cut ? 'm-cut' : `m-${thing.what}`}${area ? ' m-area' : ''}`;
    }
    default:
      return `m-path m-${thing.kind}`;
  }
}

/** Colours of the light that is on, for what cannot be dressed by a style sheet. */
export interface Inks {
  ink: `#${string}`;
  soft: `#${string}`;
  moss: `#${string}`;
  clay: `#${string}`;
  panel: `#${string}`;
}

export function readInks(element: Element): Inks {
  const style = getComputedStyle(element);
  const read = (name: string, fallback: `#${string}`): `#${string}` => {
    const value = style.getPropertyValue(`--color-${name}`).trim();
    return /^#[0-9a-f]{6}$/i.test(value) ? (value as `#${string}`) : fallback;
  };
  return {
    ink: read('ink', '#23261f'),
    soft: read('ink-soft', '#56574a'),
    moss: read('moss', '#44562a'),
    clay: read('clay', '#8f4228'),
    panel: read('panel', '#fbf8f0'),
  };
}

/** The same for a canvas, where thousands of shapes lie: colour and dash in place of patterns. */
export function canvasStyle(thing: MapThing, inks: Inks): PathOptions {
  const base: PathOptions = { color: inks.soft, weight: 1.2, fill: false, opacity: 0.9 };
  if (thing.kind === 'feature') {
    const dashed = thing.what === 'travel_line' || thing.what === 'sanctuary';
    return {
      ...base,
      color: inks.moss,
      fill: !dashed,
      fillColor: inks.moss,
      fillOpacity: 0.16,
      ...(dashed ? { dashArray: '8 5' } : {}),
    };
  }
  if (thing.kind === 'approach') return { ...base, color: inks.ink, weight: 2, dashArray: '2 5' };
  if (thing.kind !== 'item') return base;
  switch (thing.what) {
    case 'boundary':
      return { ...base, color: inks.ink, weight: 2.5, dashArray: '14 4 2 4' };
    case 'closed_area':
    case 'hazard':
      return { ...base, color: inks.clay, fill: true, fillColor: inks.clay, fillOpacity: 0.15 };
    case 'wood':
      return { ...base, color: inks.moss, fill: true, fillColor: inks.moss, fillOpacity: 0.12, weight: 0.75 };
    case 'trail':
      return { ...base, dashArray: '7 5' };
    case 'water':
      return { ...base, fill: thing.geometry.type === 'Polygon', fillColor: inks.soft, fillOpacity: 0.2, weight: 1.8 };
    default:
      return base;
  }
}
