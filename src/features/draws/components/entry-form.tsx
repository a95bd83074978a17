'use client';

import { weaponWord } from '@/core/booking/seasons';
import { WEAPONS } from '@/core/types';
import type { ActionResult } from '@/server/doors';
import { Checkbox } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Select } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type EnterDrawValues, enterDrawSchema } from '../draw-schema';

export interface EntryFormProps {
  club: string;
  form: EnterDrawValues;
  hasEntered: boolean;
  stands: { value: string; label: string }[];
  enter: (club: string, values: EnterDrawValues) => Promise<ActionResult<{ entered: boolean }>>;
}

const ORDINALS = ['First', 'Second', 'Third', 'Fourth', 'Fifth', 'Sixth'];
const WEAPON_CHOICES = WEAPONS.map((value) => ({ value, label: weaponWord(value) }));

/** A member's wishes, in order. */
export function EntryForm({ club, form: values, hasEntered, stands, enter }: EntryFormProps) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm<EnterDrawValues, { entered: boolean }>({
    schema: enterDrawSchema,
    defaultValues: values,
    submit: (typed) => enter(club, typed),
    onDone: () => toast({ title: hasEntered ? 'Wishes changed' : 'You are in the draw' }),
  });
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      <Select label="Weapon" options={WEAPON_CHOICES} {...register('weapon')} error={errorOf('weapon')} />
      <div className="grid gap-4 sm:grid-cols-2">
        {values.choices.map((_, at) => (
          <Select
            // biome-ignore lint/suspicious/noArrayIndexKey: the choices are their places.
            key={at}
            label={`${ORDINALS[at] ?? 'Later'} choice`}
            placeholder="No choice"
            options={stands}
            {...register(`choices.${at}`)}
            error={errorOf(`choices.${at}`)}
          />
        ))}
      </div>
      <Checkbox
        label="Else any stand, the best by its sit score"
        hint="Without choices of your own all of it is left to the score."
        {...register('anyByScore')}
      />
      <SubmitRow label={hasEntered ? 'Change my wishes' : 'Enter the draw'} pending={pending} pendingLabel="Saving…" />
    </form>
  );
}
