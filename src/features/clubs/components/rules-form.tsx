'use client';

import { useRouter } from 'next/navigation';
import { FormProvider } from 'react-hook-form';
import type { Units } from '@/core/units';
import { Button, ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { type ActionAnswer, useActionForm } from '@/ui/form/use-action-form';
import { useKeptDraft } from '@/ui/form/use-kept-draft';
import { Notice } from '@/ui/notices';
import { useToast } from '@/ui/toast';
import { makeRulesSchema, type RulesForm as RulesValues } from '../rules-form-schema';
import type { SavedClub } from '../save-club';
import { RULES_WORDS } from '../words/rules-form';
import { RulesBooking } from './rules-booking';
import { RulesDistances } from './rules-distances';
import { RulesHarvest } from './rules-harvest';
import { RulesHours } from './rules-hours';
import { RulesLegalLight } from './rules-legal-light';
import { RulesSeasons } from './rules-seasons';
import { RulesSharing } from './rules-sharing';
import { RulesWork } from './rules-work';

interface Props {
  club: string;
  units: Units;
  rules: RulesValues;
  action: (club: string, values: RulesValues) => Promise<ActionAnswer<SavedClub>>;
}

const SCHEMAS = { us: makeRulesSchema('us'), metric: makeRulesSchema('metric') };

export function RulesForm({ club, units, rules, action }: Props) {
  const router = useRouter();
  const toast = useToast();
  const page = `/clubs/${club}/club/rules`;
  const { form, errors, pending, formProps } = useActionForm<RulesValues, SavedClub>({
    schema: SCHEMAS[units],
    defaultValues: rules,
    submit: (values) => action(club, values),
    onDone: ({ changed }) => {
      draft.drop();
      toast({ title: changed.length === 0 ? RULES_WORDS.nothing : RULES_WORDS.saved(changed.join(', ')) });
      router.push(page);
    },
  });
  const draft = useKeptDraft(form, `rules:${club}:${rules.version}`);
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex flex-col gap-2">
        <FormErrorSummary errors={errors} />
        {draft.brought && (
          <Notice
            title={RULES_WORDS.draftTitle}
            actions={<Button onClick={draft.startAfresh}>{RULES_WORDS.draftDrop}</Button>}
          >
            {RULES_WORDS.draftText}
          </Notice>
        )}
        <RulesLegalLight />
        <RulesHours />
        <RulesSeasons />
        <RulesBooking />
        <RulesDistances units={units} />
        <RulesSharing />
        <RulesHarvest />
        <RulesWork />
        <SubmitRow label={RULES_WORDS.save} pending={pending} pendingLabel={RULES_WORDS.saving} className="mt-8">
          <ButtonLink href={page} look="quiet">
            {RULES_WORDS.back}
          </ButtonLink>
        </SubmitRow>
      </form>
    </FormProvider>
  );
}
