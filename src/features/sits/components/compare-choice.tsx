'use client';

import { Suspense, useState } from 'react';
import { makeLazy } from '@/ui/lazy-part';
import { Select } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { LAZY_WORDS } from '@/ui/words/late';
import type { SitsAskText } from '../ask-schema';
import type { SitsBrief } from '../view-types';
import { COMPARE_WORDS } from '../words/detail';
import type { CompareDialogProps } from './compare-dialog';

const lazyCompare = makeLazy<CompareDialogProps>(() => import('./compare-dialog').then((parts) => parts.CompareDialog));

/** Sets the opened stand beside another of the window, open or not. */
export function CompareChoice({ view, ask, standId }: { view: SitsBrief; ask: SitsAskText; standId: string }) {
  const [other, setOther] = useState('');
  const toast = useToast();
  const choose = (id: string) =>
    void lazyCompare.load().then(
      () => setOther(id),
      () => toast({ ...LAZY_WORDS, level: 'caution' }),
    );
  const others = [...view.open, ...view.blocked].filter((row) => row.standId !== standId);
  if (others.length === 0) return null;
  return (
    <>
      <Select
        label={COMPARE_WORDS.choose}
        value={other}
        onChange={({ target }) => choose(target.value)}
        options={[
          { value: '', label: COMPARE_WORDS.chooseOne },
          ...others.map((row) => ({ value: row.standId, label: row.name })),
        ]}
      />
      {other && (
        <Suspense>
          <lazyCompare.Part view={view} ask={ask} standIds={[standId, other]} onClose={() => setOther('')} />
        </Suspense>
      )}
    </>
  );
}
