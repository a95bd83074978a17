'use client';

import { useQuery } from '@tanstack/react-query';
import dynamic from 'next/dynamic';
import { useRouter, useSearchParams } from 'next/navigation';
import { useMemo, useState } from 'react';
import { mapQuery } from '@/features/map/queries';
import { Button } from '@/ui/button';
import { ErrorState, Loading } from '@/ui/notices';

const MapCanvas = dynamic(() => import('@/features/map/components/map-canvas').then((part) => part.MapCanvas), {
  ssr: false,
  loading: () => <Loading label="Unfolding the map" />,
});

const MEASURE = { mode: 'measure' } as const;

/** Drops the trial stand on the map; its place then stands in the address. */
export function TrialMap({ club, at }: { club: string; at: { lat: number; lon: number } | null }) {
  const [open, setOpen] = useState(at !== null);
  if (!open) return <Button onClick={() => setOpen(true)}>Place it on the map</Button>;
  return <PlaceIt club={club} at={at} />;
}

function PlaceIt({ club, at }: { club: string; at: { lat: number; lon: number } | null }) {
  const query = useQuery(mapQuery(club));
  const router = useRouter();
  const search = useSearchParams();
  const overlay = useMemo(() => ({ sitters: at ? [{ at: [at.lon, at.lat], name: 'Trial' }] : [] }), [at]);
  if (query.isError) {
    return (
      <ErrorState title="The map could not be read" action={<Button onClick={() => query.refetch()}>Try again</Button>}>
        {query.error.message}
      </ErrorState>
    );
  }
  if (!query.data) return <Loading label="Unfolding the map" />;
  return (
    <figure>
      <MapCanvas
        compact
        view={query.data}
        things={query.data.things}
        overlay={overlay}
        tool={MEASURE}
        onMeasure={([lon = 0, lat = 0]) => {
          const next = new URLSearchParams(search);
          next.set('lat', lat.toFixed(6));
          next.set('lon', lon.toFixed(6));
          router.replace(`?${next}`, { scroll: false });
        }}
        label="Map to place the trial stand on"
        className="relative h-80 sm:h-96"
      />
      <figcaption className="mt-1 text-ink-soft text-sm">
        Tap where the seat would be, or type its latitude and longitude.
      </figcaption>
    </figure>
  );
}
