'use client';

import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { useKeptDraft } from '@/ui/form/use-kept-draft';
import { useToast } from '@/ui/toast';
import type { FormClub } from '../form-club';
import type { Hunter } from '../people-data';
import { makeStandSchema, type StandForm } from '../stand-schema';
import { STAND_WORDS } from '../words/stand';
import { DraftNotice } from './draft-notice';
import type { ClubCall, Saved } from './form-types';
import { StandPlaceFields, StandSeatFields } from './stand-place-fields';
import { StandUseFields, StandWhoFields } from './stand-use-fields';
import { StandAirFields, StandWindFields } from './stand-wind-fields';

export interface StandFormProps {
  club: string;
  formClub: FormClub;
  restDaysDefault: number;
  hunters: Hunter[];
  values: StandForm;
  /** null: a new stand. */
  at: { id: string; version: number } | null;
  add: ClubCall<StandForm, Saved>;
  change: ClubCall<StandForm & { id: string; version: number }, Saved>;
}

export function StandFormView(props: StandFormProps) {
  const { club, formClub, restDaysDefault, hunters, values, at, add, change } = props;
  const router = useRouter();
  const toast = useToast();
  const schema = useMemo(() => makeStandSchema(formClub), [formClub]);
  const back = at ? `/clubs/${club}/stands/${at.id}` : `/clubs/${club}/stands`;
  const fields = useActionForm<StandForm, Saved>({
    schema,
    defaultValues: values,
    submit: (typed) => (at ? change(club, { ...typed, ...at }) : add(club, typed)),
    onDone: (saved) => {
      draft.drop();
      toast({ title: STAND_WORDS.saved(saved.name) });
      router.push(`/clubs/${club}/stands/${saved.id}`);
    },
  });
  const draft = useKeptDraft(fields.form, `stand:${club}:${at ? `${at.id}:${at.version}` : 'new'}`);

  return (
    <form {...fields.formProps} className="flex flex-col gap-2">
      <DraftNotice brought={draft.brought} onStartAfresh={draft.startAfresh} />
      <FormErrorSummary errors={fields.errors} />
      <StandPlaceFields fields={fields} />
      <StandSeatFields fields={fields} units={formClub.units} />
      <StandWindFields fields={fields} />
      <StandUseFields fields={fields} restDaysDefault={restDaysDefault} />
      <StandAirFields fields={fields} club={club} units={formClub.units} />
      <StandWhoFields fields={fields} hunters={hunters} />
      <SubmitRow label={STAND_WORDS.save} pending={fields.pending} pendingLabel={STAND_WORDS.saving} className="mt-6">
        <ButtonLink href={back} look="quiet">
          {STAND_WORDS.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
