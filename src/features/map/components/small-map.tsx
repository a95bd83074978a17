'use client';

import dynamic from 'next/dynamic';
import { useMemo } from 'react';
import { Button } from '@/ui/button';
import { ErrorState, Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { factsOf } from '../facts';
import { mapQuery } from '../queries';
import type { MapThing } from '../thing';
import { FACT_WORDS } from '../words/facts';
import { SMALL_MAP_WORDS } from '../words/screen';
import { nameOf } from '../words/things';

const MapCanvas = dynamic(() => import('./map-canvas').then((part) => part.MapCanvas), {
  ssr: false,
  loading: () => <Loading label={SMALL_MAP_WORDS.loading} />,
});

/** Kinds that help a person find the way; the rest of the ground would only crowd a small map. */
function aboutStand(things: readonly MapThing[], standId: string): MapThing[] {
  const ways = things.filter((thing) => thing.kind === 'approach' && thing.standId === standId);
  const gates = new Set(ways.flatMap((way) => (way.kind === 'approach' && way.parkingId ? [way.parkingId] : [])));
  const near = things.filter(
    (thing) => thing.kind === 'item' || thing.kind === 'feature' || thing.id === standId || gates.has(thing.id),
  );
  return [...near, ...ways];
}

export interface SmallMapProps {
  club: string;
  standId: string;
  /** A way to be marked among those of the stand. */
  approachId?: string | null;
}

/** The ground about one stand with its ways in. Its code and its data come only when it is shown. */
export function SmallMap({ club, standId, approachId = null }: SmallMapProps) {
  const query = useRead(mapQuery(club));
  const view = query.data;
  const things = useMemo(() => (view ? aboutStand(view.things, standId) : []), [view, standId]);
  const framed = useMemo(() => things.filter((thing) => thing.kind !== 'item' && thing.kind !== 'feature'), [things]);
  if (query.isError) {
    return (
      <ErrorState
        title={SMALL_MAP_WORDS.failed}
        action={<Button onClick={() => query.refetch()}>{SMALL_MAP_WORDS.tryAgain}</Button>}
      >
        {query.error.message}
      </ErrorState>
    );
  }
  if (!view) return <Loading label={SMALL_MAP_WORDS.loading} />;
  const stand = things.find((thing) => thing.id === standId);
  const ways = things.filter((thing) => thing.kind === 'approach');
  return (
    <figure>
      <MapCanvas
        compact
        view={view}
        things={things}
        frame={framed}
        label={SMALL_MAP_WORDS.label(stand ? nameOf(stand) : null)}
        className="relative h-72 sm:h-80"
        selectedId={approachId ?? standId}
      />
      <figcaption className="mt-1 text-sm">
        {ways.length === 0 && <p className="text-ink-soft">{SMALL_MAP_WORDS.noWay}</p>}
        <ul>
          {ways.map((way) => (
            <li key={way.id}>
              <span className="font-semibold">{nameOf(way)}</span>{' '}
              <span className="text-ink-soft">
                {factsOf(way, view.things, view.club)
                  .filter(({ term }) => term === FACT_WORDS.size || term === FACT_WORDS.from)
                  .map(({ detail }) => detail)
                  .join(SMALL_MAP_WORDS.from)}
              </span>
            </li>
          ))}
        </ul>
      </figcaption>
    </figure>
  );
}
