import type { ReactNode } from 'react';
import { joinClasses } from './join-classes';

export type BadgeLook = 'plain' | 'strong' | 'moss' | 'clay';

const BADGE_LOOKS: Record<BadgeLook, string> = {
  plain: 'border-rule-strong text-ink',
  strong: 'border-ink bg-ink text-paper',
  moss: 'border-moss text-moss',
  clay: 'border-clay text-clay',
};

/** A word set apart. The word carries the meaning; the look only helps. */
export function Badge({ look = 'plain', children }: { look?: BadgeLook; children: ReactNode }) {
  return (
    <span
      className={joinClasses(
        'inline-block justify-self-start whitespace-nowrap rounded-sm border px-1.5 font-semibold text-sm leading-snug',
        BADGE_LOOKS[look],
      )}
    >
      {children}
    </span>
  );
}
