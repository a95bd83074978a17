'use client';

import { useFieldArray, useFormContext } from 'react-hook-form';
import { Button } from '@/ui/button';
import { FieldError } from '@/ui/field';
import { Card, Section } from '@/ui/page-parts';
import { DateInput, NumberInput, TextInput } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
import { useRulesFields } from './use-rules-fields';

const NEW_RULE = { name: '', minutesBeforeSunrise: '30', minutesAfterSunset: '30', source: '', statedOn: '' };

export function RulesLegalLight() {
  const { control, formState } = useFormContext<RulesForm>();
  const { fields, append, remove } = useFieldArray({ control, name: 'legalLight' });
  const field = useRulesFields();
  const whole = formState.errors.legalLight?.root?.message ?? formState.errors.legalLight?.message;
  return (
    <Section
      title="Legal light"
      note="Write the rule down as your state's digest gives it, with where it stands and the day you read it. Windrest declares nothing legal: it shows this rule, its source and its day. State law decides."
    >
      <FieldError>{whole}</FieldError>
      <div className="flex flex-col gap-4">
        {fields.map((row, i) => (
          <Card key={row.id} className="flex flex-col gap-4">
            <TextInput
              label="Name of the rule"
              hint="Such as the game it is for. Seasons refer to it by this name."
              autoComplete="off"
              {...field(`legalLight.${i}.name`)}
            />
            <div className="grid gap-4 sm:grid-cols-2">
              <NumberInput
                label="Opens before sunrise"
                unit="minutes"
                step="1"
                {...field(`legalLight.${i}.minutesBeforeSunrise`)}
              />
              <NumberInput
                label="Closes after sunset"
                unit="minutes"
                step="1"
                {...field(`legalLight.${i}.minutesAfterSunset`)}
              />
            </div>
            <TextInput label="Source" hint="Where it is written, with the page." {...field(`legalLight.${i}.source`)} />
            <DateInput
              label="Stated on"
              hint="The day an officer read it there."
              {...field(`legalLight.${i}.statedOn`)}
            />
            <div>
              <Button look="quiet" onClick={() => remove(i)}>
                Take this rule out
              </Button>
            </div>
          </Card>
        ))}
      </div>
      <Button className="mt-3" onClick={() => append(NEW_RULE)} disabled={fields.length >= 20}>
        Add a legal-light rule
      </Button>
    </Section>
  );
}
