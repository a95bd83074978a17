'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { SavedSit } from '@/features/bookings/sit-view';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { useToast } from '@/ui/toast';
import type { SwapView } from '../read-swap';
import type { SwapSitInput } from '../swap-schema';
import { SWAP_LIST_WORDS } from '../words/swap';

const words = SWAP_LIST_WORDS;

export interface SwapListProps {
  club: string;
  view: SwapView;
  swap: (club: string, values: SwapSitInput) => Promise<ActionResult<SavedSit>>;
}

/** The quieter free stands, each a tap away. */
export function SwapList({ club, view, swap }: SwapListProps) {
  const router = useRouter();
  const toast = useToast();
  const [pending, setPending] = useState<string>();
  const [error, setError] = useState<string>();
  const { sit } = view;

  async function move(standId: string, approachId: string | null) {
    setPending(standId);
    const answer = await swap(club, { sitId: sit.id, sequence: sit.sequence, standId, approachId }).catch(() => null);
    setPending(undefined);
    if (!answer?.ok) return setError(answer?.error.message ?? words.lost);
    toast({ title: words.moved(answer.data.standName), text: answer.data.whenText });
    router.push(`/clubs/${club}/my-sits`);
  }

  return (
    <>
      {error && (
        <Notice level="caution" live title={words.notMoved} className="mb-4">
          {error}
        </Notice>
      )}
      <ul className="divide-y divide-rule">
        {view.choices.map((choice, index) => (
          <li key={choice.standId} className="flex flex-col gap-3 py-4 sm:flex-row sm:items-center sm:justify-between">
            <div>
              <p className="font-semibold font-serif text-lg">{choice.name}</p>
              <p>{choice.text}</p>
              <p className="text-ink-soft">{words.wayIn(choice.approachName)}</p>
            </div>
            <Button
              look={index === 0 ? 'primary' : 'plain'}
              pending={pending === choice.standId}
              pendingLabel={words.moving}
              disabled={pending !== undefined}
              onClick={() => void move(choice.standId, choice.approachId)}
            >
              {words.move(choice.name)}
            </Button>
          </li>
        ))}
      </ul>
    </>
  );
}
