'use client';

import dynamic from 'next/dynamic';
import { useMemo, useState } from 'react';
import { mapQuery } from '@/features/map/queries';
import { Button } from '@/ui/button';
import { ErrorState, Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import type { FindingView } from '../reads';
import { MAP_WORDS as W } from '../words/findings';

const MapCanvas = dynamic(() => import('@/features/map/components/map-canvas').then((part) => part.MapCanvas), {
  ssr: false,
  loading: () => <Loading label={W.loading} />,
});

export interface FindingsMapProps {
  club: string;
  findings: Pick<FindingView, 'at'>[];
}

/** The findings by their numbers on the ground; its code and data come when it is asked for. */
export function FindingsMap(props: FindingsMapProps) {
  const [open, setOpen] = useState(false);
  if (!open) return <Button onClick={() => setOpen(true)}>{W.open}</Button>;
  return <NumberedMap {...props} />;
}

function NumberedMap({ club, findings }: FindingsMapProps) {
  const query = useRead(mapQuery(club));
  const overlay = useMemo(
    () => ({ sitters: findings.map(({ at }, i) => ({ at: [at.lon, at.lat], name: String(i + 1) })) }),
    [findings],
  );
  if (query.isError) {
    return (
      <ErrorState title={W.failed} action={<Button onClick={() => query.refetch()}>{W.again}</Button>}>
        {query.error.message}
      </ErrorState>
    );
  }
  if (!query.data) return <Loading label={W.loading} />;
  return (
    <MapCanvas
      view={query.data}
      things={query.data.things}
      overlay={overlay}
      label={W.label}
      className="relative map-room"
    />
  );
}
