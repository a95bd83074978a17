'use client';

import { useState } from 'react';
import type { GoodWindArc } from '@/core/ground-types';
import { ARC_FIELDS, arcText, readArcs } from '@/features/ground/arc-text';
import { Button } from '@/ui/button';
import { TextInput } from '@/ui/text-inputs';
import { ARC_WORDS } from '../words/editing';

const LABELS = {
  arcsBoth: ARC_WORDS.goodWinds,
  arcsMorning: ARC_WORDS.morningOnly,
  arcsEvening: ARC_WORDS.eveningOnly,
} as const;

/** A quarter to begin with, about the wind that most often blows: it is there to be turned. */
const FIRST_ARC: GoodWindArc = { fromDeg: 270, toDeg: 0, window: null };

/** A stand's winds in words; the same as turning the brackets by hand. */
export function ArcFields({
  arcs,
  onChange,
}: {
  arcs: readonly GoodWindArc[];
  onChange: (arcs: GoodWindArc[], field: string) => void;
}) {
  const [typed, setTyped] = useState<{ name: string; text: string } | null>(null);
  return (
    <fieldset className="grid gap-3">
      <legend className="sr-only">{ARC_WORDS.goodWinds}</legend>
      {ARC_FIELDS.map(({ name, window }) => {
        const text = typed?.name === name ? typed.text : arcText(arcs, window);
        const read = readArcs(text, window);
        return (
          <TextInput
            key={name}
            label={LABELS[name]}
            hint={name === 'arcsBoth' ? ARC_WORDS.hint : undefined}
            optional={name !== 'arcsBoth'}
            autoComplete="off"
            autoCapitalize="characters"
            spellCheck={false}
            value={text}
            error={read.ok ? undefined : read.message}
            onChange={({ target }) => {
              setTyped({ name, text: target.value });
              const next = readArcs(target.value, window);
              if (next.ok) onChange([...arcs.filter((arc) => arc.window !== window), ...next.arcs], name);
            }}
            onBlur={() => setTyped(null)}
          />
        );
      })}
      {arcs.length === 0 ? (
        <Button onClick={() => onChange([FIRST_ARC], 'first')}>{ARC_WORDS.hand}</Button>
      ) : (
        <p className="text-ink-soft text-sm">{ARC_WORDS.handles}</p>
      )}
    </fieldset>
  );
}
