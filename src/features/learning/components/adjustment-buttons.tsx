'use client';

import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import type { ApplyAdjustment } from '../learning-schema';
import type { ProposalView } from '../reads';

const LOST = 'The server could not be reached. Try again.';

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
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    toast({ title: `${standName} counts ${points > 0 ? `+${points}` : points} points` });
  }
  return (
    <ConfirmDialog
      title={`Apply ${points > 0 ? `+${points}` : points} points to ${standName}`}
      confirmLabel="Apply"
      trigger={
        <Button>
          Apply<span className="sr-only"> to {standName}</span>
        </Button>
      }
      onConfirm={confirm}
    >
      From now on the list adds these points to the quiet of every sit there, and says so among its reasons. It can be
      undone at any time.
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
    if (!answer) return LOST;
    if (!answer.ok) return answer.error.message;
    toast({ title: `${stand.name} counts by the sums alone` });
  }
  return (
    <ConfirmDialog
      title={`Undo what is applied to ${stand.name}`}
      confirmLabel="Undo it"
      trigger={
        <Button look="quiet">
          Undo<span className="sr-only"> for {stand.name}</span>
        </Button>
      }
      onConfirm={confirm}
    >
      The list goes by the sums alone again. The record keeps that it was applied.
    </ConfirmDialog>
  );
}
