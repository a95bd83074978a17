'use client';

import { useWatch } from 'react-hook-form';
import { weaponWord } from '@/core/booking/seasons';
import { WEAPONS } from '@/core/ground-types';
import { GuestFields } from '@/features/bookings/components/guest-fields';
import type { ActionResult } from '@/server/doors';
import { Checkbox, CheckboxGroup } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Select } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type EnterDrawValues, enterDrawSchema } from '../draw-schema';
import type { DrawScreen } from '../reads';
import { ENTRY_FORM_WORDS as WORDS } from '../words/forms';

export interface EntryFormProps {
  club: string;
  draw: Pick<DrawScreen, 'form' | 'hasEntered' | 'slots' | 'stands' | 'knownGuests' | 'mostGuests'>;
  enter: (club: string, values: EnterDrawValues) => Promise<ActionResult<{ entered: boolean }>>;
}

const WEAPON_CHOICES = WEAPONS.map((value) => ({ value, label: weaponWord(value) }));

/** A member's wishes, in order. */
export function EntryForm({ club, draw, enter }: EntryFormProps) {
  const { form: values, hasEntered, slots, stands } = draw;
  const toast = useToast();
  const { form, register, errorOf, errors, pending, formProps } = useActionForm<EnterDrawValues, { entered: boolean }>({
    schema: enterDrawSchema,
    defaultValues: values,
    submit: (typed) => enter(club, typed),
    onDone: () => toast({ title: hasEntered ? WORDS.changed : WORDS.entered }),
  });
  const guests = useWatch({ control: form.control, name: 'guests' }) ?? [];
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      {slots.length > 1 && (
        <CheckboxGroup
          label={WORDS.slots}
          hint={WORDS.slotsHint}
          choices={slots}
          {...register('slots')}
          error={errorOf('slots')}
        />
      )}
      <Select label={WORDS.weapon} options={WEAPON_CHOICES} {...register('weapon')} error={errorOf('weapon')} />
      {slots.length > 1 && <p className="-mb-3 text-ink-soft text-sm">{WORDS.choicesHint}</p>}
      <div className="grid gap-4 sm:grid-cols-2">
        {values.choices.map((_, at) => (
          <Select
            // biome-ignore lint/suspicious/noArrayIndexKey: the choices are their places.
            key={at}
            label={WORDS.choices[at] ?? WORDS.laterChoice}
            placeholder={WORDS.noChoice}
            options={stands}
            {...register(`choices.${at}`)}
            error={errorOf(`choices.${at}`)}
          />
        ))}
      </div>
      <Checkbox label={WORDS.any} hint={WORDS.anyHint} {...register('anyByScore')} />
      <GuestFields
        guests={guests}
        onChange={(next) => form.setValue('guests', next, { shouldDirty: true })}
        known={draw.knownGuests}
        most={draw.mostGuests}
        errorOf={(path) => errorOf(path)}
      />
      <SubmitRow label={hasEntered ? WORDS.change : WORDS.enter} pending={pending} pendingLabel={WORDS.pending} />
    </form>
  );
}
