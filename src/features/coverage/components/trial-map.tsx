'use client';

import dynamic from 'next/dynamic';
import { useMemo } from 'react';
import type { GoodWindArc } from '@/core/ground-types';
import { mapQuery } from '@/features/map/queries';
import type { StandThing } from '@/features/map/thing';
import { Button } from '@/ui/button';
import { ErrorState, Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { TRIAL_MAP_WORDS as W } from '../words';

const MapCanvas = dynamic(() => import('@/features/map/components/map-canvas').then((part) => part.MapCanvas), {
  ssr: false,
  loading: () => <Loading label={W.loading} />,
});

const MEASURE = { mode: 'measure' } as const;

export interface Seat {
  lat: number;
  lon: number;
}

export interface TrialMapProps {
  club: string;
  at: Seat | null;
  arcs: readonly GoodWindArc[];
  onPlace: (at: Seat) => void;
  onTurn: (arcs: GoodWindArc[]) => void;
}

/** The ground with the trial stand on it: tapped into place, dragged, and its winds turned by hand. */
export function TrialMap({ club, at, arcs, onPlace, onTurn }: TrialMapProps) {
  const query = useRead(mapQuery(club));
  const view = query.data;
  const trial = useMemo<StandThing | null>(
    () =>
      at && {
        kind: 'stand',
        id: 'trial',
        version: 0,
        name: W.name,
        geometry: { type: 'Point', coordinates: [at.lon, at.lat] },
        what: 'hang_on',
        arcs: [...arcs],
        closed: '',
      },
    [at, arcs],
  );
  const things = useMemo(() => {
    const ground = view?.things.filter(({ kind }) => kind !== 'approach') ?? [];
    return trial ? [...ground, trial] : ground;
  }, [view, trial]);
  const seat = useMemo(() => at && { at: [at.lon, at.lat], label: W.seat }, [at]);
  const turning = useMemo(() => at && { at: [at.lon, at.lat], arcs }, [at, arcs]);
  if (query.isError) {
    return (
      <ErrorState title={W.failed} action={<Button onClick={() => query.refetch()}>{W.again}</Button>}>
        {query.error.message}
      </ErrorState>
    );
  }
  if (!view) return <Loading label={W.loading} />;
  const place = ([lon = 0, lat = 0]: number[]) => onPlace({ lat, lon });
  return (
    <figure>
      <MapCanvas
        compact
        view={view}
        things={things}
        selectedId={trial?.id ?? null}
        tool={MEASURE}
        seat={seat}
        turning={turning}
        onMeasure={place}
        onSeat={place}
        onTurn={onTurn}
        label={W.label}
        className="relative map-room"
      />
      <figcaption className="mt-1 max-w-prose text-ink-soft text-sm">{W.caption}</figcaption>
    </figure>
  );
}
