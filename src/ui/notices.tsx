import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';
import { CautionSign, NoteSign, StopSign } from './signs';
import { LOADING_WORDS, NOTICE_WORDS } from './words/notices';

export { ErrorState, type ErrorStateProps } from './error-state';

export type NoticeLevel = 'info' | 'caution' | 'stop';

const LEVELS = {
  info: { word: NOTICE_WORDS.info, Mark: NoteSign, box: 'border-y border-rule-strong px-1', mark: 'text-ink-soft' },
  caution: { word: NOTICE_WORDS.caution, Mark: CautionSign, box: 'border-y-2 border-clay px-1', mark: 'text-clay' },
  stop: { word: NOTICE_WORDS.stop, Mark: StopSign, box: 'border-2 border-clay bg-panel px-3', mark: 'text-clay' },
};

export interface NoticeProps {
  level?: NoticeLevel;
  /** Replaces the level's own word (Note, Caution, Stop). */
  title?: ReactNode;
  actions?: ReactNode;
  /** Said at once by a screen reader: for what happens after the page has loaded. */
  live?: boolean;
  className?: string;
  children?: ReactNode;
}

export function Notice({ level = 'info', title, actions, live, className, children }: NoticeProps) {
  const { word, Mark, box, mark } = LEVELS[level];
  const role = live ? (level === 'info' ? 'status' : 'alert') : undefined;
  return (
    <div role={role} className={joinClasses('flex gap-3 py-2.5', box, className)}>
      <Mark className={joinClasses('mt-0.5 size-5 shrink-0', mark)} />
      <div className="min-w-0 flex-1">
        <p className="font-semibold">{title ?? word}</p>
        {children && <div className="max-w-prose">{children}</div>}
        {actions && <div className="mt-2 flex flex-wrap gap-2">{actions}</div>}
      </div>
    </div>
  );
}

export interface EmptyStateProps {
  title: ReactNode;
  /** What to do next, in a sentence. */
  children: ReactNode;
  action?: ReactNode;
}

export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="border-rule border-y px-1 py-8">
      <p className="font-serif text-lg">{title}</p>
      <div className="mt-1 max-w-prose text-ink-soft">{children}</div>
      {action && <div className="mt-4 flex flex-wrap gap-2">{action}</div>}
    </div>
  );
}

/** Ruled lines where text will stand. */
export function Loading({ label = LOADING_WORDS.loading, lines = 5 }: { label?: string; lines?: number }) {
  return (
    <div role="status" className="py-2">
      <span className="sr-only">{label}</span>
      <div aria-hidden="true" className="animate-pulse">
        {Array.from({ length: lines }, (_, line) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: lines of a drawing, all alike
          <div key={line} className="flex h-11 items-center gap-4 border-rule border-b">
            <div className="h-3 w-1/4 bg-sunk" />
            <div className={joinClasses('h-3 bg-sunk', line % 2 === 0 ? 'w-1/3' : 'w-1/2')} />
          </div>
        ))}
      </div>
    </div>
  );
}
