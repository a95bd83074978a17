'use client';

import dynamic from 'next/dynamic';
import { useMemo, useState } from 'react';
import type { WindowName } from '@/core/condition-types';
import type { SaveDrawing } from '@/features/map/components/use-save-drawing';
import type { MapOverlay } from '@/features/map/overlay';
import { mapQuery } from '@/features/map/queries';
import type { MapView } from '@/features/map/thing';
import { EmptyState, Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import type { MomentAsk } from '../ask-moment';
import type { MomentView } from '../moment-types';
import { momentAsked } from '../queries';
import { weightOf } from '../stretch-view';
import { GROUND_MAP_WORDS } from '../words';
import { MomentPanel } from './moment-panel';

const MapScreen = dynamic(() => import('@/features/map/components/map-screen').then((part) => part.MapScreen), {
  ssr: false,
  loading: () => <Loading label={GROUND_MAP_WORDS.unfolding} />,
});

export interface GroundMapProps {
  /** The map as JSON text: a page that carries thousands of shapes as parts of its own tree takes seconds to write. */
  packed: string;
  zone: string;
  save: SaveDrawing;
  selectedId: string | null;
  /** The window that comes next. */
  next: { day: string; window: WindowName };
}

function overlayOf(view: MomentView): MapOverlay {
  return {
    bands: view.bands.map(({ area }) => area),
    stretches: view.way?.stretches.map(({ from, to, chance }) => ({ from, to, weight: weightOf(chance) })) ?? [],
    sun: view.sun.altitudeDeg > -6 ? { at: view.stand.at, azimuthDeg: view.sun.azimuthDeg } : null,
    sitters: view.sitters.map(({ at, name }) => ({ at, name })),
  };
}

/** The club's map with what a moment lays over it. The map's own code comes when this is first shown. */
export function GroundMap({ packed, zone, save, selectedId, next }: GroundMapProps) {
  const [initial] = useState((): MapView => JSON.parse(packed));
  const { slug, units } = initial.club;
  const map = useRead({ ...mapQuery(slug), initialData: initial, initialDataUpdatedAt: initial.madeAt });
  const stands = useMemo(
    () => map.data.things.flatMap((thing) => (thing.kind === 'stand' ? [{ id: thing.id, name: thing.name }] : [])),
    [map.data],
  );
  const [open, setOpen] = useState(false);
  const [asked, setAsked] = useState<MomentAsk>({ ...next, stand: '', step: 0 });
  const ask = stands.some(({ id }) => id === asked.stand) ? asked : { ...asked, stand: stands[0]?.id ?? '' };
  const query = useRead({ ...momentAsked(slug, ask), enabled: open && ask.stand !== '' });
  const view = query.data;
  const overlay = useMemo(() => (view ? overlayOf(view) : null), [view]);
  const panel =
    stands.length === 0 ? (
      <EmptyState title={GROUND_MAP_WORDS.noStandsTitle}>{GROUND_MAP_WORDS.noStands}</EmptyState>
    ) : (
      <MomentPanel
        ask={ask}
        stands={stands}
        club={{ zone, units }}
        view={view}
        error={query.isError ? query.error.message : null}
        onAsk={setAsked}
        onRetry={() => void query.refetch()}
      />
    );
  return (
    <MapScreen
      initial={initial}
      save={save}
      selectedId={selectedId}
      moment={{ label: GROUND_MAP_WORDS.moment, panel, overlay, open, onOpen: setOpen }}
    />
  );
}
