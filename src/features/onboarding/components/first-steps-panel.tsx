'use client';

import { Check, Circle } from 'lucide-react';
import { useState } from 'react';
import type { ActionResult } from '@/server/doors';
import { Button, TextLink } from '@/ui/button';
import { Badge } from '@/ui/page-parts';
import type { FirstSteps } from '../read-first-steps';
import { FIRST_STEPS_WORDS } from '../words';

type Act = (club: string, values: Record<string, never>) => Promise<ActionResult<unknown>>;

export interface FirstStepsProps {
  club: string;
  first: FirstSteps;
  actions: { lay: Act; remove: Act; hide: Act };
}

const LOST = FIRST_STEPS_WORDS.lost;

/** What a new club has still to do, over its list until all is done or it is put away. */
export function FirstStepsPanel({ club, first, actions }: FirstStepsProps) {
  const [doing, setDoing] = useState<keyof FirstStepsProps['actions'] | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const done = first.steps.filter((step) => step.done).length;

  async function act(which: keyof FirstStepsProps['actions']) {
    setDoing(which);
    const answer = await actions[which](club, {}).catch(() => null);
    setProblem(answer ? (answer.ok ? null : answer.error.message) : LOST);
    // The lists below are read anew, with or without the samples.
    if (answer?.ok && which !== 'hide') window.location.reload();
    else setDoing(null);
  }

  return (
    <section aria-labelledby="first-steps" className="mb-6 border border-rule-strong bg-panel px-4 py-4 sm:px-6">
      <div className="flex flex-wrap items-baseline justify-between gap-2">
        <h2 id="first-steps" className="font-semibold font-serif text-xl">
          {FIRST_STEPS_WORDS.title}
        </h2>
        <p className="text-ink-soft text-sm">{FIRST_STEPS_WORDS.doneOf(done, first.steps.length)}</p>
      </div>
      <ol className="mt-2 grid gap-x-8 sm:grid-cols-2">
        {first.steps.map((step) => (
          <li key={step.title} className="flex gap-3 border-rule border-t py-2">
            {step.done ? (
              <Check aria-label={FIRST_STEPS_WORDS.done} role="img" className="mt-1 size-4 shrink-0 text-moss" />
            ) : (
              <Circle aria-label={FIRST_STEPS_WORDS.toDo} role="img" className="mt-1 size-4 shrink-0" />
            )}
            <div>
              <p className="font-semibold">{step.title}</p>
              <p className="text-ink-soft text-sm">{step.why}</p>
              {!step.done && <TextLink href={step.href}>{step.doing}</TextLink>}
            </div>
          </li>
        ))}
      </ol>
      {problem && (
        <p role="alert" className="mt-2 text-clay">
          {problem}
        </p>
      )}
      <div className="mt-3 flex flex-wrap items-center gap-3">
        {first.samples ? (
          <>
            <Badge look="clay">{FIRST_STEPS_WORDS.samplesThere}</Badge>
            <Button
              onClick={() => act('remove')}
              pending={doing === 'remove'}
              pendingLabel={FIRST_STEPS_WORDS.removing}
            >
              {FIRST_STEPS_WORDS.remove}
            </Button>
          </>
        ) : (
          <Button onClick={() => act('lay')} pending={doing === 'lay'} pendingLabel={FIRST_STEPS_WORDS.laying}>
            {FIRST_STEPS_WORDS.lay}
          </Button>
        )}
        {!first.samples && (
          <Button
            look="quiet"
            onClick={() => act('hide')}
            pending={doing === 'hide'}
            pendingLabel={FIRST_STEPS_WORDS.hiding}
          >
            {FIRST_STEPS_WORDS.hide}
          </Button>
        )}
      </div>
    </section>
  );
}
