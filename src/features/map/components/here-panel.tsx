'use client';

import type { Position } from 'geojson';
import { useEffect, useState } from 'react';
import { formatDistance } from '@/core/units';
import { Button } from '@/ui/button';
import { Notice } from '@/ui/notices';
import type { MapClub } from '../thing';

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
      setProblem('This device tells no position: draw it, or type the numbers.');
      return;
    }
    let wanted = true;
    setProblem(null);
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        if (wanted) onHere({ at: [coords.longitude, coords.latitude], accuracyM: coords.accuracy });
      },
      () => {
        if (wanted) setProblem('The position could not be had: allow it, draw it, or type the numbers.');
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
      title={
        here
          ? `You stand within ${formatDistance(here.accuracyM, club.units)} of the mark`
          : (problem ?? 'Finding where you stand…')
      }
      actions={
        <>
          {here && (
            <Button look="primary" onClick={onDrop}>
              Add the {what.toLowerCase()} here
            </Button>
          )}
          {(here || problem) && <Button onClick={() => setTries((n) => n + 1)}>Look again</Button>}
          <Button look="quiet" onClick={onCancel}>
            Cancel
          </Button>
        </>
      }
    >
      {here && here.accuracyM > LOOSE_M
        ? 'That is loose. Wait under open sky and look again, or move the mark by hand afterwards.'
        : here
          ? 'The circle on the map is how sure your phone is.'
          : null}
    </Notice>
  );
}
