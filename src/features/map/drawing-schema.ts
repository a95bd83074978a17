import { z } from 'zod';
import { FEATURE_KINDS, STAND_KINDS } from '@/core/ground-types';
import { MAP_LAYERS } from '@/core/map-layers';
import { LINE_MAX } from '@/features/ground/read-form';
import { THING_KINDS } from './thing';
import { MAP_ERRORS } from './words/errors';

/** Changes that one saving takes. */
export const MOST_CHANGES = 500;

const id = z.string().min(1).max(40);
const version = z.number().int().min(0).max(1e9);
const name = z.string().max(LINE_MAX, MAP_ERRORS.long(LINE_MAX));
const deg = z.number().min(0).max(360);
const position = z.array(z.number()).min(2).max(4);
const line = z.array(position).min(2).max(1000);
const point = z.object({ type: z.literal('Point'), coordinates: position });
const lineString = z.object({ type: z.literal('LineString'), coordinates: line });
const polygon = z.object({ type: z.literal('Polygon'), coordinates: z.array(line).min(1).max(50) });
const drawn = z.discriminatedUnion('type', [point, lineString, polygon]);

const arc = z.object({ fromDeg: deg, toDeg: deg, window: z.enum(['morning', 'evening']).nullable() });
/** A geometry left out stays as it is stored: only what was drawn is sent. */
const base = { op: z.literal('set'), id, version, name };

export const drawingChange = z.union([
  z.object({ op: z.literal('remove'), kind: z.enum(THING_KINDS), id, version }),
  z.object({
    ...base,
    kind: z.literal('stand'),
    geometry: point.optional(),
    what: z.enum(STAND_KINDS),
    arcs: z.array(arc).max(72),
  }),
  z.object({ ...base, kind: z.literal('parking'), geometry: point.optional() }),
  z.object({
    ...base,
    kind: z.literal('approach'),
    geometry: lineString.optional(),
    standId: id,
    parkingId: id.nullable(),
    direction: z.enum(['in', 'out', 'both']),
    vehicleToIndex: z.number().int().min(0).max(1000),
  }),
  z.object({ ...base, kind: z.literal('feature'), geometry: drawn.optional(), what: z.enum(FEATURE_KINDS) }),
  z.object({
    ...base,
    kind: z.literal('item'),
    geometry: drawn.optional(),
    what: z.enum(MAP_LAYERS),
    props: z.object({
      cutYear: z.number().int().min(1900).max(2200).optional(),
      sector: z.object({ fromDeg: deg, toDeg: deg, reachM: z.number().min(1).max(5000) }).optional(),
      facingDeg: deg.optional(),
    }),
  }),
]);
export type DrawingChange = z.output<typeof drawingChange>;
export type SetChange = Extract<DrawingChange, { op: 'set' }>;

export const drawingInput = z.object({
  changes: z.array(drawingChange).min(1, MAP_ERRORS.nothing).max(MOST_CHANGES, MAP_ERRORS.mostChanges(MOST_CHANGES)),
});

/** A thing that somebody else saved or removed after it was opened here. */
export interface DrawingConflict {
  id: string;
  kind: (typeof THING_KINDS)[number];
  name: string;
  /** Who changed it last. */
  who: string;
  /** It is no longer there. */
  gone: boolean;
}

/** Nothing is saved while there is a conflict. `ids`: what things drawn anew are called now. */
export type DrawingAnswer =
  | { saved: true; ids: Record<string, string>; count: number }
  | { saved: false; conflicts: DrawingConflict[] };
