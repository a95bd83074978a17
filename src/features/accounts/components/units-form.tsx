'use client';

import { RadioCards } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { type ChangeUnitsInput, changeUnitsSchema } from '../account-schema';

interface Props {
  units: ChangeUnitsInput['units'];
  action: (values: ChangeUnitsInput) => Promise<ActionAnswer<null>>;
}

const CHOICES = [
  { value: 'club', label: 'As the club has it' },
  { value: 'us', label: 'US', note: 'yards, feet, mph, °F, 12-hour clock' },
  { value: 'metric', label: 'Metric', note: 'metres, km/h, °C, 24-hour clock' },
];

export function UnitsForm({ units, action }: Props) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: changeUnitsSchema,
    defaultValues: { units },
    submit: action,
    onDone: () => toast({ title: 'Units saved' }),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <RadioCards
        label="Figures and clock"
        {...register('units')}
        defaultValue={units}
        choices={CHOICES}
        error={errorOf('units')}
      />
      <SubmitRow label="Save the units" look="plain" pending={pending} />
    </form>
  );
}
