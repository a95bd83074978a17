import type { ReactNode } from 'react';
import { TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import type { FindingView } from '../reads';
import { CODE_WORDS } from '../words';

export interface FindingCardProps {
  club: string;
  finding: FindingView;
  number: number | null;
  mayOpenChores: boolean;
  children?: ReactNode;
}

function placeHref(club: string, finding: FindingView): string {
  return `/clubs/${club}/ground?select=${finding.subject.id}`;
}

/** One finding: what, why, what it costs and what could be done. */
export function FindingCard({ club, finding, number, mayOpenChores, children }: FindingCardProps) {
  const { answer } = finding;
  return (
    <li className="grid gap-2 border-rule border-b py-4 sm:grid-cols-[2.5rem_minmax(0,1fr)]">
      <span className="font-serif text-ink-soft text-xl">{number ?? '·'}</span>
      <div className="grid gap-2">
        <p className="flex flex-wrap items-baseline gap-x-3 gap-y-1">
          <Badge>{CODE_WORDS[finding.code]}</Badge>
          <span className="text-ink-soft text-sm">{finding.evidence}</span>
        </p>
        <h3 className="font-semibold font-serif text-lg">{finding.text}</h3>
        <p className="max-w-prose">{finding.why}</p>
        {finding.effect && <p className="font-semibold">{finding.effect}</p>}
        {answer ? (
          <p className="max-w-prose text-ink-soft text-sm">
            {answer.kind === 'chore'
              ? `${answer.by} made a chore of it, ${answer.on}.`
              : `${answer.by} left it, ${answer.on}: ${answer.reason}`}
            {answer.choreId && mayOpenChores && (
              <>
                {' '}
                <TextLink href={`/clubs/${club}/chores`}>Open the chores</TextLink>
              </>
            )}
          </p>
        ) : (
          <p className="text-ink-soft text-sm">What could be done: {finding.acts.join('; ')}.</p>
        )}
        <div className="flex flex-wrap items-center gap-3">
          {children}
          <TextLink href={placeHref(club, finding)}>
            Show on the ground<span className="sr-only">: {finding.subject.name}</span>
          </TextLink>
        </div>
      </div>
    </li>
  );
}
