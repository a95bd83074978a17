'use client';

import { useState } from 'react';
import { ButtonLink } from '@/ui/button';
import { CheckboxGroup, RadioCards } from '@/ui/choices';
import { Notice } from '@/ui/notices';
import { EXPORT_FORMATS, EXPORT_LAYERS, type ExportFormat, type ExportLayer } from '../exchange-schema';
import { EXPORT_FORM_WORDS, FORMAT_WORDS, LAYER_TITLES } from '../words/export';

const words = EXPORT_FORM_WORDS;

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
        label={words.what}
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
        label={words.as}
        name="format"
        value={format}
        choices={EXPORT_FORMATS.map((value) => ({ value, ...FORMAT_WORDS[value] }))}
        onChange={({ target }) => {
          const next = EXPORT_FORMATS.find((one) => one === target.value);
          if (next) setFormat(next);
        }}
      />
      <Notice>{words.secrets}</Notice>
      <div>
        {number === 0 ? (
          <p>{words.nothing}</p>
        ) : (
          <ButtonLink
            look="primary"
            href={`/api/clubs/${club}/ground/export?format=${format}&layers=${chosen.join(',')}`}
            download
          >
            {words.take(number)}
          </ButtonLink>
        )}
      </div>
    </div>
  );
}
