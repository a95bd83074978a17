'use client';

import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import type { ApplyAdjustment } from '../learning-schema';
import type { ProposalView } from '../reads';
import { APPLY_WORDS, UNDO_WORDS } from '../words';

export interface ApplyProps {
  club: string;
  proposal: Pick<ProposalView, 'standId' | 'standName' | 'points' | 'sits'>;
  apply: (club: string, values: ApplyAdjustment) => Promise<ActionResult<{ id: string }>>;
}

export function ApplyButton({ club, proposal, apply }: ApplyProps) {
  const toast = useToast();
  const { standId, standName, points, sits } = proposal;
  async function confirm() {
    const answer = await apply(club, { standId, points, sits }).catch(() => null);
    if (!answer) return APPLY_WORDS.lost;
    if (!answer.ok) return answer.error.message;
    toast({ title: APPLY_WORDS.applied(points, standName) });
  }
  return (
    <ConfirmDialog
      title={APPLY_WORDS.title(points, standName)}
      confirmLabel={APPLY_WORDS.apply}
      trigger={
        <Button>
          {APPLY_WORDS.apply}
          <span className="sr-only">{APPLY_WORDS.applyTo(standName)}</span>
        </Button>
      }
      onConfirm={confirm}
    >
      {APPLY_WORDS.text}
    </ConfirmDialog>
  );
}

export interface UndoProps {
  club: string;
  stand: { id: string; name: string };
  undo: (club: string, values: { standId: string }) => Promise<ActionResult<{ standId: string }>>;
}

export function UndoButton({ club, stand, undo }: UndoProps) {
  const toast = useToast();
  async function confirm() {
    const answer = await undo(club, { standId: stand.id }).catch(() => null);
    if (!answer) return UNDO_WORDS.lost;
    if (!answer.ok) return answer.error.message;
    toast({ title: UNDO_WORDS.undone(stand.name) });
  }
  return (
    <ConfirmDialog
      title={UNDO_WORDS.title(stand.name)}
      confirmLabel={UNDO_WORDS.confirm}
      trigger={
        <Button look="quiet">
          {UNDO_WORDS.undo}
          <span className="sr-only">{UNDO_WORDS.undoFor(stand.name)}</span>
        </Button>
      }
      onConfirm={confirm}
    >
      {UNDO_WORDS.text}
    </ConfirmDialog>
  );
}
