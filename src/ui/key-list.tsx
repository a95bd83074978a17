'use client';

import { Checkbox } from './choices';
import { Dialog } from './dialog';

export interface KeyListProps {
  places: readonly { key: string; label: string }[];
  off: boolean;
  onOff: (off: boolean) => void;
  onClose: () => void;
}

const HERE = [
  { keys: ['?'], label: 'This list' },
  { keys: ['j'], label: 'Next stand of the list' },
  { keys: ['k'], label: 'Stand before it' },
  { keys: ['Enter'], label: 'Open or fold the stand' },
  { keys: ['['], label: 'The window before' },
  { keys: [']'], label: 'The window after' },
  { keys: ['Esc'], label: 'Close what is open' },
];

function Keys({ keys }: { keys: string[] }) {
  return (
    <span className="flex gap-1">
      {keys.map((key) => (
        <kbd key={key} className="min-w-7 border border-rule-strong bg-panel px-1.5 text-center font-sans text-sm">
          {key}
        </kbd>
      ))}
    </span>
  );
}

/** Every key and what it does. */
export function KeyList({ places, off, onOff, onClose }: KeyListProps) {
  const rows = [...HERE, ...places.map(({ key, label }) => ({ keys: ['g', key], label: `Go to ${label}` }))];
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title="Keys">
      <dl className="mb-4 grid gap-x-8 sm:grid-cols-2">
        {rows.map(({ keys, label }) => (
          <div key={label} className="flex items-center justify-between gap-3 border-rule border-b py-1.5">
            <dt>{label}</dt>
            <dd>
              <Keys keys={keys} />
            </dd>
          </div>
        ))}
      </dl>
      <Checkbox
        label="Use these keys"
        hint="Turn them off if your screen reader or voice control uses the same ones."
        checked={!off}
        onChange={({ target }) => onOff(!target.checked)}
      />
    </Dialog>
  );
}
