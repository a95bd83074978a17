'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button, TextLink } from '@/ui/button';
import { useToast } from '@/ui/toast';
import type { WorkDayLine } from '../reads';

type Join = (club: string, values: { id: string; comes: boolean }) => Promise<ActionResult<{ comes: boolean }>>;

export interface WorkDayListProps {
  club: string;
  lines: WorkDayLine[];
  mayWrite: boolean;
  join: Join;
}

const named = (names: string[]) => (names.length === 0 ? 'Nobody has said so yet' : names.join(', '));

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
              {[line.dayText, line.timeText, line.meet && `meet at ${line.meet}`].filter(Boolean).join(' · ')}
            </p>
            {line.notes && <p className="max-w-prose whitespace-pre-line">{line.notes}</p>}
            <p>{line.over ? `${line.hours} h credited` : `Coming: ${named(line.coming)}`}</p>
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
    if (answer?.ok) toast({ title: answer.data.comes ? 'You are on the list' : 'You are off the list' });
    else toast({ title: answer?.error.message ?? 'The server could not be reached. Try again.', level: 'caution' });
  }
  return (
    <Button pending={pending} pendingLabel="Saving…" onClick={() => void press()}>
      {line.comes ? 'I cannot come' : 'I come'}
      <span className="sr-only">: {`${line.title}, ${line.dayText}`}</span>
    </Button>
  );
}
