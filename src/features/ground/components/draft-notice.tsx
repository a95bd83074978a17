'use client';

import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { DRAFT_NOTICE_WORDS } from '../words/forms';

/** Says that a form came back as it was left. */
export function DraftNotice({ brought, onStartAfresh }: { brought: boolean; onStartAfresh: () => void }) {
  if (!brought) return null;
  return (
    <Notice
      live
      title={DRAFT_NOTICE_WORDS.title}
      actions={<Button onClick={onStartAfresh}>{DRAFT_NOTICE_WORDS.drop}</Button>}
    >
      {DRAFT_NOTICE_WORDS.text}
    </Notice>
  );
}
