'use client';

import { type FieldPath, useFormContext } from 'react-hook-form';
import type { RulesForm } from '../rules-form-schema';

/** Registers a field of the rules form with its error beside it: spread the answer on a part of the look. */
export function useRulesFields() {
  const { register, formState, getFieldState } = useFormContext<RulesForm>();
  return (path: FieldPath<RulesForm>) => ({
    ...register(path),
    error: getFieldState(path, formState).error?.message,
  });
}
