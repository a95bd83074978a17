'use client';

import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { useWatch } from 'react-hook-form';
import type { FormClub } from '@/features/ground/form-club';
import { PlaceChoice } from '@/features/logs/components/place-choice';
import type { PlaceChoices } from '@/features/logs/visit-places';
import type { ActionResult } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, Select, Textarea, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type ChoreForm, makeChoreSchema } from '../chore-schema';
import { CHORE_FORM_WORDS } from '../words/chores';

const words = CHORE_FORM_WORDS;

export interface ChoreFormProps {
  club: string;
  formClub: FormClub;
  values: ChoreForm;
  people: { value: string; label: string }[];
  places: PlaceChoices;
  /** Set: changes that chore in place of adding one. */
  at: { id: string; version: number } | null;
  add: (club: string, values: ChoreForm) => Promise<ActionResult<{ id: string }>>;
  change: (club: string, values: ChoreForm & { id: string; version: number }) => Promise<ActionResult<{ id: string }>>;
}

export function ChoreFormView({ club, formClub, values, people, places, at, add, change }: ChoreFormProps) {
  const router = useRouter();
  const toast = useToast();
  const back = `/clubs/${club}/chores`;
  const schema = useMemo(() => makeChoreSchema(formClub), [formClub]);
  const { form, register, errorOf, errors, pending, formProps } = useActionForm({
    schema,
    defaultValues: values,
    submit: (typed: ChoreForm) => (at ? change(club, { ...typed, ...at }) : add(club, typed)),
    onDone: () => {
      toast({ title: at ? words.changed : words.added });
      router.push(back);
    },
  });
  const place = useWatch({ control: form.control, name: 'place' });
  const groups = [
    { label: words.stands, options: places.stands },
    { label: words.features, options: places.features },
    { label: words.parking, options: places.parkings },
  ].filter((group) => group.options.length > 0);
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      <TextInput label={words.what} {...register('title')} error={errorOf('title')} />
      <Select
        label={words.who}
        placeholder={words.whoever}
        options={people}
        {...register('assigneeId')}
        error={errorOf('assigneeId')}
      />
      <PlaceChoice
        placeholder={words.noPlace}
        groups={groups}
        byPosition={place === 'point'}
        fields={{ place: register('place'), lat: register('lat'), lon: register('lon') }}
        errorOf={errorOf}
        onHere={({ lat, lon }) => {
          form.setValue('lat', lat, { shouldDirty: true });
          form.setValue('lon', lon, { shouldDirty: true });
        }}
      />
      <DateInput label={words.due} optional {...register('dueOn')} error={errorOf('dueOn')} />
      <Textarea label={words.notes} optional rows={3} {...register('notes')} error={errorOf('notes')} />
      <SubmitRow label={at ? words.save : words.add} pending={pending} pendingLabel={words.saving}>
        <ButtonLink href={back} look="quiet">
          {words.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
