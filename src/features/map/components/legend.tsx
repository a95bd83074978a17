'use client';

import { CheckboxGroup } from '@/ui/choices';
import type { MapThing } from '../thing';
import { LEGEND_WORDS } from '../words/screen';

/** What may be left off the map for a clearer look. */
export const LAYER_GROUPS = [
  { value: 'stands', label: LEGEND_WORDS.stands },
  { value: 'ways', label: LEGEND_WORDS.ways },
  { value: 'features', label: LEGEND_WORDS.features },
  { value: 'land', label: LEGEND_WORDS.land },
  { value: 'limits', label: LEGEND_WORDS.limits },
  { value: 'things', label: LEGEND_WORDS.things },
] as const;
export type LayerGroup = (typeof LAYER_GROUPS)[number]['value'];

export function groupOf(thing: MapThing): LayerGroup {
  switch (thing.kind) {
    case 'stand':
    case 'parking':
      return 'stands';
    case 'approach':
      return 'ways';
    case 'feature':
      return 'features';
    case 'item':
      if (['boundary', 'closed_area', 'no_shoot'].includes(thing.what)) return 'limits';
      return ['camera', 'hazard', 'gate', 'signal'].includes(thing.what) ? 'things' : 'land';
  }
}

interface LegendProps {
  shown: ReadonlySet<LayerGroup>;
  onShown: (shown: ReadonlySet<LayerGroup>) => void;
}

export function Legend({ shown, onShown }: LegendProps) {
  return (
    <details className="border-rule border-b">
      <summary className="min-h-11 py-2">{LEGEND_WORDS.title}</summary>
      <CheckboxGroup
        label={LEGEND_WORDS.showMap}
        choices={LAYER_GROUPS}
        value={[...shown]}
        onChange={({ target }) => {
          const next = new Set(shown);
          const group = LAYER_GROUPS.find(({ value }) => value === target.value)?.value;
          if (!group) return;
          if (target.checked) next.add(group);
          else next.delete(group);
          onShown(next);
        }}
      />
      <ul className="mt-2 list-disc pb-3 pl-5 text-ink-soft text-sm">
        <li>{LEGEND_WORDS.signStand}</li>
        <li>{LEGEND_WORDS.signBrackets}</li>
        <li>{LEGEND_WORDS.signApproaches}</li>
        <li>{LEGEND_WORDS.signFeatures}</li>
        <li>{LEGEND_WORDS.signLand}</li>
        <li>{LEGEND_WORDS.signClosed}</li>
      </ul>
    </details>
  );
}
