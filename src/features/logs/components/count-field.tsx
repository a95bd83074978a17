'use client';

import { type Control, useController } from 'react-hook-form';
import { Stepper } from '@/ui/stepper';
import type { BUMP_FIELDS, COUNT_FIELDS, LogForm } from '../log-schema';

interface CountFieldProps {
  control: Control<LogForm>;
  name: (typeof COUNT_FIELDS)[number] | (typeof BUMP_FIELDS)[number];
  label: string;
  big?: boolean;
}

/** A count of the log's form. */
export function CountField({ control, name, label, big }: CountFieldProps) {
  const { field, fieldState } = useController({ control, name });
  return (
    <Stepper
      label={label}
      name={field.name}
      value={field.value}
      onChange={field.onChange}
      onBlur={field.onBlur}
      error={fieldState.error?.message}
      size={big ? 'big' : 'usual'}
      className={big ? 'border-rule border-b py-1.5' : 'py-0.5'}
    />
  );
}
