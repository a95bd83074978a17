'use client';

import dynamic from 'next/dynamic';
import { useDeferredValue, useMemo, useState } from 'react';
import { compassSpan } from '@/core/arcs';
import { tryStand } from '@/core/coverage/try-stand';
import type { GoodWindArc } from '@/core/ground-types';
import { sectorOf } from '@/core/sectors';
import { parseNumber } from '@/features/clubs/read-number';
import { arcText } from '@/features/ground/arc-text';
import { Button } from '@/ui/button';
import { Loading } from '@/ui/notices';
import { useRead } from '@/ui/query';
import { Select, TextInput } from '@/ui/text-inputs';
import { type CoverageAsk, type TrialWindow, trialArcs, trialSuitability } from '../coverage-schema';
import { type PackedWinds, unpackWinds } from '../pack-winds';
import { seatQuery } from '../queries';
import { DIAL_WORDS, TRIAL_MAP_WORDS, TRIAL_WORDS as W } from '../words';
import { ArcDial } from './arc-dial';
import type { Seat } from './trial-map';
import { gainText, TrialResults } from './trial-results';

const TrialMap = dynamic(() => import('./trial-map').then((part) => part.TrialMap), {
  ssr: false,
  loading: () => <Loading label={TRIAL_MAP_WORDS.loading} />,
});

const WINDOWS = [
  { value: 'both', label: W.both },
  { value: 'morning', label: W.morning },
  { value: 'evening', label: W.evening },
];
/** A new arc is a quarter about the commonest wind nobody covers. */
const HALF_DEG = 33.75;

export interface TrialStandProps {
  club: string;
  ask: CoverageAsk;
  winds: PackedWinds;
}

function readSeat(lat: string, lon: string): Seat | null {
  const [north, east] = [parseNumber(lat), parseNumber(lon)];
  if (north === null || east === null || Math.abs(north) > 90 || Math.abs(east) > 180) return null;
  return { lat: north, lon: east };
}

/** Keeps the trial in the address, so that it can be sent on, without asking the server for the page again. */
function keepInAddress(values: { trial: string; window: TrialWindow; lat: string; lon: string }) {
  const query = new URLSearchParams(Object.entries(values).filter(([, value]) => value.trim() !== ''));
  window.history.replaceState(null, '', values.trial.trim() === '' && values.lat === '' ? '?' : `?${query}`);
}

