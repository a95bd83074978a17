import type { Geometry } from 'geojson';
import { z } from 'zod';
import { FILE_PROBLEMS, THING_PROBLEMS } from '../words/files';
import { FileProblem, lineAt } from './file-problem';
import { MOST_THINGS } from './limits';
import type { RawFile, RawThing } from './raw-thing';

const position = z.array(z.number().nullable()).min(2);
const line = z.array(position);
const simple = [
  z.object({ type: z.literal('Point'), coordinates: position }),
  z.object({ type: z.literal('MultiPoint'), coordinates: line }),
  z.object({ type: z.literal('LineString'), coordinates: line }),
  z.object({ type: z.literal('MultiLineString'), coordinates: z.array(line) }),
  z.object({ type: z.literal('Polygon'), coordinates: z.array(line) }),
  z.object({ type: z.literal('MultiPolygon'), coordinates: z.array(z.array(line)) }),
] as const;
const geometry = z.discriminatedUnion('type', [
  ...simple,
  z.object({
    type: z.literal('GeometryCollection'),
    geometries: z.array(z.discriminatedUnion('type', [...simple])),
  }),
]);
const feature = z.object({
  type: z.literal('Feature'),
  properties: z.record(z.string(), z.unknown()).nullish(),
  geometry: z.unknown(),
});
const collection = z.object({ type: z.literal('FeatureCollection'), features: z.array(z.unknown()) });
const named = z.object({ crs: z.object({ properties: z.object({ name: z.string() }) }) });

/** JSON with where it breaks; NaN and Infinity, which some tools write, are told by name. */
function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    const stray = /[:[,]\s*-?(NaN|Infinity|nan|inf)\b/.exec(text);
    if (stray) {
      throw new FileProblem(FILE_PROBLEMS.strayNumber(lineAt(text, stray.index), stray[1] ?? ''));
    }
    const position = /position (\d+)/.exec(error instanceof Error ? error.message : '')?.[1];
    throw new FileProblem(
      position === undefined ? FILE_PROBLEMS.noJson : FILE_PROBLEMS.noJsonFrom(lineAt(text, Number(position))),
    );
  }
}

const WORLD = /(CRS84|EPSG:+4326|EPSG:+4979|CRS83|EPSG:+4269)$/i;

function refuseOtherSystem(value: unknown): void {
  const name = named.safeParse(value).data?.crs.properties.name;
  if (name === undefined || WORLD.test(name)) return;
  throw new FileProblem(FILE_PROBLEMS.otherSystem(name.slice(0, 40)));
}

const text = (value: unknown): string =>
  typeof value === 'string' ? value : typeof value === 'number' ? String(value) : '';

function pick(properties: Record<string, unknown>, names: string[]): string {
  const keys = new Map(Object.keys(properties).map((key) => [key.toLowerCase(), key]));
  for (const name of names) {
    const found = text(properties[keys.get(name) ?? '']);
    if (found) return found;
  }
  return '';
}

function readFeature(value: unknown, number: number): RawThing {
  const parsed = feature.safeParse(value);
  if (!parsed.success) {
    return { name: '', notes: '', told: '', geometry: null, problem: THING_PROBLEMS.noFeature(number) };
  }
  const properties = parsed.data.properties ?? {};
  const said = {
    name: pick(properties, ['name', 'title', 'label', 'id']),
    notes: pick(properties, ['notes', 'desc', 'description', 'comment', 'cmt']),
    told: [
      pick(properties, ['kind']),
      pick(properties, ['type', 'category', 'class']),
      pick(properties, ['sym', 'symbol', 'icon']),
    ]
      .filter(Boolean)
      .join(' '),
  };
  const shape = geometry.safeParse(parsed.data.geometry);
  if (!shape.success) return { ...said, geometry: null, problem: THING_PROBLEMS.noShape(number) };
  // Nulls among the numbers are found with everything else that is no place.
  return { ...said, geometry: shape.data as Geometry };
}

/** GeoJSON (RFC 7946): a collection, one feature or one bare shape. */
export function readGeoJson(text: string): RawFile {
  const value = parseJson(text);
  refuseOtherSystem(value);
  const many = collection.safeParse(value);
  if (many.success) {
    if (many.data.features.length > MOST_THINGS) {
      throw new FileProblem(FILE_PROBLEMS.features(many.data.features.length, MOST_THINGS));
    }
    return { things: many.data.features.map((one, i) => readFeature(one, i + 1)), remarks: [] };
  }
  const one = feature.safeParse(value);
  if (one.success) return { things: [readFeature(value, 1)], remarks: [] };
  if (geometry.safeParse(value).success) {
    return { things: [readFeature({ type: 'Feature', properties: {}, geometry: value }, 1)], remarks: [] };
  }
  throw new FileProblem(FILE_PROBLEMS.noGeoJson);
}
