'use client';

import { Checkbox } from './choices';
import { Dialog } from './dialog';
import { KEY_LIST_WORDS as WORDS } from './words/opened';

export interface KeyListProps {
  places: readonly { key: string; label: string }[];
  off: boolean;
  onOff: (off: boolean) => void;
  onClose: () => void;
}

const HERE = [
  { keys: ['?'], label: WORDS.list },
  { keys: ['j'], label: WORDS.next },
  { keys: ['k'], label: WORDS.before },
  { keys: [WORDS.enter], label: WORDS.open },
  { keys: ['['], label: WORDS.earlier },
  { keys: [']'], label: WORDS.later },
  { keys: [WORDS.esc], label: WORDS.close },
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
  const rows = [...HERE, ...places.map(({ key, label }) => ({ keys: ['g', key], label: WORDS.goTo(label) }))];
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title={WORDS.title}>
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
        label={WORDS.use}
        hint={WORDS.useHint}
        checked={!off}
        onChange={({ target }) => onOff(!target.checked)}
      />
    </Dialog>
  );
}
