'use client';

import dynamic from 'next/dynamic';
import { useMemo, useState } from 'react';
import type { WindowName } from '@/core/condition-types';
import { mapQuery } from '@/features/map/queries';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { ErrorState, Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { Select } from '@/ui/text-inputs';
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
  const [chosen, setChosen] = useState('');
  const shown = useMemo(() => lines.filter(({ id }) => chosen === '' || id === chosen), [lines, chosen]);
  const overlay = useMemo(() => movementOverlay(shown, window), [shown, window]);
  const view = query.data;
  // Ways on foot would hide the deer's.
  const things = useMemo(() => view?.things.filter(({ kind }) => kind !== 'approach') ?? [], [view]);
  const frame = useMemo(() => things.filter(({ id }) => shown.some((line) => line.id === id)), [things, shown]);
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
      <div className="grid items-start gap-x-8 gap-y-4 sm:grid-cols-2">
        <RadioCards
          label={W.choose}
          name="deers-way"
          choices={WINDOWS}
          value={window}
          onChange={({ currentTarget }) => setWindow(currentTarget.value === 'evening' ? 'evening' : 'morning')}
        />
        <Select
          label={W.line}
          value={chosen}
          options={[{ value: '', label: W.allLines }, ...lines.map(({ id, name }) => ({ value: id, label: name }))]}
          onChange={({ target }) => setChosen(target.value)}
        />
      </div>
      <MapCanvas
        key={chosen}
        frame={frame}
        compact
        view={view}
        things={things}
        overlay={overlay}
        label={W.label}
        className="relative map-room"
      />
      <figcaption className="max-w-prose text-ink-soft text-sm">{W.legend}</figcaption>
    </figure>
  );
}
