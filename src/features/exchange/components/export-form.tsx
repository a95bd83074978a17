'use client';

import { useState } from 'react';
import { ButtonLink } from '@/ui/button';
import { CheckboxGroup, RadioCards } from '@/ui/choices';
import { Notice } from '@/ui/notices';
import { EXPORT_FORMATS, EXPORT_LAYERS, type ExportFormat, type ExportLayer } from '../exchange-schema';
import { LAYER_TITLES } from '../write/exported';

const FORMAT_NOTES: Record<ExportFormat, { label: string; note: string }> = {
  gpx: { label: 'GPX', note: 'For handheld receivers and phones; areas become closed tracks' },
  kml: { label: 'KML', note: 'For globes and map programs' },
  kmz: { label: 'KMZ', note: 'The same as KML, packed small' },
  geojson: { label: 'GeoJSON', note: 'For map programs and your own tools' },
  csv: { label: 'CSV', note: 'A table of the points; lines and areas are left out' },
};

interface ExportFormProps {
  club: string;
  counts: Record<ExportLayer, { all: number; points: number }>;
}

/** What to take out and as what; the file is made when it is asked for. */
export function ExportForm({ club, counts }: ExportFormProps) {
  const [format, setFormat] = useState<ExportFormat>('gpx');
  const [layers, setLayers] = useState<ReadonlySet<ExportLayer>>(new Set(EXPORT_LAYERS));
  const chosen = EXPORT_LAYERS.filter((layer) => layers.has(layer));
  const number = chosen.reduce((sum, layer) => sum + counts[layer][format === 'csv' ? 'points' : 'all'], 0);
  return (
    <div className="grid max-w-2xl gap-5">
      <CheckboxGroup
        label="What to take out"
        choices={EXPORT_LAYERS.map((value) => ({ value, label: LAYER_TITLES[value], note: String(counts[value].all) }))}
        value={chosen}
        onChange={({ target }) => {
          const layer = EXPORT_LAYERS.find((one) => one === target.value);
          if (!layer) return;
          const next = new Set(layers);
          if (target.checked) next.add(layer);
          else next.delete(layer);
          setLayers(next);
        }}
      />
      <RadioCards
        label="As"
        name="format"
        value={format}
        choices={EXPORT_FORMATS.map((value) => ({ value, ...FORMAT_NOTES[value] }))}
        onChange={({ target }) => {
          const next = EXPORT_FORMATS.find((one) => one === target.value);
          if (next) setFormat(next);
        }}
      />
      <Notice>Places of stands and cameras are secrets. That you took them out is written in the audit log.</Notice>
      <div>
        {number === 0 ? (
          <p>There is nothing to take out in this way.</p>
        ) : (
          <ButtonLink
            look="primary"
            href={`/api/clubs/${club}/ground/export?format=${format}&layers=${chosen.join(',')}`}
            prefetch={false}
            download
          >
            Take out {number === 1 ? 'one thing' : `${number} things`}
          </ButtonLink>
        )}
      </div>
    </div>
  );
}
