'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '@/ui/button';
import { FieldError } from '@/ui/field';
import { Card, Section } from '@/ui/page-parts';
import { DateInput, NumberInput, Select, Textarea, TextInput } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
import { useRulesFields } from './use-rules-fields';

const DEER = [
  { value: 'any', label: 'Any deer' },
  { value: 'antlered', label: 'Antlered deer' },
  { value: 'antlerless', label: 'Antlerless deer' },
];
const PER = [
  { value: 'club', label: 'The whole club' },
  { value: 'member', label: 'Each member, guests counted on their sponsor' },
  { value: 'member_guests', label: 'All guests of a member together' },
];

/** Quotas of deer, and the state's rules in the club's words. */
export function RulesHarvest() {
  const { control, formState } = useFormContext<RulesForm>();
  const { fields, append, remove } = useFieldArray({ control, name: 'harvestQuotas' });
  const field = useRulesFields();
  const whole = formState.errors.harvestQuotas?.root?.message ?? formState.errors.harvestQuotas?.message;
  return (
    <>
      <Section
        title="Harvest quotas"
        note="Most deer a season, 1 July to 30 June. A quota that is met is said before booking; it refuses nothing."
      >
        <FieldError>{whole}</FieldError>
        <div className="flex flex-col gap-4">
          {fields.map((row, i) => (
            <Card key={row.id} className="grid gap-4 sm:grid-cols-2">
              <Select label="Deer" options={DEER} {...field(`harvestQuotas.${i}.deer`)} />
              <Select label="For" options={PER} {...field(`harvestQuotas.${i}.per`)} />
              <NumberInput label="At most" unit="deer" step="1" {...field(`harvestQuotas.${i}.most`)} />
              <div className="self-end">
                <Button look="quiet" onClick={() => remove(i)}>
                  Take this quota out
                </Button>
              </div>
            </Card>
          ))}
        </div>
        <Button
          className="mt-3"
          onClick={() => append({ deer: 'antlered', per: 'member', most: '' })}
          disabled={fields.length >= 20}
        >
          Add a quota
        </Button>
      </Section>
      <Section
        title="The state's rules for deer"
        note="Bag limits, tags, reporting: as your state's digest gives them, with where they stand and the day you read them. Shown on the harvest page; state law decides. Leave all three blank for none."
      >
        <div className="flex flex-col gap-5">
          <Textarea label="The rules" optional rows={6} {...field('stateRuleText')} />
          <TextInput label="Source" optional {...field('stateRuleSource')} />
          <DateInput label="Stated on" optional {...field('stateRuleStatedOn')} />
        </div>
      </Section>
    </>
  );
}
