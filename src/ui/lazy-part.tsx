'use client';

import { type ComponentType, type LazyExoticComponent, lazy, type ReactNode, Suspense, useState } from 'react';
import { useToast } from './toast';
import { LAZY_WORDS } from './words/late';

export interface Opener {
  /** Fetches the part ahead of the press: spread on the button that opens it. */
  ahead: { onPointerEnter: () => void; onFocus: () => void };
  open: () => void;
}

export interface Lazy<Props extends object> {
  Part: LazyExoticComponent<ComponentType<Props>>;
  load: () => Promise<unknown>;
  ahead: Opener['ahead'];
}

/** A part whose script comes only when it is asked for, so that the first page stays light over a poor signal. */
export function makeLazy<Props extends object>(load: () => Promise<ComponentType<Props>>): Lazy<Props> {
  const fetchPart = () => void load().catch(() => undefined);
  return {
    Part: lazy(async () => ({ default: await load() })),
    load,
    ahead: { onPointerEnter: fetchPart, onFocus: fetchPart },
  };
}

/** Opened once its script is there; without a signal the press is answered in words and the page stands as it did. */
function useOpened<Props extends object>(of: Lazy<Props>) {
  const [opened, setOpened] = useState(false);
  const toast = useToast();
  const open = () =>
    void of.load().then(
      () => setOpened(true),
      () => toast({ ...LAZY_WORDS, level: 'caution' }),
    );
  return { opened, open, close: () => setOpened(false) };
}

interface LazyPartProps<Props extends object> {
  of: Lazy<Props>;
  part: Props;
  /** What stands there until it is opened, and until its script has come. */
  closed: (opener: Opener) => ReactNode;
}

/** Draws `closed` until its opener is called, then the part in its place. */
export function LazyPart<Props extends object>({ of, part, closed }: LazyPartProps<Props>) {
  const { opened, open } = useOpened(of);
  const before = closed({ ahead: of.ahead, open });
  if (!opened) return before;
  return (
    <Suspense fallback={before}>
      <of.Part {...part} />
    </Suspense>
  );
}

export interface Closes {
  onClose: () => void;
}

interface LazyDialogProps<Props extends Closes> {
  of: Lazy<Props>;
  part: Omit<Props, keyof Closes>;
  trigger: (opener: Opener['ahead'] & { onClick: () => void; 'aria-haspopup': 'dialog' }) => ReactNode;
}

/** The button of a dialog, and the dialog while it is open. */
export function LazyDialog<Props extends Closes>({ of, part, trigger }: LazyDialogProps<Props>) {
  const { opened, open, close } = useOpened(of);
  const all = { ...part, onClose: close } as unknown as Props;
  return (
    <>
      {trigger({ ...of.ahead, onClick: open, 'aria-haspopup': 'dialog' })}
      {opened && (
        <Suspense>
          <of.Part {...all} />
        </Suspense>
      )}
    </>
  );
}
