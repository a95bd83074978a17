'use client';

import type { Map as LeafletMap } from 'leaflet';
import { useEffect, useState } from 'react';
import type { Units } from '@/core/units';
import { declinationSide } from '../drawing/measure';
import { metresPerPixel, type ScaleBar, scaleBar } from '../drawing/scale-bar';
import { SCALE_AND_NORTH_WORDS } from '../words/screen';

const MOST_PX = 120;

/** A bar of round length for the middle of the map, and which way north is: the map is drawn to true north. */
export function ScaleAndNorth({
  map,
  units,
  declinationDeg,
}: {
  map: LeafletMap;
  units: Units;
  declinationDeg: number | null;
}) {
  const [bar, setBar] = useState<ScaleBar | null>(null);
  useEffect(() => {
    const read = () => setBar(scaleBar(metresPerPixel(map.getCenter().lat, map.getZoom()), MOST_PX, units));
    read();
    map.on('zoomend moveend', read);
    return () => void map.off('zoomend moveend', read);
  }, [map, units]);
  return (
    <>
      {bar && (
        <p className="pointer-events-none absolute bottom-2 left-2 z-10 bg-panel/85 px-1.5 pb-1 text-xs leading-tight">
          {bar.label}
          <span aria-hidden="true" className="block h-1.5 border-ink border-x border-b-2" style={{ width: bar.px }} />
        </p>
      )}
      <p className="pointer-events-none absolute top-2 right-2 z-10 bg-panel/85 px-1.5 py-1 text-center text-xs leading-tight">
        <svg aria-hidden="true" width="18" height="26" viewBox="0 0 18 26" className="mx-auto">
          <path d="M9 1V25M9 1L4 9M9 1L14 9" fill="none" stroke="currentColor" strokeWidth="1.6" />
        </svg>
        {SCALE_AND_NORTH_WORDS.trueNorth}
        {declinationDeg !== null && (
          <span className="block text-ink-soft">{SCALE_AND_NORTH_WORDS.compass(declinationSide(declinationDeg))}</span>
        )}
      </p>
    </>
  );
}
