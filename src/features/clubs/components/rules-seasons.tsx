'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { weaponWord } from '@/core/booking/seasons';
import { WEAPONS } from '@/core/ground-types';
import { CheckboxGroup } from '@/ui/choices';
import { DateInput, Select, TextInput } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
import { RULES_SEASONS_WORDS } from '../words/rules-form';
import { RuleRows } from './rule-rows';
import { useRulesFields } from './use-rules-fields';

const WEAPON_CHOICES = WEAPONS.map((weapon) => ({ value: weapon, label: weaponWord(weapon) }));

/** The first of season-1, season-2 … that no season has. */
function freeId(taken: string[]): string {
  let n = taken.length + 1;
  while (taken.includes(`season-${n}`)) n += 1;
  return `season-${n}`;
}

export function RulesSeasons() {
  const { control, getValues, watch } = useFormContext<RulesForm>();
  // `id` is the season's own; the list's key has another name.
  const { fields, append, remove } = useFieldArray({ control, name: 'seasons', keyName: 'key' });
  const field = useRulesFields();
  const lightNames = [...new Set(watch('legalLight').map((rule) => rule.name.trim()))].filter((name) => name !== '');

  function add() {
    const id = freeId(getValues('seasons').map((season) => season.id));
    append({ id, name: '', weapons: [], fromDay: '', toDay: '', legalLightName: '' });
  }

  return (
    <RuleRows
      name="seasons"
      keys={fields.map((row) => row.key)}
      words={RULES_SEASONS_WORDS}
      most={60}
      onAdd={add}
      onRemove={remove}
    >
      {(i) => (
        <>
          <TextInput label={RULES_SEASONS_WORDS.name} autoComplete="off" {...field(`seasons.${i}.name`)} />
          <CheckboxGroup
            label={RULES_SEASONS_WORDS.weapons}
            choices={WEAPON_CHOICES}
            {...field(`seasons.${i}.weapons`)}
          />
          <div className="grid gap-4 sm:grid-cols-2">
            <DateInput label={RULES_SEASONS_WORDS.firstDay} {...field(`seasons.${i}.fromDay`)} />
            <DateInput label={RULES_SEASONS_WORDS.lastDay} {...field(`seasons.${i}.toDay`)} />
          </div>
          <Select
            label={RULES_SEASONS_WORDS.light}
            optional
            options={[
              {
                value: '',
                label: lightNames.length === 1 ? RULES_SEASONS_WORDS.onlyLight : RULES_SEASONS_WORDS.noLight,
              },
              ...lightNames.map((name) => ({ value: name, label: name })),
            ]}
            fieldClassName="max-w-sm"
            {...field(`seasons.${i}.legalLightName`)}
          />
        </>
      )}
    </RuleRows>
  );
}
