'use client';

import { useRouter } from 'next/navigation';
import type { ClubCall } from '@/features/ground/components/form-types';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import type { AtImport } from '../exchange-schema';
import { UNDO_WORDS } from '../words/import';

const words = UNDO_WORDS;

interface UndoImportProps {
  club: string;
  at: AtImport;
  count: number;
  undo: ClubCall<AtImport, { removed: number; kept: string[] }>;
}

export function UndoImport({ club, at, count, undo }: UndoImportProps) {
  const router = useRouter();
  const toast = useToast();
  return (
    <ConfirmDialog
      title={words.title}
      confirmLabel={words.undo}
      danger
      trigger={<Button>{words.undo}</Button>}
      onConfirm={async () => {
        const answer = await undo(club, at).catch(() => null);
        if (!answer) return words.lost;
        if (!answer.ok) return answer.error.message;
        const { removed, kept } = answer.data;
        toast({
          title: words.undone(removed),
          ...(kept.length > 0 ? { text: words.kept(kept) } : {}),
        });
        router.refresh();
      }}
    >
      <p>{words.text(count)}</p>
    </ConfirmDialog>
  );
}
