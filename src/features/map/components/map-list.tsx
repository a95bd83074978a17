'use client';

import { useDeferredValue, useMemo, useState } from 'react';
import { Button } from '@/ui/button';
import { joinClasses } from '@/ui/join-classes';
import { TextInput } from '@/ui/text-inputs';
import { briefOf } from '../facts';
import type { MapClub, MapThing, ThingKind } from '../thing';
import { MAP_LIST_WORDS } from '../words/screen';
import { nameOf } from '../words/things';

const GROUPS: readonly { kind: ThingKind; label: string }[] = [
  { kind: 'stand', label: MAP_LIST_WORDS.stands },
  { kind: 'approach', label: MAP_LIST_WORDS.approaches },
  { kind: 'parking', label: MAP_LIST_WORDS.parkingPlaces },
  { kind: 'feature', label: MAP_LIST_WORDS.whatDeerUse },
  { kind: 'item', label: MAP_LIST_WORDS.land },
];
const FIRST = 60;

interface MapListProps {
  club: MapClub;
  things: readonly MapThing[];
  selectedId: string | null;
  onSelect: (id: string) => void;
}

/** The map in words: everything on it, under what it is, chosen by keyboard as on the map by hand. */
export function MapList({ club, things, selectedId, onSelect }: MapListProps) {
  const [filter, setFilter] = useState('');
  const asked = useDeferredValue(filter).trim().toLowerCase();
  const rows = useMemo(
    () =>
      things
        .map((thing) => ({ thing, name: nameOf(thing), brief: briefOf(thing, things, club) }))
        .filter(({ name, brief }) => asked === '' || `${name} ${brief}`.toLowerCase().includes(asked)),
    [things, club, asked],
  );
  if (things.length === 0) return <p className="py-4 text-ink-soft">{MAP_LIST_WORDS.empty}</p>;
  return (
    <div>
      <TextInput
        label={MAP_LIST_WORDS.find}
        type="search"
        autoComplete="off"
        value={filter}
        onChange={({ target }) => setFilter(target.value)}
      />
      {GROUPS.map(({ kind, label }) => (
        <Group
          key={kind}
          label={label}
          rows={rows.filter(({ thing }) => thing.kind === kind)}
          selectedId={selectedId}
          onSelect={onSelect}
        />
      ))}
      {rows.length === 0 && <p className="py-3 text-ink-soft">{MAP_LIST_WORDS.noneFound}</p>}
    </div>
  );
}

interface GroupProps {
  label: string;
  rows: { thing: MapThing; name: string; brief: string }[];
  selectedId: string | null;
  onSelect: (id: string) => void;
}

function Group({ label, rows, selectedId, onSelect }: GroupProps) {
  const [all, setAll] = useState(false);
  if (rows.length === 0) return null;
  const shown = all ? rows : rows.slice(0, FIRST);
  return (
    <div className="mt-4">
      <h2 className="small-caps border-rule border-b text-base text-ink-soft">
        {label} <span className="text-sm">({rows.length})</span>
      </h2>
      <ul aria-label={label}>
        {shown.map(({ thing, name, brief }) => (
          <li key={thing.id} className="border-rule border-b">
            <button
              type="button"
              aria-pressed={thing.id === selectedId}
              onClick={() => onSelect(thing.id)}
              className={joinClasses(
                'block min-h-11 w-full px-2 py-1.5 text-left leading-snug hover:bg-panel',
                thing.id === selectedId && 'border-clay border-l-4 bg-panel',
              )}
            >
              <span className="font-semibold">{name}</span>
              {thing.version === 0 && <span className="text-clay text-sm">{MAP_LIST_WORDS.notSavedYet}</span>}
              {brief && <span className="block text-ink-soft text-sm">{brief}</span>}
            </button>
          </li>
        ))}
      </ul>
      {rows.length > shown.length && (
        <Button look="quiet" onClick={() => setAll(true)}>
          {MAP_LIST_WORDS.showAll(rows.length)}
        </Button>
      )}
    </div>
  );
}
