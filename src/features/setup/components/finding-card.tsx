import { ChevronDown } from 'lucide-react';
import type { ReactNode } from 'react';
import { TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import type { FindingView } from '../reads';
import { CODE_WORDS, FINDING_WORDS as W } from '../words/findings';
import { WorkRules } from './work-rules';

export interface FindingCardProps {
  club: string;
  finding: FindingView;
  number: number | null;
  mayOpenChores: boolean;
  mayWriteRules: boolean;
  children?: ReactNode;
}

/** One finding on two or three lines; opened, why it is one, what it costs and what could be done. */
export function FindingCard(props: FindingCardProps) {
  const { club, finding, number, mayOpenChores, mayWriteRules, children } = props;
  const { answer } = finding;
  return (
    <li className="border-rule border-b">
      <details className="group">
        <summary className="grid min-h-12 cursor-pointer list-none grid-cols-[1.75rem_minmax(0,1fr)_1.25rem] items-start gap-x-2 py-2.5 [&::-webkit-details-marker]:hidden">
          <span className="font-serif text-ink-soft text-lg leading-6">{number ?? '·'}</span>
          <span className="grid gap-1">
            <span>{finding.text}</span>
            <span className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm">
              <Badge>{CODE_WORDS[finding.code]}</Badge>
              {finding.effectShort && <span className="font-semibold tabular-nums">{finding.effectShort}</span>}
            </span>
          </span>
          <ChevronDown aria-hidden="true" className="mt-1 size-5 text-ink-soft group-open:rotate-180" />
        </summary>
        <div className="grid gap-3 pb-4 pl-9">
          <p className="max-w-prose">{finding.why}</p>
          {finding.effect && <p className="font-semibold">{finding.effect}</p>}
          <p className="text-ink-soft text-sm">{W.evidence(finding.evidence)}</p>
          {finding.also.length > 0 && (
            <p className="text-ink-soft text-sm">{W.also(finding.also.map(({ name }) => name).join(', '))}</p>
          )}
          {!answer && (
            <div>
              <p className="font-semibold text-sm">{W.could}</p>
              <ul className="list-disc pl-5">
                {finding.acts.map(({ text }) => (
                  <li key={text}>{text}</li>
                ))}
              </ul>
            </div>
          )}
          {!answer && <WorkRules club={club} notes={finding.rules} mayWrite={mayWriteRules} />}
          <div className="flex flex-wrap items-center gap-3">
            {children}
            <TextLink href={`/clubs/${club}/ground?select=${finding.subject.id}`}>
              {W.onGround}
              <span className="sr-only">: {finding.subject.name}</span>
            </TextLink>
          </div>
        </div>
      </details>
      {answer && (
        <p className="max-w-prose pb-3 pl-9 text-ink-soft text-sm">
          {answer.kind === 'chore' ? W.choreBy(answer.by, answer.on) : W.leftBy(answer.by, answer.on, answer.reason)}{' '}
          {answer.choreId && mayOpenChores && <TextLink href={`/clubs/${club}/chores`}>{W.openChores}</TextLink>}
        </p>
      )}
    </li>
  );
}
