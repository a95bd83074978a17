'use client';

import { weaponWord } from '@/core/booking/seasons';
import { WEAPONS } from '@/core/types';
import type { Units } from '@/core/units';
import { Section } from '@/ui/page-parts';
import { NumberInput } from '@/ui/text-inputs';
import { useRulesFields } from './use-rules-fields';

export function RulesDistances({ units }: { units: Units }) {
  const field = useRulesFields();
  const unit = units === 'us' ? 'yd' : 'm';
  return (
    <Section
      title="Distances"
      note="Least distance between two occupied stands; of two weapons the wider counts. 0: none."
    >
      <div className="grid gap-5 sm:grid-cols-3">
        {WEAPONS.map((weapon) => (
          <NumberInput
            key={weapon}
            label={`Spacing, ${weaponWord(weapon)}`}
            unit={unit}
            {...field(`spacing.${weapon}`)}
          />
        ))}
      </div>
      <NumberInput
        label="Walking through"
        hint="No way in may pass an occupied stand nearer than this. 0: none."
        unit={unit}
        fieldClassName="mt-5"
        {...field('passThrough')}
      />
    </Section>
  );
}
