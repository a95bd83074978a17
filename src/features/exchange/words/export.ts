import type { ExportFormat, ExportLayer } from '../exchange-schema';

export const EXPORT_PAGE_WORDS = {
  title: 'Take the ground out',
  over: 'Ground',
  lead: 'As a file for a handheld, a phone or a map program.',
} as const;

export const LAYER_TITLES: Record<ExportLayer, string> = {
  stands: 'Stands',
  parking: 'Parking places',
  approaches: 'Approaches',
  features: 'What deer use',
  land: 'Land',
};

export const FORMAT_WORDS: Record<ExportFormat, { label: string; note: string }> = {
  gpx: { label: 'GPX', note: 'For handheld receivers and phones; areas become closed tracks' },
  kml: { label: 'KML', note: 'For globes and map programs' },
  kmz: { label: 'KMZ', note: 'The same as KML, packed small' },
  geojson: { label: 'GeoJSON', note: 'For map programs and your own tools' },
  csv: { label: 'CSV', note: 'A table of the points; lines and areas are left out' },
};

export const EXPORT_FORM_WORDS = {
  what: 'What to take out',
  as: 'As',
  secrets: 'Places of stands and cameras are secrets. That you took them out is written in the audit log.',
  nothing: 'There is nothing to take out in this way.',
  take: (things: number) => (things === 1 ? 'Take out one thing' : `Take out ${things} things`),
} as const;

export const EXPORT_ERRORS = { noLayer: 'Choose at least one layer.' } as const;

/** An approach as a file names it. `stand`: null when it is gone. */
export const exportedApproach = (name: string, stand: string | null) => `${name} to ${stand ?? 'a stand'}`;

export const EXPORT_AUDIT = {
  taken: (things: number, format: ExportFormat, layers: ExportLayer[]) =>
    `Took ${things} things of the ground out as ${format.toUpperCase()}: ${layers.map((layer) => LAYER_TITLES[layer].toLowerCase()).join(', ')}.`,
} as const;
