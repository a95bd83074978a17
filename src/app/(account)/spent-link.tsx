import type { ReactNode } from 'react';
import { ErrorState } from '@/ui/notices';

/** In place of the form, when a mailed link cannot be used. */
export function SpentLink({ children, action }: { children: ReactNode; action: ReactNode }) {
  return (
    <ErrorState title="This link no longer works" action={action}>
      It was used already, is too old, or a newer one has been sent. {children}
    </ErrorState>
  );
}
