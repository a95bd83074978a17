'use client';

import { FieldGroup } from '@/ui/field';
import { Section } from '@/ui/page-parts';
import { NumberInput, Select, TimeInput } from '@/ui/text-inputs';
import { RULES_HOURS_WORDS } from '../words/rules-form';
import { useRulesFields } from './use-rules-fields';

const SUNRISE_SIDES = [
  { value: 'before', label: RULES_HOURS_WORDS.beforeSunrise },
  { value: 'after', label: RULES_HOURS_WORDS.afterSunrise },
];
const SUNSET_SIDES = [
  { value: 'before', label: RULES_HOURS_WORDS.beforeSunset },
  { value: 'after', label: RULES_HOURS_WORDS.afterSunset },
];

export function RulesHours() {
  const field = useRulesFields();
  return (
    <Section title={RULES_HOURS_WORDS.windowHours} note={RULES_HOURS_WORDS.windowHoursNote}>
      <div className="grid gap-6 sm:grid-cols-2">
        <FieldGroup label={RULES_HOURS_WORDS.morning}>
          <div className="flex flex-col gap-3">
            <div className="grid grid-cols-2 items-end gap-3">
              <NumberInput label={RULES_HOURS_WORDS.startsMinutes} step="1" {...field('morningStart.minutes')} />
              <Select label={RULES_HOURS_WORDS.sideOfSunrise} options={SUNRISE_SIDES} {...field('morningStart.side')} />
            </div>
            <TimeInput label={RULES_HOURS_WORDS.endsAt} {...field('morningEnd')} />
          </div>
        </FieldGroup>
        <FieldGroup label={RULES_HOURS_WORDS.evening}>
          <div className="flex flex-col gap-3">
            <TimeInput label={RULES_HOURS_WORDS.startsAt} {...field('eveningStart')} />
            <div className="grid grid-cols-2 items-end gap-3">
              <NumberInput label={RULES_HOURS_WORDS.endsMinutes} step="1" {...field('eveningEnd.minutes')} />
              <Select label={RULES_HOURS_WORDS.sideOfSunset} options={SUNSET_SIDES} {...field('eveningEnd.side')} />
            </div>
          </div>
        </FieldGroup>
      </div>
    </Section>
  );
}
