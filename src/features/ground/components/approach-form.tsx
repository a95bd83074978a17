'use client';

import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { useKeptDraft } from '@/ui/form/use-kept-draft';
import { Select, Textarea, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type ApproachForm, type ApproachPlaces, makeApproachSchema } from '../approach-schema';
import type { FormClub } from '../form-club';
import { DIRECTION_WORDS } from '../words';
import { choicesOf } from './choices-of';
import { DraftNotice } from './draft-notice';
import type { ClubCall, Saved } from './form-types';

export interface ApproachFormProps {
  club: string;
  formClub: FormClub;
  standId: string;
  places: ApproachPlaces;
  values: ApproachForm;
  /** null: a new approach. */
  at: { id: string; version: number } | null;
  add: ClubCall<ApproachForm & { standId: string }, Saved>;
  change: ClubCall<ApproachForm & { id: string; version: number }, Saved>;
}

export function ApproachFormView(props: ApproachFormProps) {
  const { club, formClub, standId, places, values, at, add, change } = props;
  const router = useRouter();
  const toast = useToast();
  const schema = useMemo(() => makeApproachSchema(formClub, places), [formClub, places]);
  const back = `/clubs/${club}/stands/${standId}`;
  const fields = useActionForm<ApproachForm, Saved>({
    schema,
    defaultValues: values,
    submit: (typed) => (at ? change(club, { ...typed, ...at }) : add(club, { ...typed, standId })),
    onDone: (saved) => {
      draft.drop();
      toast({ title: `${saved.name} is saved` });
      router.push(back);
    },
  });
  const draft = useKeptDraft(fields.form, `approach:${standId}:${at ? `${at.id}:${at.version}` : 'new'}`);
  const { register, errorOf } = fields;

  return (
    <form {...fields.formProps} className="flex max-w-2xl flex-col gap-5">
      <DraftNotice brought={draft.brought} onStartAfresh={draft.startAfresh} />
      <FormErrorSummary errors={fields.errors} />
      <TextInput label="Name" autoComplete="off" error={errorOf('name')} {...register('name')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          label="From parking place"
          optional
          options={[{ value: '', label: 'None' }, ...places.parkings.map((p) => ({ value: p.id, label: p.name }))]}
          error={errorOf('parkingId')}
          {...register('parkingId')}
        />
        <Select
          label="Walked"
          options={choicesOf(DIRECTION_WORDS)}
          error={errorOf('direction')}
          {...register('direction')}
        />
      </div>
      <Textarea
        label="Places along the way"
        hint={`One to a line, latitude, longitude, from the parking place to ${places.stand.name}. The two ends may be left out.`}
        rows={8}
        spellCheck={false}
        error={errorOf('points')}
        {...register('points')}
      />
      <TextInput
        label="Driven as far as line"
        optional
        hint="Number of the last line above that is driven. Left blank, all of it is walked."
        inputMode="numeric"
        className="max-w-36"
        error={errorOf('drivenTo')}
        {...register('drivenTo')}
      />
      <Textarea label="Notes" optional error={errorOf('notes')} {...register('notes')} />
      <SubmitRow label="Save approach" pending={fields.pending} pendingLabel="Saving…">
        <ButtonLink href={back} look="quiet">
          Back without saving
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
