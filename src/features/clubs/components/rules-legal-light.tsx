'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { DateInput, NumberInput, TextInput } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
import { COUNT_WORDS, RULES_LEGAL_LIGHT_WORDS } from '../words/rules-form';
import { RuleRows } from './rule-rows';
import { useRulesFields } from './use-rules-fields';

const NEW_RULE = { name: '', minutesBeforeSunrise: '30', minutesAfterSunset: '30', source: '', statedOn: '' };

export function RulesLegalLight() {
  const { control } = useFormContext<RulesForm>();
  const { fields, append, remove } = useFieldArray({ control, name: 'legalLight' });
  const field = useRulesFields();
  return (
    <RuleRows
      name="legalLight"
      keys={fields.map((row) => row.id)}
      words={RULES_LEGAL_LIGHT_WORDS}
      most={20}
      onAdd={() => append(NEW_RULE)}
      onRemove={remove}
    >
      {(i) => (
        <>
          <TextInput
            label={RULES_LEGAL_LIGHT_WORDS.name}
            hint={RULES_LEGAL_LIGHT_WORDS.nameHint}
            autoComplete="off"
            {...field(`legalLight.${i}.name`)}
          />
          <div className="grid gap-4 sm:grid-cols-2">
            <NumberInput
              label={RULES_LEGAL_LIGHT_WORDS.opensBeforeSunrise}
              unit={COUNT_WORDS.minutes}
              step="1"
              {...field(`legalLight.${i}.minutesBeforeSunrise`)}
            />
            <NumberInput
              label={RULES_LEGAL_LIGHT_WORDS.closesAfterSunset}
              unit={COUNT_WORDS.minutes}
              step="1"
              {...field(`legalLight.${i}.minutesAfterSunset`)}
            />
          </div>
          <TextInput
            label={RULES_LEGAL_LIGHT_WORDS.source}
            hint={RULES_LEGAL_LIGHT_WORDS.sourceHint}
            {...field(`legalLight.${i}.source`)}
          />
          <DateInput
            label={RULES_LEGAL_LIGHT_WORDS.statedOn}
            hint={RULES_LEGAL_LIGHT_WORDS.statedOnHint}
            {...field(`legalLight.${i}.statedOn`)}
          />
        </>
      )}
    </RuleRows>
  );
}
