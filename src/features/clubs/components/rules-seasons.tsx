'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { weaponWord } from '@/core/booking/seasons';
import { WEAPONS } from '@/core/types';
import { Button } from '@/ui/button';
import { CheckboxGroup } from '@/ui/choices';
import { Card, Section } from '@/ui/page-parts';
import { DateInput, Select, TextInput } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
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
    <Section title="Seasons" note="The dates your club hunts, by weapon. With none set, every day is open for booking.">
      <div className="flex flex-col gap-4">
        {fields.map((row, i) => (
          <Card key={row.key} className="flex flex-col gap-4">
            <TextInput label="Name of the season" autoComplete="off" {...field(`seasons.${i}.name`)} />
            <CheckboxGroup label="Weapons" choices={WEAPON_CHOICES} {...field(`seasons.${i}.weapons`)} />
            <div className="grid gap-4 sm:grid-cols-2">
              <DateInput label="First day" {...field(`seasons.${i}.fromDay`)} />
              <DateInput label="Last day" {...field(`seasons.${i}.toDay`)} />
            </div>
            <Select
              label="Legal-light rule"
              optional
              options={[
                { value: '', label: lightNames.length === 1 ? 'The only one' : 'None named' },
                ...lightNames.map((name) => ({ value: name, label: name })),
              ]}
              fieldClassName="max-w-sm"
              {...field(`seasons.${i}.legalLightName`)}
            />
            <div>
              <Button look="quiet" onClick={() => remove(i)}>
                Take this season out
              </Button>
            </div>
          </Card>
        ))}
      </div>
      <Button className="mt-3" onClick={add} disabled={fields.length >= 60}>
        Add a season
      </Button>
    </Section>
  );
}
