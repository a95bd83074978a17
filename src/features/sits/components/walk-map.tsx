'use client';

import { useState } from 'react';
import { SmallMap, type SmallMapProps } from '@/features/map/components/small-map';
import { Button } from '@/ui/button';
import { WAYS_WORDS } from '../words/detail';

/** The map of the walk, asked for by a tap: nothing of a map is loaded before. */
export function WalkMap(props: SmallMapProps) {
  const [open, setOpen] = useState(false);
  if (open) {
    return (
      <div className="mt-3">
        <SmallMap {...props} />
      </div>
    );
  }
  return (
    <Button className="mt-3" onClick={() => setOpen(true)}>
      {WAYS_WORDS.map}
    </Button>
  );
}
