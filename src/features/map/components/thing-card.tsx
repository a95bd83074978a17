'use client';

import { Scissors, Trash2, X } from 'lucide-react';
import { Button, ButtonLink } from '@/ui/button';
import { DefinitionList } from '@/ui/page-parts';
import { isDrawn } from '../drawing/list-changes';
import { factsOf } from '../facts';
import type { MapThing, MapView } from '../thing';
import { THING_WORDS } from '../words/editing';
import { KIND_WORDS, nameOf } from '../words/things';
import { PlacesField } from './places-field';
import { ThingFields } from './thing-fields';

export interface ThingCardProps {
  thing: MapThing;
  things: readonly MapThing[];
  view: Pick<MapView, 'club' | 'may'>;
  onChange: (thing: MapThing, tag: string | null) => void;
  onReshape: () => void;
  onSplit: () => void;
  onRemove: () => void;
  onClose: () => void;
}

const SHAPES = { Point: 'point', LineString: 'line', Polygon: 'area' } as const;

export function mayChange(thing: MapThing, may: MapView['may']): boolean {
  if (thing.kind === 'stand') return may.stands;
  return thing.kind === 'approach' ? may.approaches : may.features;
}

/** The page with everything that is kept of a thing; null for what the map holds whole, and for what is not saved. */
function pageOf(thing: MapThing, slug: string): string | null {
  if (thing.version === 0) return null;
  const club = `/clubs/${slug}`;
  switch (thing.kind) {
    case 'stand':
      return `${club}/stands/${thing.id}`;
    case 'approach':
      return `${club}/stands/${thing.standId}/approaches/${thing.id}/edit`;
    case 'feature':
      return `${club}/ground/features/${thing.id}`;
    case 'parking':
      return `${club}/ground/parking/${thing.id}`;
    case 'item':
      return null;
  }
}

/** One thing of the map: its facts, and what may be done with it. */
export function ThingCard(props: ThingCardProps) {
  const { thing, things, view, onChange, onReshape, onSplit, onRemove, onClose } = props;
  const change = mayChange(thing, view.may);
  const shape = isDrawn(thing.geometry) ? SHAPES[thing.geometry.type] : null;
  const page = pageOf(thing, view.club.slug);
  const showPage = page !== null && (change || thing.kind === 'stand' || thing.kind === 'feature');
  const parts = thing.kind === 'approach' || shape === 'point' ? null : THING_WORDS.split;
  return (
    <section aria-label={THING_WORDS.chosen(nameOf(thing))} className="border-clay border-l-4 bg-panel p-3">
      <div className="flex items-start justify-between gap-2">
        <h2 className="font-serif text-lg leading-snug">
          {nameOf(thing)} <span className="block text-ink-soft text-sm">{KIND_WORDS[thing.kind]}</span>
        </h2>
        <Button look="quiet" onClick={onClose} aria-label={THING_WORDS.letGo}>
          <X aria-hidden="true" className="size-5" />
        </Button>
      </div>
      {change ? (
        <>
          <ThingFields key={thing.id} thing={thing} things={things} club={view.club} onChange={onChange} />
          <div className="mt-3 flex flex-wrap gap-2">
            {shape && <Button onClick={onReshape}>{shape === 'point' ? THING_WORDS.move : THING_WORDS.reshape}</Button>}
            {shape && parts && (
              <Button onClick={onSplit}>
                <Scissors aria-hidden="true" className="size-4" /> {parts}
              </Button>
            )}
            <Button look="danger" onClick={onRemove}>
              <Trash2 aria-hidden="true" className="size-4" /> {THING_WORDS.remove}
            </Button>
          </div>
          <details className="mt-3">
            <summary className="min-h-11 py-2 font-semibold">{THING_WORDS.facts}</summary>
            <DefinitionList items={factsOf(thing, things, view.club)} />
            {isDrawn(thing.geometry) && shape && (
              <PlacesField
                key={JSON.stringify(thing.geometry)}
                club={view.club}
                shape={shape}
                geometry={thing.geometry}
                action={THING_WORDS.put}
                onPlaces={(geometry) => onChange({ ...thing, geometry }, null)}
              />
            )}
          </details>
        </>
      ) : (
        <DefinitionList items={factsOf(thing, things, view.club)} />
      )}
      {showPage && (
        <p className="mt-3">
          <ButtonLink href={page}>{THING_WORDS.all}</ButtonLink>
        </p>
      )}
    </section>
  );
}
