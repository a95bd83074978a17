'use client';

import { NOTICE_KINDS, type NoticeKind, WIND_POINTS } from '@/core/notices/notice-kinds';
import type { ActionResult } from '@/server/doors';
import { CheckboxGroup } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Select, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type ChoicesForm, choicesSchema, KIND_WORDS } from '../choices-schema';

export interface ChoicesFormProps {
  club: string;
  values: ChoicesForm;
  /** Kinds of use to this member. */
  kinds: NoticeKind[];
  save: (club: string, values: ChoicesForm) => Promise<ActionResult<{ kinds: number }>>;
}

const POINTS = WIND_POINTS.map((points) => ({ value: String(points), label: `${points} points` }));

export function ChoicesFormView({ club, values, kinds, save }: ChoicesFormProps) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm<ChoicesForm, { kinds: number }>({
    schema: choicesSchema,
    defaultValues: values,
    submit: (typed) => save(club, typed),
    onDone: () => toast({ title: 'Your choice is kept' }),
  });
  const offered = NOTICE_KINDS.filter((kind) => kinds.includes(kind));
  return (
    <form {...formProps} className="grid max-w-2xl gap-6">
      <FormErrorSummary errors={errors} />
      <CheckboxGroup
        label="Mail me when"
        choices={offered.map((value) => ({ value, ...KIND_WORDS[value] }))}
        {...register('kinds')}
        error={errorOf('kinds')}
      />
      {kinds.includes('wind_turned') && (
        <Select
          label="The wind counts as turned when quiet falls by"
          hint="Or when the wind leaves the stand's good winds, however little quiet falls."
          options={POINTS}
          className="max-w-48"
          {...register('windPoints')}
          error={errorOf('windPoints')}
        />
      )}
      <div className="grid gap-4 sm:grid-cols-2">
        <TimeInput label="Nothing after" {...register('quietFrom')} error={errorOf('quietFrom')} />
        <TimeInput label="And not before" {...register('quietTo')} error={errorOf('quietTo')} />
      </div>
      <p className="text-ink-soft text-sm">
        What falls in these hours waits until they end. A wind that turns comes two hours before the sit at the latest.
        The same time twice: no quiet hours.
      </p>
      <SubmitRow label="Save" pending={pending} pendingLabel="Saving…" />
    </form>
  );
}
