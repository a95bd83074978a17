'use client';

import { CheckboxGroup } from '@/ui/choices';
import type { MapThing } from '../thing';

/** What may be left off the map for a clearer look. */
export const LAYER_GROUPS = [
  { value: 'stands', label: 'Stands and parking' },
  { value: 'ways', label: 'Approaches' },
  { value: 'features', label: 'What deer use' },
  { value: 'land', label: 'Cover, water, roads, trails' },
  { value: 'limits', label: 'Boundary, closed areas, no-shoot sectors' },
  { value: 'things', label: 'Cameras, hazards, gates, signal' },
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
      <summary className="min-h-11 py-2">Layers and signs</summary>
      <CheckboxGroup
        label="Show on the map"
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
        <li>A black disc is a stand. The open brackets round it are its good winds: where the wind may come from.</li>
        <li>The inner bracket is for the morning alone, the outer for the evening alone, the middle one for both.</li>
        <li>Dotted black lines are approaches, whole where they are driven.</li>
        <li>Long moss dashes are travel lines, moss dots rub lines, a heavy dashed ring a sanctuary.</li>
        <li>Dots fill woods, ticks swamp, waves water, bare ground cut timber, hatching farm fields and plots.</li>
        <li>Crossed clay is closed. Clay hatching is where nobody shoots.</li>
      </ul>
    </details>
  );
}
