'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { AGE_CLASSES, AGE_METHODS } from '@/core/harvest/harvest-types';
import type { Units } from '@/core/units';
import { RadioCards } from '@/ui/choices';
import { FieldGroup } from '@/ui/field';
import { NumberInput, Select } from '@/ui/text-inputs';
import { DEER_KINDS } from '../deer-kind';
import type { HarvestForm } from '../harvest-schema';
import { AGE_METHOD_WORDS, AGE_WORDS, DEER_KIND_WORDS } from '../words/deer';
import { DEER_FORM_WORDS } from '../words/sheet';
import { useHarvestFields } from './use-harvest-fields';

const words = DEER_FORM_WORDS;
const KINDS = DEER_KINDS.map((value) => ({ value, label: DEER_KIND_WORDS[value] }));
const AGES = [
  { value: '', label: words.notEstimated },
  ...AGE_CLASSES.map((value) => ({ value, label: AGE_WORDS[value] })),
];
const METHODS = [
  { value: '', label: words.chooseMethod },
  ...AGE_METHODS.map((value) => ({ value, label: AGE_METHOD_WORDS[value] })),
];
const MILK = [
  { value: '', label: words.notLookedAt },
  { value: 'yes', label: words.inMilk },
  { value: 'no', label: words.dry },
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
      <RadioCards label={words.deer} across choices={KINDS} {...field('deer')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <Select label={words.age} options={AGES} {...field('age')} />
        {age !== '' && <Select label={words.method} options={METHODS} {...field('ageMethod')} />}
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <NumberInput label={words.dressed} optional hint={words.dressedHint} unit={weight} {...field('dressed')} />
        <NumberInput label={words.live} optional hint={words.liveHint} unit={weight} {...field('live')} />
      </div>
      {deer === 'antlered_buck' && (
        <FieldGroup label={words.antlers}>
          <div className="grid grid-cols-2 gap-4">
            <NumberInput label={words.pointsLeft} optional step="1" {...field('pointsLeft')} />
            <NumberInput label={words.pointsRight} optional step="1" {...field('pointsRight')} />
            <NumberInput label={words.mainBeamLeft} optional unit={length} {...field('mainBeamLeft')} />
            <NumberInput label={words.mainBeamRight} optional unit={length} {...field('mainBeamRight')} />
            <NumberInput label={words.insideSpread} optional unit={length} {...field('insideSpread')} />
          </div>
        </FieldGroup>
      )}
      {deer === 'doe' && <RadioCards label={words.milk} across choices={MILK} {...field('lactating')} />}
    </>
  );
}
