'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { TRY_DEMO_WORDS } from '../words/try-demo';

interface Props {
  action: (values: Record<string, never>) => Promise<ActionResult<{ to: string }>>;
}

/** Into the demo club as one of its members, without an account. */
export function TryDemoButton({ action }: Props) {
  const [pending, setPending] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);

  async function enter() {
    setPending(true);
    const answer = await action({}).catch(() => null);
    if (answer?.ok) return window.location.assign(answer.data.to);
    setProblem(answer ? answer.error.message : TRY_DEMO_WORDS.lost);
    setPending(false);
  }

  return (
    <>
      <Button onClick={enter} pending={pending} pendingLabel={TRY_DEMO_WORDS.opening}>
        {TRY_DEMO_WORDS.open}
      </Button>
      {problem && (
        <p role="alert" className="w-full text-clay">
          {problem}
        </p>
      )}
    </>
  );
}
