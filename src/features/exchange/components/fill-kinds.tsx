'use client';

import { useState } from 'react';
import type { DrawnShape } from '@/core/map-layers';
import { Button } from '@/ui/button';
import { Select } from '@/ui/text-inputs';
import { choicesFor } from '../kind-values';
import { FILL_WORDS } from '../words/import';

const words = FILL_WORDS;

interface FillKindsProps {
  shape: DrawnShape;
  count: number;
  disabled: boolean;
  onFill: (kind: string) => void;
}

/** One kind for everything of a shape that has none. */
export function FillKinds({ shape, count, disabled, onFill }: FillKindsProps) {
  const [kind, setKind] = useState('');

  return (
    <div className="flex flex-wrap items-end gap-2">
      <Select
        label={words.label(shape, count)}
        placeholder={words.choose}
        value={kind}
        disabled={disabled}
        onChange={({ target }) => setKind(target.value)}
      >
        <option value="">{words.choose}</option>
        {choicesFor(shape).map((group) => (
          <optgroup key={group.label} label={group.label}>
            {group.options.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
          </optgroup>
        ))}
      </Select>
      <Button disabled={disabled || kind === ''} onClick={() => onFill(kind)}>
        {words.set[shape]}
      </Button>
    </div>
  );
}
