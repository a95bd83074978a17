'use client';

import { useState } from 'react';
import type { DrawnShape } from '@/core/map-layers';
import { Button } from '@/ui/button';
import { Select } from '@/ui/text-inputs';
import { choicesFor } from '../kind-values';

const MANY = { point: 'points', line: 'lines', area: 'areas' } as const;

interface FillKindsProps {
  shape: DrawnShape;
  count: number;
  disabled: boolean;
  onFill: (kind: string) => void;
}

/** One kind for everything of a shape that has none. */
export function FillKinds({ shape, count, disabled, onFill }: FillKindsProps) {
  const [kind, setKind] = useState('');
  const what = count === 1 ? `the one ${shape}` : `all ${count} ${MANY[shape]}`;
  return (
    <div className="flex flex-wrap items-end gap-2">
      <Select
        label={`Take ${what} without a kind as`}
        placeholder="Choose"
        value={kind}
        disabled={disabled}
        onChange={({ target }) => setKind(target.value)}
      >
        <option value="">Choose</option>
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
        Set {MANY[shape]}
      </Button>
    </div>
  );
}
