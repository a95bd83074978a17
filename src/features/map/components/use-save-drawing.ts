'use client';

import { useState } from 'react';
import type { ClubCall } from '@/features/ground/components/form-types';
import { queryClient } from '@/ui/query';
import { useToast } from '@/ui/toast';
import { applyChanges } from '../drawing/apply-changes';
import { listChanges } from '../drawing/list-changes';
import { type ConflictChoice, settleConflicts } from '../drawing/settle-conflicts';
import type { DrawingAnswer, DrawingChange, DrawingConflict } from '../drawing-schema';
import { mapQuery } from '../queries';
import type { MapThing } from '../thing';
import { SAVE_DRAWING_WORDS } from '../words/editing';
import { newThingId, type useDrawing } from './use-drawing';

export type SaveDrawing = ClubCall<{ changes: DrawingChange[] }, DrawingAnswer>;

const LOST = SAVE_DRAWING_WORDS.lost;

/** Saves what is drawn; where others were quicker, asks what to keep and saves again. */
export function useSaveDrawing(
  club: string,
  state: ReturnType<typeof useDrawing>,
  save: SaveDrawing,
  onSaved: (ids: Record<string, string>) => void,
) {
  const toast = useToast();
  const [pending, setPending] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const [conflicts, setConflicts] = useState<DrawingConflict[]>([]);

  async function fresh(): Promise<readonly MapThing[]> {
    const view = await queryClient().fetchQuery({ ...mapQuery(club), staleTime: 0 });
    return view.things;
  }

  async function send(changes: DrawingChange[]): Promise<void> {
    setProblem(null);
    const answer = await save(club, { changes }).catch(() => null);
    if (!answer?.ok) return setProblem(answer?.error.message ?? LOST);
    if (!answer.data.saved) return setConflicts(answer.data.conflicts);
    const { ids, count } = answer.data;
    toast({ title: count === 1 ? SAVE_DRAWING_WORDS.savedOne : SAVE_DRAWING_WORDS.saved(count) });
    state.restart(await fresh());
    onSaved(ids);
  }

  async function busy(work: () => Promise<void>): Promise<void> {
    setPending(true);
    try {
      await work();
    } catch {
      setProblem(LOST);
    }
    setPending(false);
  }

  return {
    pending,
    problem,
    conflicts,
    save: () => void busy(() => send(state.changes)),
    dropConflicts: () => setConflicts([]),
    settle: (choices: ReadonlyMap<string, ConflictChoice>) =>
      void busy(async () => {
        const stored = await fresh();
        const settled = settleConflicts(state.changes, conflicts, choices, {
          stored,
          drawn: state.things,
          newId: newThingId,
        });
        const things = applyChanges(stored, settled);
        setConflicts([]);
        state.restart(stored, settled.length > 0 ? things : stored);
        const left = listChanges(stored, things);
        if (left.length > 0) await send(left);
      }),
  };
}
