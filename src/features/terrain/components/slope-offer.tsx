'use client';

import { useState } from 'react';
import { sectorName } from '@/core/sectors';
import { formatHeight, type Units } from '@/core/units';
import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { slopeQuery } from '../queries';
import type { SlopeView } from '../read-slope';
import { SLOPE_WORDS } from '../words';

const words = SLOPE_WORDS;

interface SlopeOfferProps {
  club: string;
  units: Units;
  /** null: no place is typed yet. */
  at: { lat: number; lon: number } | null;
  onTake: (slope: SlopeView) => void;
}

/** What heights of the ground say of a place; nothing is set until it is taken. */
export function SlopeOffer({ club, units, at, onTake }: SlopeOfferProps) {
  const [asked, setAsked] = useState<{ lat: number; lon: number } | null>(null);
  const query = useRead({ ...slopeQuery(club, asked ?? { lat: 0, lon: 0 }), enabled: asked !== null });
  const stale = asked !== null && (asked.lat !== at?.lat || asked.lon !== at?.lon);
  const found = asked !== null && !stale ? query.data : undefined;
  return (
    <div className="mt-3 grid gap-2" aria-live="polite">
      <div>
        <Button
          disabled={at === null}
          pending={asked !== null && query.isFetching}
          pendingLabel={words.reading}
          onClick={() => {
            setAsked(at);
            if (query.isError) void query.refetch();
          }}
        >
          {words.read}
        </Button>
      </div>
      {at === null && <p className="text-ink-soft text-sm">{words.placeFirst}</p>}
      {query.isError && asked !== null && !stale && <Notice level="caution" title={query.error.message} />}
      {found && (
        <Notice
          title={
            found.drainBearingDeg === null
              ? words.level(found.slopePercent)
              : words.slope(found.slopePercent, sectorName(found.drainBearingDeg), found.drainBearingDeg)
          }
          actions={<Button onClick={() => onTake(found)}>{words.take}</Button>}
        >
          {words.note(formatHeight(found.heightM, units), found.source)}
        </Notice>
      )}
    </div>
  );
}
