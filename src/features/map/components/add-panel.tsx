'use client';

import { LocateFixed, Pencil } from 'lucide-react';
import { useState } from 'react';
import type { DrawnShape } from '@/core/map-layers';
import type { DrawnGeometry } from '@/features/ground/geometry-text';
import { SHAPE_WORDS } from '@/features/ground/words/kinds';
import { Button } from '@/ui/button';
import { Select } from '@/ui/text-inputs';
import { kindGroups, type NewKind, shapesOf } from '../drawing/kinds';
import type { MapView } from '../thing';
import { ADD_WORDS } from '../words/editing';
import { PlacesField } from './places-field';

interface AddPanelProps {
  view: Pick<MapView, 'club' | 'may'>;
  onDraw: (kind: NewKind, shape: DrawnShape) => void;
  onHere: (kind: NewKind) => void;
  onPlaces: (kind: NewKind, geometry: DrawnGeometry) => void;
}

/** What to add, and how: by hand, by standing there, or by numbers. */
export function AddPanel({ view, onDraw, onHere, onPlaces }: AddPanelProps) {
  const groups = kindGroups(view.may);
  const kinds = groups.flatMap((group) => group.kinds);
  const [value, setValue] = useState(kinds[0]?.value ?? '');
  const [wanted, setWanted] = useState<DrawnShape | null>(null);
  const kind = kinds.find((one) => one.value === value)?.kind ?? kinds[0]?.kind;
  if (!kind) return null;
  const shapes = shapesOf(kind);
  const shape = shapes.find((one) => one === wanted) ?? shapes[0] ?? 'point';
  return (
    <section aria-label={ADD_WORDS.title} className="grid gap-3 border-rule border-b pb-4">
      <div className="grid grid-cols-[1fr_auto] items-end gap-2">
        <Select
          label={ADD_WORDS.add}
          value={value}
          onChange={({ target }) => {
            setValue(target.value);
            setWanted(null);
          }}
        >
          {groups.map((group) => (
            <optgroup key={group.label} label={group.label}>
              {group.kinds.map((one) => (
                <option key={one.value} value={one.value}>
                  {one.label}
                </option>
              ))}
            </optgroup>
          ))}
        </Select>
        {shapes.length > 1 && (
          <Select
            label={ADD_WORDS.as}
            value={shape}
            options={shapes.map((one) => ({ value: one, label: SHAPE_WORDS[one] }))}
            onChange={({ target }) => setWanted(shapes.find((one) => one === target.value) ?? null)}
          />
        )}
      </div>
      <div className="flex flex-wrap gap-2">
        <Button look="primary" onClick={() => onDraw(kind, shape)}>
          <Pencil aria-hidden="true" className="size-4" /> {ADD_WORDS.draw}
        </Button>
        {shape === 'point' && (
          <Button onClick={() => onHere(kind)}>
            <LocateFixed aria-hidden="true" className="size-4" /> {ADD_WORDS.here}
          </Button>
        )}
      </div>
      <details>
        <summary className="min-h-11 py-2">{ADD_WORDS.type}</summary>
        <PlacesField
          key={`${value} ${shape}`}
          club={view.club}
          shape={shape}
          geometry={null}
          action={ADD_WORDS.addTyped}
          onPlaces={(geometry) => onPlaces(kind, geometry)}
        />
      </details>
    </section>
  );
}
