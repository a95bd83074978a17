'use client';

import { useFieldArray, useWatch } from 'react-hook-form';
import { TIMES_OF_DAY } from '@/core/ground-types';
import { DEFAULT_WHEREABOUTS } from '@/core/whereabouts';
import { Button } from '@/ui/button';
import { CheckboxGroup } from '@/ui/choices';
import { FieldGroup } from '@/ui/field';
import { TextInput } from '@/ui/text-inputs';
import { ALL_MONTHS, type FeatureForm } from '../feature-schema';
import { FEATURE_USE_WORDS } from '../words/forms';
import { FEATURE_KIND_WORDS, MONTH_CHOICES } from '../words/kinds';
import type { Fields } from './form-types';

const TIME_WORDS = {
  night: FEATURE_USE_WORDS.night,
  dawn: FEATURE_USE_WORDS.dawn,
  morning: FEATURE_USE_WORDS.morning,
  midday: FEATURE_USE_WORDS.midday,
  afternoon: FEATURE_USE_WORDS.afternoon,
  dusk: FEATURE_USE_WORDS.dusk,
} as const;

/** How likely deer are here at each time of day, in place of what is common for the kind. */
export function FeatureUseFields({ fields }: { fields: Fields<FeatureForm> }) {
  const { register, errorOf, form } = fields;
  const kind = useWatch({ control: form.control, name: 'kind' });
  const common = DEFAULT_WHEREABOUTS.use[kind];
  return (
    <FieldGroup
      label={FEATURE_USE_WORDS.chance}
      optional
      hint={FEATURE_USE_WORDS.chanceHint(FEATURE_KIND_WORDS[kind].toLowerCase())}
    >
      <div className="grid grid-cols-2 gap-3 sm:grid-cols-3">
        {TIMES_OF_DAY.map((time) => (
          <TextInput
            key={time}
            label={TIME_WORDS[time]}
            inputMode="decimal"
            autoComplete="off"
            unit="%"
            placeholder={String(Math.round(common[time] * 100))}
            error={errorOf(`use.${time}`)}
            {...register(`use.${time}`)}
          />
        ))}
      </div>
    </FieldGroup>
  );
}

/** What stands in a field from year to year; each crop has its own months. */
export function CropFields({ fields, year }: { fields: Fields<FeatureForm>; year: number }) {
  const { register, errorOf, form } = fields;
  const kind = useWatch({ control: form.control, name: 'kind' });
  const rows = useFieldArray({ control: form.control, name: 'rotation' });
  if (kind !== 'crop') return null;
  return (
    <FieldGroup label={FEATURE_USE_WORDS.crops} optional hint={FEATURE_USE_WORDS.cropsHint}>
      <div className="flex flex-col gap-4">
        {rows.fields.map((row, i) => (
          <div key={row.id} className="grid gap-3 border-rule border-l-2 pl-3">
            <div className="grid grid-cols-[6rem_1fr] gap-3">
              <TextInput
                label={FEATURE_USE_WORDS.year}
                inputMode="numeric"
                autoComplete="off"
                error={errorOf(`rotation.${i}.year`)}
                {...register(`rotation.${i}.year`)}
              />
              <TextInput
                label={FEATURE_USE_WORDS.crop}
                autoComplete="off"
                error={errorOf(`rotation.${i}.crop`)}
                {...register(`rotation.${i}.crop`)}
              />
            </div>
            <CheckboxGroup
              label={FEATURE_USE_WORDS.months}
              choices={MONTH_CHOICES}
              error={errorOf(`rotation.${i}.months`)}
              {...register(`rotation.${i}.months`)}
            />
            <div>
              <Button look="quiet" onClick={() => rows.remove(i)}>
                {FEATURE_USE_WORDS.removeYear}
              </Button>
            </div>
          </div>
        ))}
        <div>
          <Button
            onClick={() => {
              const used = rows.fields.map((row) => Number(row.year));
              const next = used.length === 0 ? year : Math.max(...used) + 1;
              rows.append({ year: String(next), crop: '', months: [...ALL_MONTHS] });
            }}
          >
            {FEATURE_USE_WORDS.addYear}
          </Button>
        </div>
      </div>
    </FieldGroup>
  );
}
