'use client';

import { lazy, Suspense } from 'react';
import type { FirstStepsProps } from './first-steps-panel';

const FirstStepsPanel = lazy(async () => ({ default: (await import('./first-steps-panel')).FirstStepsPanel }));

/** For a new club's admin alone: everybody else's list comes without its script. */
export function LateFirstSteps(props: FirstStepsProps) {
  return (
    <Suspense>
      <FirstStepsPanel {...props} />
    </Suspense>
  );
}
