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
import { APPROACH_WORDS } from '../words/forms';
import { DIRECTION_WORDS } from '../words/kinds';
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
      toast({ title: APPROACH_WORDS.saved(saved.name) });
      router.push(back);
    },
  });
  const draft = useKeptDraft(fields.form, `approach:${standId}:${at ? `${at.id}:${at.version}` : 'new'}`);
  const { register, errorOf } = fields;

  return (
    <form {...fields.formProps} className="flex max-w-2xl flex-col gap-5">
      <DraftNotice brought={draft.brought} onStartAfresh={draft.startAfresh} />
      <FormErrorSummary errors={fields.errors} />
      <TextInput label={APPROACH_WORDS.name} autoComplete="off" error={errorOf('name')} {...register('name')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          label={APPROACH_WORDS.parkingId}
          optional
          options={[
            { value: '', label: APPROACH_WORDS.none },
            ...places.parkings.map((p) => ({ value: p.id, label: p.name })),
          ]}
          error={errorOf('parkingId')}
          {...register('parkingId')}
        />
        <Select
          label={APPROACH_WORDS.direction}
          options={choicesOf(DIRECTION_WORDS)}
          error={errorOf('direction')}
          {...register('direction')}
        />
      </div>
      <Textarea
        label={APPROACH_WORDS.points}
        hint={APPROACH_WORDS.pointsHint(places.stand.name)}
        rows={8}
        spellCheck={false}
        error={errorOf('points')}
        {...register('points')}
      />
      <TextInput
        label={APPROACH_WORDS.drivenTo}
        optional
        hint={APPROACH_WORDS.drivenToHint}
        inputMode="numeric"
        className="max-w-36"
        error={errorOf('drivenTo')}
        {...register('drivenTo')}
      />
      <Textarea label={APPROACH_WORDS.notes} optional error={errorOf('notes')} {...register('notes')} />
      <SubmitRow label={APPROACH_WORDS.save} pending={fields.pending} pendingLabel={APPROACH_WORDS.saving}>
        <ButtonLink href={back} look="quiet">
          {APPROACH_WORDS.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
