'use client';

import dynamic from 'next/dynamic';
import { useMemo, useState } from 'react';
import type { WindowName } from '@/core/types';
import { mapQuery } from '@/features/map/queries';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { ErrorState, Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { type DrawnLine, movementOverlay } from '../overlay-of';
import { MOVEMENT_MAP_WORDS as W } from '../words';

const MapCanvas = dynamic(() => import('@/features/map/components/map-canvas').then((part) => part.MapCanvas), {
  ssr: false,
  loading: () => <Loading label={W.loading} />,
});

const WINDOWS = [
  { value: 'morning', label: W.morning, note: W.morningNote },
  { value: 'evening', label: W.evening, note: W.eveningNote },
];

/** The lines of movement on the ground, with the deer's way in the window chosen. */
export function MovementMap({ club, lines }: { club: string; lines: DrawnLine[] }) {
  const query = useRead(mapQuery(club));
  const [window, setWindow] = useState<WindowName>('morning');
  const overlay = useMemo(() => movementOverlay(lines, window), [lines, window]);
  const view = query.data;
  // Ways on foot would hide the deer's.
  const things = useMemo(() => view?.things.filter(({ kind }) => kind !== 'approach') ?? [], [view]);
  if (query.isError) {
    return (
      <ErrorState title={W.failed} action={<Button onClick={() => query.refetch()}>{W.again}</Button>}>
        {query.error.message}
      </ErrorState>
    );
  }
  if (!view) return <Loading label={W.loading} />;
  return (
    <figure className="grid gap-3">
      <RadioCards
        across
        label={W.choose}
        name="deers-way"
        choices={WINDOWS}
        value={window}
        onChange={({ currentTarget }) => setWindow(currentTarget.value === 'evening' ? 'evening' : 'morning')}
      />
      <MapCanvas
        compact
        view={view}
        things={things}
        overlay={overlay}
        label={W.label}
        className="relative h-[60dvh] min-h-80 max-h-[40rem]"
      />
      <figcaption className="max-w-prose text-ink-soft text-sm">{W.legend}</figcaption>
    </figure>
  );
}
