'use client';

import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';

interface Props {
  action: (values: Record<string, never>) => Promise<ActionResult<{ to: string }>>;
}

const LOST = 'The server could not be reached. Try again.';

/** Into the demo club as one of its members, without an account. */
export function TryDemoButton({ action }: Props) {
  const [pending, setPending] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);

  async function enter() {
    setPending(true);
    const answer = await action({}).catch(() => null);
    if (answer?.ok) return window.location.assign(answer.data.to);
    setProblem(answer ? answer.error.message : LOST);
    setPending(false);
  }

  return (
    <>
      <Button onClick={enter} pending={pending} pendingLabel="Opening the demo…">
        Try the demo club
      </Button>
      {problem && (
        <p role="alert" className="w-full text-clay">
          {problem}
        </p>
      )}
    </>
  );
}
