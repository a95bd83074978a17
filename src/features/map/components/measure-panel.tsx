'use client';

import type { Position } from 'geojson';
import { formatDistance } from '@/core/units';
import { Button } from '@/ui/button';
import { Select } from '@/ui/text-inputs';
import { legBetween, legText, ringAreaM2, sizeText } from '../drawing/measure';
import type { MapThing, MapView } from '../thing';
import { MEASURE_WORDS } from '../words/editing';

interface MeasurePanelProps {
  view: Pick<MapView, 'club' | 'declinationDeg'>;
  things: readonly MapThing[];
  points: readonly Position[];
  onPoints: (points: Position[]) => void;
  onClose: () => void;
}

/** How far and by which bearing, from tap to tap or from one named place to another. */
export function MeasurePanel({ view, things, points, onPoints, onClose }: MeasurePanelProps) {
  const { club, declinationDeg } = view;
  const places = things.flatMap((thing) =>
    thing.geometry.type === 'Point' && thing.name
      ? [{ value: thing.id, label: thing.name, at: thing.geometry.coordinates }]
      : [],
  );
  const legs = points.slice(1).map((to, i) => legBetween(club, points[i] ?? to, to, declinationDeg));
  const total = legs.reduce((sum, leg) => sum + leg.metres, 0);
  const choose = (i: 0 | 1) => (id: string) => {
    const at = places.find((place) => place.value === id)?.at;
    if (!at) return;
    const other = points[1 - i];
    onPoints(i === 0 ? (other ? [at, other] : [at]) : [points[0] ?? at, at]);
  };
  const chosen = (i: number) => places.find((place) => place.at === points[i])?.value ?? '';
  return (
    <section aria-label={MEASURE_WORDS.measure} className="grid gap-3 border-clay border-l-4 bg-panel p-3">
      <div className="flex items-start justify-between gap-2">
        <p>
          <span className="font-semibold">{MEASURE_WORDS.lead}</span> {MEASURE_WORDS.how}
        </p>
        <Button look="quiet" onClick={onClose}>
          {MEASURE_WORDS.done}
        </Button>
      </div>
      <div className="grid grid-cols-2 gap-2">
        <Select
          label={MEASURE_WORDS.from}
          placeholder={MEASURE_WORDS.aPlace}
          options={places}
          value={chosen(0)}
          onChange={({ target }) => choose(0)(target.value)}
        />
        <Select
          label={MEASURE_WORDS.to}
          placeholder={MEASURE_WORDS.aPlace}
          options={places}
          value={chosen(1)}
          onChange={({ target }) => choose(1)(target.value)}
        />
      </div>
      <div aria-live="polite">
        {legs.length > 0 && (
          <ol className="list-decimal pl-5">
            {legs.map((leg, i) => (
              // biome-ignore lint/suspicious/noArrayIndexKey: legs have no names but their order
              <li key={i}>{legText(leg, club.units)}</li>
            ))}
          </ol>
        )}
        {legs.length > 1 && (
          <p className="font-semibold">{MEASURE_WORDS.together(formatDistance(total, club.units))}</p>
        )}
        {points.length > 2 && ringAreaM2(club, points) > 0 && (
          <p>
            {MEASURE_WORDS.closed(
              sizeText(club, { type: 'Polygon', coordinates: [[...points, points[0] ?? []]] }, club.units),
            )}
          </p>
        )}
      </div>
      {points.length > 0 && (
        <div className="flex gap-2">
          <Button onClick={() => onPoints(points.slice(0, -1))}>{MEASURE_WORDS.undoPoint}</Button>
          <Button look="quiet" onClick={() => onPoints([])}>
            {MEASURE_WORDS.beginAgain}
          </Button>
        </div>
      )}
    </section>
  );
}
