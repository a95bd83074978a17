'use client';

import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';

/** Says that a form came back as it was left. */
export function DraftNotice({ brought, onStartAfresh }: { brought: boolean; onStartAfresh: () => void }) {
  if (!brought) return null;
  return (
    <Notice live title="Not saved yet" actions={<Button onClick={onStartAfresh}>Start afresh</Button>}>
      What you typed here before has been brought back.
    </Notice>
  );
}
