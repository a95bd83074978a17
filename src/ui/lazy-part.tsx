'use client';

import { type ComponentType, type LazyExoticComponent, lazy, type ReactNode, Suspense, useState } from 'react';

export interface Opener {
  /** Fetches the part ahead of the press: spread on the button that opens it. */
  ahead: { onPointerEnter: () => void; onFocus: () => void };
  open: () => void;
}

export interface Lazy<Props extends object> {
  Part: LazyExoticComponent<ComponentType<Props>>;
  ahead: Opener['ahead'];
}

/** A part whose script comes only when it is asked for, so that the first page stays light over a poor signal. */
export function makeLazy<Props extends object>(load: () => Promise<ComponentType<Props>>): Lazy<Props> {
  const fetchPart = () => void load().catch(() => undefined);
  return {
    Part: lazy(async () => ({ default: await load() })),
    ahead: { onPointerEnter: fetchPart, onFocus: fetchPart },
  };
}

interface LazyPartProps<Props extends object> {
  of: Lazy<Props>;
  part: Props;
  /** What stands there until it is opened, and until its script has come. */
  closed: (opener: Opener) => ReactNode;
}

/** Draws `closed` until its opener is called, then the part in its place. */
export function LazyPart<Props extends object>({ of, part, closed }: LazyPartProps<Props>) {
  const [wanted, want] = useState(false);
  const before = closed({ ahead: of.ahead, open: () => want(true) });
  if (!wanted) return before;
  return (
    <Suspense fallback={before}>
      <of.Part {...part} />
    </Suspense>
  );
}
