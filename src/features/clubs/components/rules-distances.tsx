'use client';

import { weaponWord } from '@/core/booking/seasons';
import { WEAPONS } from '@/core/ground-types';
import type { Units } from '@/core/units';
import { Section } from '@/ui/page-parts';
import { NumberInput } from '@/ui/text-inputs';
import { RULES_DISTANCES_WORDS } from '../words/rules-form';
import { useRulesFields } from './use-rules-fields';

export function RulesDistances({ units }: { units: Units }) {
  const field = useRulesFields();
  const unit = units === 'us' ? 'yd' : 'm';
  return (
    <Section title={RULES_DISTANCES_WORDS.distances} note={RULES_DISTANCES_WORDS.distancesNote}>
      <div className="grid gap-5 sm:grid-cols-3">
        {WEAPONS.map((weapon) => (
          <NumberInput
            key={weapon}
            label={RULES_DISTANCES_WORDS.spacing(weaponWord(weapon))}
            unit={unit}
            {...field(`spacing.${weapon}`)}
          />
        ))}
      </div>
      <NumberInput
        label={RULES_DISTANCES_WORDS.walkingThrough}
        hint={RULES_DISTANCES_WORDS.walkingThroughHint}
        unit={unit}
        fieldClassName="mt-5"
        {...field('passThrough')}
      />
    </Section>
  );
}
