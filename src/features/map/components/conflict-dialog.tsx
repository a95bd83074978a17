'use client';

import { useState } from 'react';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { Dialog } from '@/ui/dialog';
import type { ConflictChoice } from '../drawing/settle-conflicts';
import type { DrawingChange, DrawingConflict } from '../drawing-schema';
import { CONFLICT_WORDS } from '../words/editing';
import { KIND_WORDS } from '../words/things';

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
      { value: 'both', label: CONFLICT_WORDS.keep, note: CONFLICT_WORDS.keepNote(conflict.who) },
      { value: 'mine', label: CONFLICT_WORDS.remove, note: CONFLICT_WORDS.removeNote },
    ];
  }
  if (conflict.gone) {
    return [
      { value: 'both', label: CONFLICT_WORDS.addAnew, note: CONFLICT_WORDS.addAnewNote },
      { value: 'theirs', label: CONFLICT_WORDS.leave, note: CONFLICT_WORDS.leaveNote },
    ];
  }
  return [
    { value: 'both', label: CONFLICT_WORDS.both, note: CONFLICT_WORDS.bothNote },
    { value: 'mine', label: CONFLICT_WORDS.mine, note: CONFLICT_WORDS.mineNote },
    { value: 'theirs', label: CONFLICT_WORDS.theirs, note: CONFLICT_WORDS.theirsNote },
  ];
}

/** Others saved first: says who and what, and loses nothing unless told to. */
export function ConflictDialog({ conflicts, changes, pending, onSettle, onClose }: ConflictDialogProps) {
  const [chosen, setChosen] = useState<ReadonlyMap<string, ConflictChoice>>(new Map());
  return (
    <Dialog
      open={conflicts.length > 0}
      onOpenChange={(open) => !open && onClose()}
      title={CONFLICT_WORDS.title}
      description={CONFLICT_WORDS.text}
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
          <Button
            look="primary"
            pending={pending}
            pendingLabel={CONFLICT_WORDS.saving}
            onClick={() => onSettle(chosen)}
          >
            {CONFLICT_WORDS.save}
          </Button>
          <Button look="quiet" onClick={onClose}>
            {CONFLICT_WORDS.back}
          </Button>
        </div>
      </div>
    </Dialog>
  );
}
