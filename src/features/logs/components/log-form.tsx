'use client';

import { useRouter } from 'next/navigation';
import { FormProvider, useWatch } from 'react-hook-form';
import type { ActionResult } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { FieldGroup } from '@/ui/field';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { useKeptDraft } from '@/ui/form/use-kept-draft';
import { Notice } from '@/ui/notices';
import { KEPT_TOAST, useSendOrKeep } from '@/ui/offline/use-send-or-keep';
import { Textarea, TextInput, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { BUMP_FIELDS, COUNT_FIELDS, type LogForm, logFormSchema } from '../log-schema';
import type { SavedLog } from '../save-log';
import { BUMP_WORDS, COUNT_WORDS, LOG_FORM_WORDS } from '../words/form';
import { CountField } from './count-field';
import { ShotFields } from './shot-fields';

const words = LOG_FORM_WORDS;

export interface LogFormProps {
  club: string;
  values: LogForm;
  day: string;
  zone: string;
  units: 'us' | 'metric';
  /** May write harvest sheets. */
  harvest: boolean;
  save: (club: string, values: LogForm) => Promise<ActionResult<SavedLog>>;
}

/** Filled in with the sit's hours and no deer: the counts and one press are enough. */
export function LogFormView({ club, values, day, zone, units, harvest, save }: LogFormProps) {
  const router = useRouter();
  const toast = useToast();
  const sendOrKeep = useSendOrKeep();
  const back = `/clubs/${club}/log`;
  const { form, register, errorOf, errors, pending, formProps } = useActionForm<LogForm, SavedLog | null>({
    schema: logFormSchema,
    defaultValues: values,
    submit: (typed) =>
      sendOrKeep({ kind: 'log', club, label: words.kept(day), values: typed, send: (all) => save(club, all) }),
    onDone: (saved) => {
      draft.drop();
      if (!saved) {
        toast(KEPT_TOAST);
        router.push(back);
        return;
      }
      toast({ title: words.saved(saved.standName) });
      router.push(saved.recovered && harvest ? `/clubs/${club}/season/harvest/new?sit=${saved.sitId}` : back);
    },
  });
  const draft = useKeptDraft(form, `log:${club}:${values.sitId}:${values.version}`);
  const bumped = useWatch({ control: form.control, name: BUMP_FIELDS }).some((count) => count > 0);
  return (
    <FormProvider {...form}>
      <form {...formProps} className="flex max-w-2xl flex-col gap-6">
        <FormErrorSummary errors={errors} />
        {draft.brought && (
          <Notice title={words.backTitle} actions={<Button onClick={draft.startAfresh}>{words.startAfresh}</Button>}>
            {words.backText}
          </Notice>
        )}
        <FieldGroup label={words.seen} hint={words.seenHint}>
          {COUNT_FIELDS.map((name) => (
            <CountField key={name} control={form.control} name={name} label={COUNT_WORDS[name]} big />
          ))}
        </FieldGroup>
        <div className="grid grid-cols-2 gap-4">
          <TimeInput label={words.from} {...register('startClock')} error={errorOf('startClock')} />
          <TimeInput label={words.to} {...register('endClock')} error={errorOf('endClock')} />
        </div>
        <FieldGroup label={words.bumped} hint={words.bumpedHint}>
          {BUMP_FIELDS.map((name) => (
            <CountField key={name} control={form.control} name={name} label={BUMP_WORDS[name]} />
          ))}
        </FieldGroup>
        {bumped && (
          <TextInput
            label={words.bumpedWhere}
            optional
            autoComplete="off"
            {...register('bumpedWhere')}
            error={errorOf('bumpedWhere')}
          />
        )}
        <ShotFields day={day} zone={zone} units={units} />
        <Textarea label={words.notes} optional rows={3} {...register('notes')} error={errorOf('notes')} />
        <SubmitRow
          label={words.save}
          pending={pending}
          pendingLabel={words.saving}
          className="sticky above-bar z-20 bg-paper py-3 md:static"
        >
          <ButtonLink href={back} look="quiet">
            {words.back}
          </ButtonLink>
        </SubmitRow>
      </form>
    </FormProvider>
  );
}
