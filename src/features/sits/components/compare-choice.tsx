'use client';

import dynamic from 'next/dynamic';
import { useState } from 'react';
import { Select } from '@/ui/text-inputs';
import type { SitsAskText } from '../ask-schema';
import type { SitsView } from '../view-types';

const CompareDialog = dynamic(() => import('./compare-dialog').then((parts) => parts.CompareDialog), { ssr: false });

/** Sets the opened stand beside another of the window, open or not. */
export function CompareChoice({ view, ask, standId }: { view: SitsView; ask: SitsAskText; standId: string }) {
  const [other, setOther] = useState('');
  const others = [...view.open, ...view.blocked].filter((row) => row.standId !== standId);
  if (others.length === 0) return null;
  return (
    <>
      <Select
        label="Compare with"
        value={other}
        onChange={({ target }) => setOther(target.value)}
        options={[
          { value: '', label: 'Choose a stand' },
          ...others.map((row) => ({ value: row.standId, label: row.name })),
        ]}
      />
      {other && <CompareDialog view={view} ask={ask} standIds={[standId, other]} onClose={() => setOther('')} />}
    </>
  );
}
