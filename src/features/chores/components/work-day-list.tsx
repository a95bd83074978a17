'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button, TextLink } from '@/ui/button';
import { useToast } from '@/ui/toast';
import type { WorkDayLine } from '../reads';
import { WORK_DAY_LIST_WORDS } from '../words/work-days';

type Join = (club: string, values: { id: string; comes: boolean }) => Promise<ActionResult<{ comes: boolean }>>;

export interface WorkDayListProps {
  club: string;
  lines: WorkDayLine[];
  mayWrite: boolean;
  join: Join;
}

const words = WORK_DAY_LIST_WORDS;

export function WorkDayList({ club, lines, mayWrite, join }: WorkDayListProps) {
  return (
    <ul className="divide-y divide-rule">
      {lines.map((line) => (
        <li key={line.id} className="flex flex-col gap-3 py-4 sm:flex-row sm:items-start sm:justify-between">
          <div className="min-w-0">
            <p className="font-semibold font-serif text-lg">
              {mayWrite ? (
                <TextLink href={`/clubs/${club}/chores/work-days/${line.id}`}>{line.title}</TextLink>
              ) : (
                line.title
              )}
            </p>
            <p className="text-ink-soft">
              {[line.dayText, line.timeText, line.meet && words.meet(line.meet)].filter(Boolean).join(' · ')}
            </p>
            {line.notes && <p className="max-w-prose whitespace-pre-line">{line.notes}</p>}
            <p>{line.over ? words.credited(line.hours) : words.coming(line.coming)}</p>
          </div>
          {!line.over && <JoinButton club={club} line={line} join={join} />}
        </li>
      ))}
    </ul>
  );
}

function JoinButton({ club, line, join }: { club: string; line: WorkDayLine; join: Join }) {
  const toast = useToast();
  const [pending, setPending] = useState(false);
  async function press() {
    setPending(true);
    const answer = await join(club, { id: line.id, comes: !line.comes }).catch(() => null);
    setPending(false);
    if (answer?.ok) toast({ title: answer.data.comes ? words.comes : words.comesNot });
    else toast({ title: answer?.error.message ?? words.lost, level: 'caution' });
  }
  return (
    <Button pending={pending} pendingLabel={words.saving} onClick={() => void press()}>
      {line.comes ? words.notCome : words.come}
      <span className="sr-only">{words.of(line.title, line.dayText)}</span>
    </Button>
  );
}
