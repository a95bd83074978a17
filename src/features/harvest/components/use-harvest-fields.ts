'use client';

import { useFormContext } from 'react-hook-form';
import type { HarvestForm } from '../harvest-schema';

/** Registers a field of the sheet with its error beside it. */
export function useHarvestFields() {
  const { register, formState, getFieldState } = useFormContext<HarvestForm>();
  return (path: keyof HarvestForm) => ({ ...register(path), error: getFieldState(path, formState).error?.message });
}
