'use client';

import { useId, useState } from 'react';
import type { DrawnShape } from '@/core/map-layers';
import { type DrawnGeometry, geometryText, parseGeometry } from '@/features/ground/geometry-text';
import { Button } from '@/ui/button';
import { Textarea } from '@/ui/text-inputs';
import type { MapClub } from '../thing';
import { PLACES_WORDS } from '../words/screen';

interface PlacesFieldProps {
  club: MapClub;
  shape: DrawnShape;
  /** null: nothing is there yet. */
  geometry: DrawnGeometry | null;
  action: string;
  onPlaces: (geometry: DrawnGeometry) => void;
}

/** A shape as its places, for hands that type better than they point. */
export function PlacesField({ club, shape, geometry, action, onPlaces }: PlacesFieldProps) {
  const id = useId();
  const [text, setText] = useState(() => (geometry ? geometryText(geometry).text : ''));
  const [problem, setProblem] = useState<string>();
  return (
    <div className="grid gap-2">
      <Textarea
        id={id}
        label={shape === 'point' ? PLACES_WORDS.place : PLACES_WORDS.places}
        hint={shape === 'point' ? PLACES_WORDS.placeHint : PLACES_WORDS.placesHint}
        rows={shape === 'point' ? 2 : 6}
        spellCheck={false}
        value={text}
        error={problem}
        onChange={({ target }) => setText(target.value)}
      />
      <div>
        <Button
          onClick={() => {
            const read = parseGeometry(shape, text, club);
            setProblem(read.ok ? undefined : read.message);
            if (read.ok) onPlaces(read.geometry);
          }}
        >
          {action}
        </Button>
      </div>
    </div>
  );
}
