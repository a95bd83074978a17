'use client';

import { type ReactNode, useId, useState } from 'react';
import { Button } from '@/ui/button';
import { FOLD_WORDS } from '../words/rows';

/** Folded on a phone, so that the list comes first; a desk has room for all. */
export function Fold({ beside, children }: { beside: ReactNode; children: ReactNode }) {
  const [unfolded, setUnfolded] = useState(false);
  const id = useId();
  return (
    <>
      <div className="flex justify-between sm:hidden print:hidden">
        <Button
          look="quiet"
          className="-ml-2"
          aria-expanded={unfolded}
          aria-controls={id}
          onClick={() => setUnfolded(!unfolded)}
        >
          {unfolded ? FOLD_WORDS.fold : FOLD_WORDS.unfold}
        </Button>
        {beside}
      </div>
      <div id={id} className={unfolded ? undefined : 'max-sm:hidden'}>
        {children}
      </div>
    </>
  );
}
