'use client';

import type { Position } from 'geojson';
import { useEffect, useState } from 'react';
import { formatDistance } from '@/core/units';
import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';
import type { MapClub } from '../thing';
import { HERE_WORDS } from '../words/editing';

/** Looser than this, a stand would land in the wrong tree. */
const LOOSE_M = 15;

export interface Here {
  at: Position;
  accuracyM: number;
}

interface HerePanelProps {
  club: MapClub;
  what: string;
  here: Here | null;
  onHere: (here: Here) => void;
  onDrop: () => void;
  onCancel: () => void;
}

/** Asks the phone where it is, says how sure it is, and lets a thing be dropped there. */
export function HerePanel({ club, what, here, onHere, onDrop, onCancel }: HerePanelProps) {
  const [problem, setProblem] = useState<string | null>(null);
  const [tries, setTries] = useState(0);

  // biome-ignore lint/correctness/useExhaustiveDependencies: asked once for each try
  useEffect(() => {
    if (!navigator.geolocation) {
      setProblem(HERE_WORDS.noPosition);
      return;
    }
    let wanted = true;
    setProblem(null);
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        if (wanted) onHere({ at: [coords.longitude, coords.latitude], accuracyM: coords.accuracy });
      },
      () => {
        if (wanted) setProblem(HERE_WORDS.refused);
      },
      { enableHighAccuracy: true, timeout: 20_000, maximumAge: 0 },
    );
    return () => {
      wanted = false;
    };
  }, [tries]);

  return (
    <Notice
      live
      level={problem || (here && here.accuracyM > LOOSE_M) ? 'caution' : 'info'}
      title={here ? HERE_WORDS.found(formatDistance(here.accuracyM, club.units)) : (problem ?? HERE_WORDS.finding)}
      actions={
        <>
          {here && (
            <Button look="primary" onClick={onDrop}>
              {HERE_WORDS.add(what.toLowerCase())}
            </Button>
          )}
          {(here || problem) && <Button onClick={() => setTries((n) => n + 1)}>{HERE_WORDS.lookAgain}</Button>}
          <Button look="quiet" onClick={onCancel}>
            {HERE_WORDS.cancel}
          </Button>
        </>
      }
    >
      {here && here.accuracyM > LOOSE_M ? HERE_WORDS.loose : here ? HERE_WORDS.sure : null}
    </Notice>
  );
}
