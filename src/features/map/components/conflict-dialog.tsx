'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { Dialog } from '@/ui/dialog';
import type { ConflictChoice } from '../drawing/settle-conflicts';
import type { DrawingChange, DrawingConflict } from '../drawing-schema';
import { KIND_WORDS } from '../words';

interface ConflictDialogProps {
  conflicts: readonly DrawingConflict[];
  changes: readonly DrawingChange[];
  pending: boolean;
  onSettle: (choices: ReadonlyMap<string, ConflictChoice>) => void;
  onClose: () => void;
}

function choicesOf(
  conflict: DrawingConflict,
  removing: boolean,
): { value: ConflictChoice; label: string; note: string }[] {
  if (removing) {
    return [
      { value: 'both', label: 'Keep it', note: `As ${conflict.who} left it.` },
      { value: 'mine', label: 'Remove it all the same', note: 'Their change goes with it.' },
    ];
  }
  if (conflict.gone) {
    return [
      { value: 'both', label: 'Add mine anew', note: 'What you drew is kept.' },
      { value: 'theirs', label: 'Leave it removed', note: 'What you drew is dropped.' },
    ];
  }
  return [
    { value: 'both', label: 'Keep both', note: 'Mine is added beside it, to be put right by hand.' },
    { value: 'mine', label: 'Put mine over theirs', note: 'Their change is lost.' },
    { value: 'theirs', label: 'Keep theirs', note: 'What you drew of it is dropped.' },
  ];
}

/** Others saved first: says who and what, and loses nothing unless told to. */
export function ConflictDialog({ conflicts, changes, pending, onSettle, onClose }: ConflictDialogProps) {
  const [chosen, setChosen] = useState<ReadonlyMap<string, ConflictChoice>>(new Map());
  return (
    <Dialog
      open={conflicts.length > 0}
      onOpenChange={(open) => !open && onClose()}
      title="Somebody saved before you"
      description="Nothing of yours is saved or lost yet. Choose for each."
    >
      <div className="grid gap-5">
        {conflicts.map((conflict) => {
          const removing = changes.some((change) => change.id === conflict.id && change.op === 'remove');
          const did = conflict.gone ? 'removed' : 'changed';
          return (
            <RadioCards
              key={conflict.id}
              name={`conflict-${conflict.id}`}
              label={`${conflict.who} ${did} ${KIND_WORDS[conflict.kind].toLowerCase()} ${conflict.name}`}
              choices={choicesOf(conflict, removing)}
              value={chosen.get(conflict.id) ?? 'both'}
              onChange={({ target }) => {
                const choice = (['both', 'theirs', 'mine'] as const).find((one) => one === target.value);
                if (choice) setChosen(new Map(chosen).set(conflict.id, choice));
              }}
            />
          );
        })}
        <div className="flex flex-wrap gap-2">
          <Button look="primary" pending={pending} pendingLabel="Saving…" onClick={() => onSettle(chosen)}>
            Go on and save
          </Button>
          <Button look="quiet" onClick={onClose}>
            Back to the drawing
          </Button>
        </div>
      </div>
    </Dialog>
  );
}
