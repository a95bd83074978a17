'use client';

import { useRouter } from 'next/navigation';
import type { ClubCall } from '@/features/ground/components/form-types';
import { Button } from '@/ui/button';
import { ConfirmDialog } from '@/ui/confirm-dialog';
import { useToast } from '@/ui/toast';
import type { AtImport } from '../exchange-schema';

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
      title="Undo this import?"
      confirmLabel="Undo the import"
      danger
      trigger={<Button>Undo the import</Button>}
      onConfirm={async () => {
        const answer = await undo(club, at).catch(() => null);
        if (!answer) return 'The server could not be reached. Try again.';
        if (!answer.ok) return answer.error.message;
        const { removed, kept } = answer.data;
        toast({
          title: `${removed} taken away again`,
          ...(kept.length > 0 ? { text: `Kept, because changed or used since: ${kept.join(', ')}` } : {}),
        });
        router.refresh();
      }}
    >
      <p>
        Takes away the {count} things this file added. What has been changed, booked or built upon since stays where it
        is.
      </p>
    </ConfirmDialog>
  );
}
