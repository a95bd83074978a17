import type { ReactNode } from 'react';
import { ERROR_STATE_WORDS } from './words/notices';

export interface ErrorStateProps {
  title?: ReactNode;
  /** What happened and what to do. */
  children: ReactNode;
  action?: ReactNode;
  /** Words to quote to the club's admin. */
  reference?: string;
}

export function ErrorState({ title = ERROR_STATE_WORDS.title, children, action, reference }: ErrorStateProps) {
  return (
    <div role="alert" className="border-2 border-clay bg-panel px-4 py-5">
      <p className="font-serif text-lg">{title}</p>
      <div className="mt-1 max-w-prose">{children}</div>
      {reference && <p className="mt-2 text-ink-soft text-sm">{ERROR_STATE_WORDS.reference(reference)}</p>}
      {action && <div className="mt-4 flex flex-wrap gap-2">{action}</div>}
    </div>
  );
}
