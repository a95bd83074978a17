'use client';

import { useRouter } from 'next/navigation';
import { DEFAULT_POINT_RULES } from '@/core/draw/points';
import type { ActionResult } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { Checkbox, CheckboxGroup } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, NumberInput, Select, Textarea, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type OpenDrawValues, openDrawSchema } from '../draw-schema';

export interface OpenDrawFormProps {
  club: string;
  stands: { value: string; label: string }[];
  open: (club: string, values: OpenDrawValues) => Promise<ActionResult<{ id: string }>>;
}

const WINDOWS = [
  { value: 'morning', label: 'Morning' },
  { value: 'evening', label: 'Evening' },
  { value: 'all_day', label: 'All day' },
];

export function OpenDrawForm({ club, stands, open }: OpenDrawFormProps) {
  const router = useRouter();
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm<OpenDrawValues, { id: string }>({
    schema: openDrawSchema,
    defaultValues: {
      day: '',
      windows: 'morning',
      standIds: stands.map((stand) => stand.value),
      closesDay: '',
      closesClock: '17:00',
      pointsPerMiss: DEFAULT_POINT_RULES.pointsPerMiss,
      resetOnGiven: DEFAULT_POINT_RULES.resetOnGiven,
      workHoursPerPoint: DEFAULT_POINT_RULES.workHoursPerPoint ?? 0,
      note: '',
    },
    submit: (typed) => open(club, typed),
    onDone: ({ id }) => {
      toast({ title: 'Draw opened' });
      router.push(`/clubs/${club}/draws/${id}`);
    },
  });
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      <div className="grid gap-4 sm:grid-cols-2">
        <DateInput label="Day" {...register('day')} error={errorOf('day')} />
        <Select label="Window" options={WINDOWS} {...register('windows')} error={errorOf('windows')} />
        <DateInput label="Entries close on" {...register('closesDay')} error={errorOf('closesDay')} />
        <TimeInput label="At" {...register('closesClock')} error={errorOf('closesClock')} />
      </div>
      <CheckboxGroup label="Stands drawn for" choices={stands} {...register('standIds')} error={errorOf('standIds')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <NumberInput
          label="Points for a draw that gave nothing"
          {...register('pointsPerMiss')}
          error={errorOf('pointsPerMiss')}
        />
        <NumberInput
          label="Hours of work for a point"
          hint="0: work earns no points."
          unit="h"
          {...register('workHoursPerPoint')}
          error={errorOf('workHoursPerPoint')}
        />
      </div>
      <Checkbox label="A stand given takes points back to none" {...register('resetOnGiven')} />
      <Textarea label="Note" optional rows={2} {...register('note')} error={errorOf('note')} />
      <SubmitRow label="Open the draw" pending={pending} pendingLabel="Opening…">
        <ButtonLink href={`/clubs/${club}/draws`} look="quiet">
          Back without opening
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
