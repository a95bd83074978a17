'use client';

import { RadioCards } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { type ChangeUnitsInput, changeUnitsSchema } from '../account-schema';
import { UNITS_WORDS } from '../words/forms';

interface Props {
  units: ChangeUnitsInput['units'];
  action: (values: ChangeUnitsInput) => Promise<ActionAnswer<null>>;
}

const CHOICES = [
  { value: 'club', label: UNITS_WORDS.club },
  { value: 'us', label: UNITS_WORDS.us, note: UNITS_WORDS.usNote },
  { value: 'metric', label: UNITS_WORDS.metric, note: UNITS_WORDS.metricNote },
];

export function UnitsForm({ units, action }: Props) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: changeUnitsSchema,
    defaultValues: { units },
    submit: action,
    onDone: () => toast({ title: UNITS_WORDS.saved }),
  });
  return (
    <form {...formProps} className="flex flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <RadioCards
        label={UNITS_WORDS.units}
        {...register('units')}
        defaultValue={units}
        choices={CHOICES}
        error={errorOf('units')}
      />
      <SubmitRow label={UNITS_WORDS.save} look="plain" pending={pending} />
    </form>
  );
}
