'use client';

import { useRouter } from 'next/navigation';
import { useMemo } from 'react';
import { FormProvider } from 'react-hook-form';
import type { ActionResult } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { useKeptDraft } from '@/ui/form/use-kept-draft';
import { Notice } from '@/ui/notices';
import { useToast } from '@/ui/toast';
import { type HarvestForm, makeHarvestSchema } from '../harvest-schema';
import type { SavedHarvest } from '../save-harvest';
import type { HarvestFormChoices } from '../sheet-reads';
import { HARVEST_FORM_WORDS } from '../words/sheet';
import { DeerFields } from './deer-fields';
import { TakenFields } from './taken-fields';

const words = HARVEST_FORM_WORDS;

export interface HarvestFormProps {
  club: string;
  values: HarvestForm;
  choices: HarvestFormChoices;
  /** null: a new sheet. */
  at: { id: string; version: number } | null;
  add: (club: string, values: HarvestForm) => Promise<ActionResult<SavedHarvest>>;
  change: (club: string, values: HarvestForm & { id: string; version: number }) => Promise<ActionResult<SavedHarvest>>;
}

export function HarvestFormView({ club, values, choices, at, add, change }: HarvestFormProps) {
  const router = useRouter();
  const toast = useToast();
  const back = `/clubs/${club}/season/harvest`;
  const schema = useMemo(() => makeHarvestSchema(choices.units), [choices.units]);
  const { form, errors, pending, formProps } = useActionForm<HarvestForm, SavedHarvest>({
    schema,
    defaultValues: values,
    submit: (typed) => (at ? change(club, { ...typed, ...at }) : add(club, typed)),
    onDone: (saved) => {
      draft.drop();
      toast({ title: words.saved, text: saved.name });
      if (saved.met.length > 0) toast({ title: words.met, text: saved.met.join(' '), level: 'caution' });
      router.push(back);
    },
  });
  const draft = useKeptDraft(form, `harvest:${club}:${at ? `${at.id}:${at.version}` : `new:${values.sitId}`}`);
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex max-w-2xl flex-col gap-5">
        <FormErrorSummary errors={errors} />
        {draft.brought && (
          <Notice title={words.backTitle} actions={<Button onClick={draft.startAfresh}>{words.startAfresh}</Button>}>
            {words.backText}
          </Notice>
        )}
        <DeerFields units={choices.units} />
        <TakenFields choices={choices} />
        <SubmitRow label={words.save} pending={pending} pendingLabel={words.saving}>
          <ButtonLink href={back} look="quiet">
            {words.back}
          </ButtonLink>
        </SubmitRow>
      </form>
    </FormProvider>
  );
}
