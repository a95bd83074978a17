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
import { DeerFields } from './deer-fields';
import { TakenFields } from './taken-fields';

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
      toast({ title: 'Harvest sheet saved', text: saved.name });
      if (saved.met.length > 0) toast({ title: 'A quota is met', text: saved.met.join(' '), level: 'caution' });
      router.push(back);
    },
  });
  const draft = useKeptDraft(form, `harvest:${club}:${at ? `${at.id}:${at.version}` : `new:${values.sitId}`}`);
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex max-w-2xl flex-col gap-5">
        <FormErrorSummary errors={errors} />
        {draft.brought && (
          <Notice
            title="Your unsaved sheet is back"
            actions={<Button onClick={draft.startAfresh}>Start afresh</Button>}
          >
            It was typed in this tab before and not saved.
          </Notice>
        )}
        <DeerFields units={choices.units} />
        <TakenFields choices={choices} />
        <SubmitRow label="Save sheet" pending={pending} pendingLabel="Saving…">
          <ButtonLink href={back} look="quiet">
            Back without saving
          </ButtonLink>
        </SubmitRow>
      </form>
    </FormProvider>
  );
}
