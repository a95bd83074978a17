'use client';

import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { ButtonLink } from '@/ui/button';
import { CheckboxGroup, RadioCards } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { useKeptDraft } from '@/ui/form/use-kept-draft';
import { Select, Textarea, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type FeatureForm, makeFeatureSchema } from '../feature-schema';
import type { FormClub } from '../form-club';
import { FEATURE_WORDS } from '../words/forms';
import { FEATURE_KIND_WORDS, MONTH_CHOICES, SHAPE_WORDS } from '../words/kinds';
import { choicesOf } from './choices-of';
import { DraftNotice } from './draft-notice';
import { CropFields, FeatureUseFields } from './feature-use-fields';
import type { ClubCall, Saved } from './form-types';

export interface FeatureFormProps {
  club: string;
  formClub: FormClub;
  values: FeatureForm;
  /** The year of the crops that stand now. */
  year: number;
  /** null: a new feature. */
  at: { id: string; version: number } | null;
  add: ClubCall<FeatureForm, Saved>;
  change: ClubCall<FeatureForm & { id: string; version: number }, Saved>;
}

export function FeatureFormView({ club, formClub, values, year, at, add, change }: FeatureFormProps) {
  const router = useRouter();
  const toast = useToast();
  const schema = useMemo(() => makeFeatureSchema(formClub), [formClub]);
  const back = `/clubs/${club}/ground`;
  const fields = useActionForm<FeatureForm, Saved>({
    schema,
    defaultValues: values,
    submit: (typed) => (at ? change(club, { ...typed, ...at }) : add(club, typed)),
    onDone: (saved) => {
      draft.drop();
      toast({ title: FEATURE_WORDS.saved(saved.name) });
      router.push(back);
    },
  });
  const draft = useKeptDraft(fields.form, `feature:${club}:${at ? `${at.id}:${at.version}` : 'new'}`);
  const { register, errorOf } = fields;

  return (
    <form {...fields.formProps} className="flex max-w-2xl flex-col gap-5">
      <DraftNotice brought={draft.brought} onStartAfresh={draft.startAfresh} />
      <FormErrorSummary errors={fields.errors} />
      <div className="grid gap-4 sm:grid-cols-2">
        <TextInput label={FEATURE_WORDS.name} autoComplete="off" error={errorOf('name')} {...register('name')} />
        <Select
          label={FEATURE_WORDS.kind}
          options={choicesOf(FEATURE_KIND_WORDS)}
          error={errorOf('kind')}
          {...register('kind')}
        />
      </div>
      <RadioCards
        label={FEATURE_WORDS.shape}
        across
        choices={choicesOf(SHAPE_WORDS)}
        error={errorOf('shape')}
        {...register('shape')}
      />
      <Textarea
        label={FEATURE_WORDS.places}
        hint={FEATURE_WORDS.placesHint}
        rows={8}
        spellCheck={false}
        error={errorOf('places')}
        {...register('places')}
      />
      <CheckboxGroup
        label={FEATURE_WORDS.months}
        choices={MONTH_CHOICES}
        error={errorOf('months')}
        {...register('months')}
      />
      <CropFields fields={fields} year={year} />
      <FeatureUseFields fields={fields} />
      <Textarea label={FEATURE_WORDS.notes} optional error={errorOf('notes')} {...register('notes')} />
      <SubmitRow label={FEATURE_WORDS.save} pending={fields.pending} pendingLabel={FEATURE_WORDS.saving}>
        <ButtonLink href={back} look="quiet">
          {FEATURE_WORDS.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
