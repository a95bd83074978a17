'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button, TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import { useToast } from '@/ui/toast';
import type { ChoreLine } from '../reads';
import { CHORE_LIST_WORDS } from '../words/chores';
import { type FinishAction, FinishChore } from './finish-chore-dialog';

const words = CHORE_LIST_WORDS;

type Take = (club: string, values: { id: string }) => Promise<ActionResult<{ id: string; title: string }>>;

export interface ChoreListProps {
  club: string;
  lines: ChoreLine[];
  /** The club's day, for the form that marks one done. */
  today: string;
  mayWrite: boolean;
  take: Take;
  finish: FinishAction;
}

/** Work still to do, each with who has it, where and by when. */
export function ChoreList({ club, lines, today, mayWrite, take, finish }: ChoreListProps) {
  return (
    <ul className="divide-y divide-rule">
      {lines.map((line) => (
        <li key={line.id} className="flex flex-col gap-3 py-4 sm:flex-row sm:items-start sm:justify-between">
          <div className="min-w-0">
            <p className="font-semibold font-serif text-lg">
              {mayWrite ? <TextLink href={`/clubs/${club}/chores/${line.id}`}>{line.title}</TextLink> : line.title}
            </p>
            <p className="text-ink-soft">
              {[line.assignee ?? words.nobody, line.place, line.due && words.due(line.due)].filter(Boolean).join(' · ')}
            </p>
            {line.notes && <p className="max-w-prose whitespace-pre-line">{line.notes}</p>}
            <p className="mt-1 flex gap-2 empty:hidden">
              {line.state === 'over' && <Badge look="clay">{words.over}</Badge>}
              {line.state === 'soon' && <Badge>{words.soon}</Badge>}
              {line.mine && <Badge look="moss">{words.yours}</Badge>}
            </p>
          </div>
          <div className="flex shrink-0 gap-2">
            {line.free && <TakeButton club={club} line={line} take={take} />}
            {(line.mine || line.free || mayWrite) && (
              <FinishChore club={club} line={line} today={today} finish={finish} />
            )}
          </div>
        </li>
      ))}
    </ul>
  );
}

function TakeButton({ club, line, take }: { club: string; line: ChoreLine; take: Take }) {
  const toast = useToast();
  const [pending, setPending] = useState(false);
  async function press() {
    setPending(true);
    const answer = await take(club, { id: line.id }).catch(() => null);
    setPending(false);
    if (answer?.ok) toast({ title: words.taken, text: answer.data.title });
    else toast({ title: answer?.error.message ?? words.lost, level: 'caution' });
  }
  return (
    <Button pending={pending} pendingLabel={words.taking} onClick={() => void press()}>
      {words.take}
      <span className="sr-only">{words.of(line.title)}</span>
    </Button>
  );
}
