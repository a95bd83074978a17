import type { ReactNode } from 'react';
import { SPENT_LINK_WORDS } from '@/features/accounts/words/pages';
import { ErrorState } from '@/ui/notices';

/** In place of the form, when a mailed link cannot be used. */
export function SpentLink({ children, action }: { children: ReactNode; action: ReactNode }) {
  return (
    <ErrorState title={SPENT_LINK_WORDS.title} action={action}>
      {SPENT_LINK_WORDS.why} {children}
    </ErrorState>
  );
}
