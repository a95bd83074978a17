'use client';

import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { useKeptDraft } from '@/ui/form/use-kept-draft';
import { Textarea, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { FormClub } from '../form-club';
import { makeParkingSchema, type ParkingForm } from '../parking-schema';
import { PARKING_WORDS } from '../words/forms';
import { DraftNotice } from './draft-notice';
import type { ClubCall, Saved } from './form-types';
import { HereButton } from './here-button';

export interface ParkingFormProps {
  club: string;
  formClub: FormClub;
  values: ParkingForm;
  /** null: a new parking place. */
  at: { id: string; version: number } | null;
  add: ClubCall<ParkingForm, Saved>;
  change: ClubCall<ParkingForm & { id: string; version: number }, Saved>;
}

export function ParkingFormView({ club, formClub, values, at, add, change }: ParkingFormProps) {
  const router = useRouter();
  const toast = useToast();
  const schema = useMemo(() => makeParkingSchema(formClub), [formClub]);
  const back = `/clubs/${club}/ground`;
  const fields = useActionForm<ParkingForm, Saved>({
    schema,
    defaultValues: values,
    submit: (typed) => (at ? change(club, { ...typed, ...at }) : add(club, typed)),
    onDone: (saved) => {
      draft.drop();
      toast({ title: PARKING_WORDS.saved(saved.name) });
      router.push(back);
    },
  });
  const draft = useKeptDraft(fields.form, `parking:${club}:${at ? `${at.id}:${at.version}` : 'new'}`);
  const { register, errorOf, form } = fields;

  return (
    <form {...fields.formProps} className="flex max-w-2xl flex-col gap-5">
      <DraftNotice brought={draft.brought} onStartAfresh={draft.startAfresh} />
      <FormErrorSummary errors={fields.errors} />
      <TextInput label={PARKING_WORDS.name} autoComplete="off" error={errorOf('name')} {...register('name')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <TextInput
          label={PARKING_WORDS.lat}
          hint={PARKING_WORDS.latHint}
          autoComplete="off"
          error={errorOf('lat')}
          {...register('lat')}
        />
        <TextInput
          label={PARKING_WORDS.lon}
          hint={PARKING_WORDS.lonHint}
          autoComplete="off"
          error={errorOf('lon')}
          {...register('lon')}
        />
        <HereButton
          onPlace={({ lat, lon }) => {
            form.setValue('lat', lat, { shouldDirty: true });
            form.setValue('lon', lon, { shouldDirty: true, shouldValidate: true });
          }}
        />
      </div>
      <Textarea
        label={PARKING_WORDS.notes}
        optional
        hint={PARKING_WORDS.notesHint}
        error={errorOf('notes')}
        {...register('notes')}
      />
      <SubmitRow label={PARKING_WORDS.save} pending={fields.pending} pendingLabel={PARKING_WORDS.saving}>
        <ButtonLink href={back} look="quiet">
          {PARKING_WORDS.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
