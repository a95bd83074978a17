'use client';

import { useRouter } from 'next/navigation';
import { FormProvider } from 'react-hook-form';
import { ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { useToast } from '@/ui/toast';
import { type ChangePlaceForm, changePlaceSchema } from '../club-schema';
import type { SavedClub } from '../save-club';
import { PLACE_WORDS } from '../words/club';
import { PlaceFields } from './place-fields';

interface Props {
  club: string;
  place: ChangePlaceForm;
  zones: string[];
  action: (club: string, values: ChangePlaceForm) => Promise<ActionAnswer<SavedClub>>;
}

export function PlaceForm({ club, place, zones, action }: Props) {
  const router = useRouter();
  const toast = useToast();
  const page = `/clubs/${club}/club`;
  const { form, errors, pending, formProps } = useActionForm<ChangePlaceForm, SavedClub>({
    schema: changePlaceSchema,
    defaultValues: place,
    submit: (values) => action(club, values),
    onDone: ({ changed }) => {
      toast({ title: changed.length === 0 ? PLACE_WORDS.nothing : PLACE_WORDS.saved(changed.join(', ')) });
      router.push(page);
    },
  });
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex flex-col gap-6">
        <FormErrorSummary errors={errors} />
        <PlaceFields zones={zones} />
        <SubmitRow label={PLACE_WORDS.save} pending={pending} pendingLabel={PLACE_WORDS.saving}>
          <ButtonLink href={page} look="quiet">
            {PLACE_WORDS.back}
          </ButtonLink>
        </SubmitRow>
      </form>
    </FormProvider>
  );
}
