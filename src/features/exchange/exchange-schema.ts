import { z } from 'zod';
import { MOST_THINGS } from './read/limits';
import { EXPORT_ERRORS } from './words/export';
import { IMPORT_ERRORS } from './words/import';

const id = z.string().min(1).max(40);
const version = z.number().int().min(1).max(1e9);

/** Rows to take, by their place in the file, and as what. */
export const saveImportInput = z.object({
  id,
  version,
  rows: z
    .array(z.object({ row: z.number().int().min(1).max(MOST_THINGS), kind: z.string().min(1).max(40) }))
    .min(1, IMPORT_ERRORS.noRow)
    .max(MOST_THINGS),
});
export type SaveImport = z.output<typeof saveImportInput>;

export const atImport = z.object({ id, version });
export type AtImport = z.output<typeof atImport>;

export const EXPORT_FORMATS = ['gpx', 'kml', 'kmz', 'geojson', 'csv'] as const;
export type ExportFormat = (typeof EXPORT_FORMATS)[number];

export const EXPORT_LAYERS = ['stands', 'parking', 'approaches', 'features', 'land'] as const;
export type ExportLayer = (typeof EXPORT_LAYERS)[number];

/** Layers as 'stands,features'. */
export const exportQuery = z.object({
  format: z.enum(EXPORT_FORMATS),
  layers: z
    .string()
    .max(100)
    .transform((text) => text.split(','))
    .pipe(z.array(z.enum(EXPORT_LAYERS)).min(1, EXPORT_ERRORS.noLayer).max(EXPORT_LAYERS.length)),
});
export type ExportAsk = z.output<typeof exportQuery>;

/** The name a file had on the sender's machine: shown, never used as a path. */
export const uploadQuery = z.object({ name: z.string().trim().min(1).max(200) });
