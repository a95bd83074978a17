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
import { KEPT_TOAST, useSendOrKeep } from '@/ui/offline/use-offline';
import { Textarea, TextInput, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { BUMP_FIELDS, COUNT_FIELDS, type LogForm, logFormSchema } from '../log-schema';
import type { SavedLog } from '../save-log';
import { CountField } from './count-field';
import { ShotFields } from './shot-fields';

const COUNT_LABELS = { antleredBucks: 'Antlered bucks', does: 'Does', fawns: 'Fawns', unknown: 'Unknown' };
const BUMP_LABELS = { bumpedIn: 'On the way in', bumpedSitting: 'From the seat', bumpedOut: 'On the way out' };

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
      sendOrKeep({ kind: 'log', club, label: `Log of ${day}`, values: typed, send: (all) => save(club, all) }),
    onDone: (saved) => {
      draft.drop();
      if (!saved) {
        toast(KEPT_TOAST);
        router.push(back);
        return;
      }
      toast({ title: `Log of ${saved.standName} saved` });
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
          <Notice
            title="Your unsaved counts are back"
            actions={<Button onClick={draft.startAfresh}>Start afresh</Button>}
          >
            They were typed in this tab before and not saved.
          </Notice>
        )}
        <FieldGroup label="Deer seen" hint="Every deer, every sit. Unknown when you are not sure. None counts too.">
          {COUNT_FIELDS.map((name) => (
            <CountField key={name} control={form.control} name={name} label={COUNT_LABELS[name]} big />
          ))}
        </FieldGroup>
        <div className="grid grid-cols-2 gap-4">
          <TimeInput label="From" {...register('startClock')} error={errorOf('startClock')} />
          <TimeInput label="To" {...register('endClock')} error={errorOf('endClock')} />
        </div>
        <FieldGroup
          label="Deer bumped"
          hint="That blew, ran or left because of you. It tells the club which stand to rest."
        >
          {BUMP_FIELDS.map((name) => (
            <CountField key={name} control={form.control} name={name} label={BUMP_LABELS[name]} />
          ))}
        </FieldGroup>
        {bumped && (
          <TextInput
            label="Where they were bumped"
            optional
            autoComplete="off"
            {...register('bumpedWhere')}
            error={errorOf('bumpedWhere')}
          />
        )}
        <ShotFields day={day} zone={zone} units={units} />
        <Textarea label="Notes" optional rows={3} {...register('notes')} error={errorOf('notes')} />
        <SubmitRow
          label="Save log"
          pending={pending}
          pendingLabel="Saving…"
          className="sticky bottom-[calc(3.6rem+env(safe-area-inset-bottom))] z-20 bg-paper py-3 md:static"
        >
          <ButtonLink href={back} look="quiet">
            Back without saving
          </ButtonLink>
        </SubmitRow>
      </form>
    </FormProvider>
  );
}
