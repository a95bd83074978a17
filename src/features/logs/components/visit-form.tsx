'use client';

import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { useController, useWatch } from 'react-hook-form';
import type { FormClub } from '@/features/ground/form-club';
import type { ActionResult } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { KEPT_TOAST, useSendOrKeep } from '@/ui/offline/use-send-or-keep';
import { Stepper } from '@/ui/stepper';
import { DateInput, Select, Textarea, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { PlaceChoices } from '../visit-places';
import { makeVisitSchema, VISIT_KINDS, type VisitForm } from '../visit-schema';
import { VISIT_FORM_WORDS, VISIT_WORDS } from '../words/visits';
import { PlaceChoice } from './place-choice';

export interface VisitFormProps {
  club: string;
  formClub: FormClub;
  values: VisitForm;
  places: PlaceChoices;
  add: (club: string, values: VisitForm) => Promise<ActionResult<{ id: string; name: string }>>;
}

const words = VISIT_FORM_WORDS;
const KINDS = VISIT_KINDS.map((value) => ({ value, label: VISIT_WORDS[value] }));

export function VisitFormView({ club, formClub, values, places, add }: VisitFormProps) {
  const router = useRouter();
  const toast = useToast();
  const sendOrKeep = useSendOrKeep();
  const back = `/clubs/${club}/log`;
  const schema = useMemo(() => makeVisitSchema(formClub), [formClub]);
  const { form, register, errorOf, errors, pending, formProps } = useActionForm({
    schema,
    defaultValues: values,
    submit: (typed: VisitForm) => {
      const label = words.kept(typed.kind, typed.day, typed.clock);
      return sendOrKeep({ kind: 'visit', club, label, values: typed, send: (all) => add(club, all) });
    },
    onDone: (saved: { name: string } | null) => {
      toast(saved ? { title: words.saved, text: saved.name } : KEPT_TOAST);
      router.push(back);
    },
  });
  const place = useWatch({ control: form.control, name: 'place' });
  const { field: bumped } = useController({ control: form.control, name: 'bumped' });
  const groups = [
    { label: words.stands, options: places.stands },
    { label: words.features, options: places.features },
    { label: words.parking, options: places.parkings },
  ].filter((group) => group.options.length > 0);
  return (
    <form {...formProps} className="flex max-w-2xl flex-col gap-5">
      <FormErrorSummary errors={errors} />
      <Select label={words.what} options={KINDS} {...register('kind')} error={errorOf('kind')} />
      <div className="grid grid-cols-2 gap-4">
        <DateInput label={words.day} {...register('day')} error={errorOf('day')} />
        <TimeInput label={words.time} {...register('clock')} error={errorOf('clock')} />
      </div>
      <PlaceChoice
        placeholder={words.choosePlace}
        groups={groups}
        byPosition={place === 'point'}
        fields={{ place: register('place'), lat: register('lat'), lon: register('lon') }}
        errorOf={errorOf}
        onHere={({ lat, lon }) => {
          form.setValue('lat', lat, { shouldDirty: true });
          form.setValue('lon', lon, { shouldDirty: true });
        }}
      />
      <Stepper
        label={words.bumped}
        name={bumped.name}
        value={bumped.value}
        onChange={bumped.onChange}
        onBlur={bumped.onBlur}
        error={errorOf('bumped')}
      />
      <Textarea label={words.notes} optional rows={2} {...register('notes')} error={errorOf('notes')} />
      <SubmitRow label={words.save} pending={pending} pendingLabel={words.saving}>
        <ButtonLink href={back} look="quiet">
          {words.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