/** A stand that is not there yet: its winds by dial, map or typing, its seat on the map, and at once what it would add. */
export function TrialStand({ club, ask, winds: packed }: TrialStandProps) {
  const winds = useMemo(() => unpackWinds(packed), [packed]);
  const [trial, setTrial] = useState({
    trial: ask.trial,
    window: ask.window,
    lat: ask.lat === undefined ? '' : String(ask.lat),
    lon: ask.lon === undefined ? '' : String(ask.lon),
  });
  const [mapOpen, setMapOpen] = useState(ask.lat !== undefined && ask.lon !== undefined);
  const change = (part: Partial<typeof trial>) => {
    const next = { ...trial, ...part };
    setTrial(next);
    keepInAddress(next);
  };
  const read = trialArcs(trial.trial);
  const arcs = useMemo(() => {
    const now = trialArcs(trial.trial);
    return now.ok ? now.arcs : [];
  }, [trial.trial]);
  const at = useMemo(() => readSeat(trial.lat, trial.lon), [trial.lat, trial.lon]);
  const gains = useMemo(
    () =>
      arcs.length === 0
        ? []
        : tryStand(winds, { arcs, suitability: trialSuitability(trial.window) }).filter(({ hours }) => hours > 0),
    [winds, arcs, trial.window],
  );
  const open = useMemo(() => {
    const counts = Array.from({ length: 16 }, () => 0);
    for (const { fromDeg, covered, window: own } of winds) {
      const counted = !covered && (trial.window === 'both' || trial.window === own);
      if (counted) counts[sectorOf(fromDeg)] = (counts[sectorOf(fromDeg)] ?? 0) + 1;
    }
    return counts;
  }, [winds, trial.window]);
  const turn = (next: GoodWindArc[]) => change({ trial: arcText(next, null) });
  const place = ({ lat, lon }: Seat) => change({ lat: lat.toFixed(5), lon: lon.toFixed(5) });
  function addArc() {
    const middle = open.indexOf(Math.max(...open)) * 22.5;
    turn([...arcs, { fromDeg: (middle - HALF_DEG + 360) % 360, toDeg: (middle + HALF_DEG) % 360, window: null }]);
  }
  return (
    <div className="grid gap-6">
      <form className="grid gap-x-8 gap-y-5 lg:grid-cols-[18rem_minmax(0,1fr)]" onSubmit={(e) => e.preventDefault()}>
        <div className="grid justify-items-center gap-2">
          <ArcDial arcs={arcs} open={open} onTurn={turn} />
          <p className="max-w-72 text-center text-ink-soft text-sm">{DIAL_WORDS.hint}</p>
          <div className="flex flex-wrap justify-center gap-2">
            <Button onClick={addArc}>{DIAL_WORDS.add}</Button>
            {arcs.map((arc) => (
              <Button
                key={`${arc.fromDeg}-${arc.toDeg}`}
                look="quiet"
                onClick={() => turn(arcs.filter((other) => other !== arc))}
              >
                {DIAL_WORDS.remove(compassSpan(arc))}
              </Button>
            ))}
          </div>
        </div>
        <div className="grid content-start gap-5 sm:grid-cols-2">
          <TextInput
            label={W.winds}
            name="trial"
            autoComplete="off"
            autoCapitalize="characters"
            spellCheck={false}
            value={trial.trial}
            hint={W.windsHint}
            error={read.ok ? undefined : read.message}
            onChange={({ target }) => change({ trial: target.value })}
          />
          <Select
            label={W.hunted}
            name="window"
            value={trial.window}
            options={WINDOWS}
            onChange={({ target }) => change({ window: target.value as TrialWindow })}
          />
          <TextInput
            label={W.lat}
            optional
            name="lat"
            inputMode="decimal"
            autoComplete="off"
            value={trial.lat}
            onChange={({ target }) => change({ lat: target.value })}
          />
          <TextInput
            label={W.lon}
            optional
            name="lon"
            inputMode="decimal"
            autoComplete="off"
            value={trial.lon}
            onChange={({ target }) => change({ lon: target.value })}
          />
          <div className="flex flex-wrap gap-3 sm:col-span-2">
            {!mapOpen && <Button onClick={() => setMapOpen(true)}>{W.place}</Button>}
            <Button look="quiet" onClick={() => change({ trial: '', window: 'both', lat: '', lon: '' })}>
              {W.away}
            </Button>
          </div>
          <div className="sm:col-span-2" role="status">
            <p className="font-semibold">{arcs.length === 0 ? W.noWinds : gainText(gains)}</p>
            {at && arcs.length > 0 && (
              <SeatText club={club} trial={trial.trial} window={trial.window} lat={at.lat} lon={at.lon} />
            )}
          </div>
        </div>
      </form>
      {mapOpen && <TrialMap club={club} at={at} arcs={arcs} onPlace={place} onTurn={turn} />}
      {gains.length > 0 && <TrialResults gains={gains} />}
    </div>
  );
}

function SeatText({ club, ...asked }: { club: string; trial: string; window: TrialWindow } & Seat) {
  const { trial, window: hunted, lat, lon } = asked;
  const ask = useMemo(() => ({ trial, window: hunted, lat, lon }), [trial, hunted, lat, lon]);
  const later = useDeferredValue(ask);
  const query = useRead(seatQuery(club, later));
  if (query.isError) {
    return (
      <p>
        {W.seatFailed} <Button onClick={() => query.refetch()}>{W.tryAgain}</Button>
      </p>
    );
  }
  if (!query.data) return <p className="text-ink-soft">{W.seatLooking}</p>;
  if (!query.data.text) return null;
  const old = query.isPlaceholderData || later !== ask;
  return (
    <p aria-busy={old || undefined} className={old ? 'text-ink-soft' : ''}>
      {query.data.text}
    </p>
  );
}
