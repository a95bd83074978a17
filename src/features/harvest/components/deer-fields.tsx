'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { AGE_CLASSES, AGE_METHODS } from '@/core/harvest/harvest-types';
import type { Units } from '@/core/units';
import { RadioCards } from '@/ui/choices';
import { FieldGroup } from '@/ui/field';
import { NumberInput, Select } from '@/ui/text-inputs';
import type { HarvestForm } from '../harvest-schema';
import { AGE_METHOD_WORDS, AGE_WORDS, DEER_KIND_WORDS, DEER_KINDS } from '../harvest-words';
import { useHarvestFields } from './use-harvest-fields';

const KINDS = DEER_KINDS.map((value) => ({ value, label: DEER_KIND_WORDS[value] }));
const AGES = [
  { value: '', label: 'Not estimated' },
  ...AGE_CLASSES.map((value) => ({ value, label: AGE_WORDS[value] })),
];
const METHODS = [
  { value: '', label: 'Choose how' },
  ...AGE_METHODS.map((value) => ({ value, label: AGE_METHOD_WORDS[value] })),
];
const MILK = [
  { value: '', label: 'Not looked at' },
  { value: 'yes', label: 'In milk' },
  { value: 'no', label: 'Dry' },
];

/** What the deer was: kind, age, weights, antlers or milk. */
export function DeerFields({ units }: { units: Units }) {
  const field = useHarvestFields();
  const { control } = useFormContext<HarvestForm>();
  const [deer, age] = useWatch({ control, name: ['deer', 'age'] });
  const weight = units === 'us' ? 'lb' : 'kg';
  const length = units === 'us' ? 'in' : 'cm';
  return (
    <>
      <RadioCards label="Deer" across choices={KINDS} {...field('deer')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <Select label="Estimated age" options={AGES} {...field('age')} />
        {age !== '' && <Select label="Estimated by" options={METHODS} {...field('ageMethod')} />}
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <NumberInput
          label="Dressed weight"
          optional
          hint="Field dressed. Never the live weight."
          unit={weight}
          {...field('dressed')}
        />
        <NumberInput label="Live weight" optional hint="Only if weighed whole." unit={weight} {...field('live')} />
      </div>
      {deer === 'antlered_buck' && (
        <FieldGroup label="Antlers">
          <div className="grid grid-cols-2 gap-4">
            <NumberInput label="Points, left" optional step="1" {...field('pointsLeft')} />
            <NumberInput label="Points, right" optional step="1" {...field('pointsRight')} />
            <NumberInput label="Main beam, left" optional unit={length} {...field('mainBeamLeft')} />
            <NumberInput label="Main beam, right" optional unit={length} {...field('mainBeamRight')} />
            <NumberInput label="Inside spread" optional unit={length} {...field('insideSpread')} />
          </div>
        </FieldGroup>
      )}
      {deer === 'doe' && <RadioCards label="Milk" across choices={MILK} {...field('lactating')} />}
    </>
  );
}
