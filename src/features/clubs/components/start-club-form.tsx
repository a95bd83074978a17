'use client';

import { useRouter } from 'next/navigation';
import { FormProvider } from 'react-hook-form';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { type CreateClubForm, createClubSchema } from '../club-schema';
import { START_CLUB_WORDS } from '../words/club';
import { PlaceFields } from './place-fields';

interface Props {
  zones: string[];
  action: (values: CreateClubForm) => Promise<ActionAnswer<{ slug: string }>>;
}

export function StartClubForm({ zones, action }: Props) {
  const router = useRouter();
  const { form, errors, pending, formProps } = useActionForm<CreateClubForm, { slug: string }>({
    schema: createClubSchema,
    defaultValues: { name: '', slug: '', lat: '', lon: '', zone: '', units: 'us' },
    submit: action,
    onDone: ({ slug }) => router.push(`/clubs/${slug}/club`),
  });
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex flex-col gap-6">
        <FormErrorSummary errors={errors} />
        <PlaceFields zones={zones} withSlug />
        <SubmitRow label={START_CLUB_WORDS.start} pending={pending} />
      </form>
    </FormProvider>
  );
}
