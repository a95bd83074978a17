'use client';

import { NOTICE_KINDS, type NoticeKind, WIND_POINTS } from '@/core/notices/notice-kinds';
import type { ActionResult } from '@/server/doors';
import { CheckboxGroup } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Select, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type ChoicesForm, choicesSchema } from '../choices-schema';
import { CHOICES_FORM_WORDS, KIND_WORDS } from '../words/choices';

export interface ChoicesFormProps {
  club: string;
  values: ChoicesForm;
  /** Kinds of use to this member. */
  kinds: NoticeKind[];
  save: (club: string, values: ChoicesForm) => Promise<ActionResult<{ kinds: number }>>;
}

const words = CHOICES_FORM_WORDS;
const POINTS = WIND_POINTS.map((points) => ({ value: String(points), label: words.points(points) }));

export function ChoicesFormView({ club, values, kinds, save }: ChoicesFormProps) {
  const toast = useToast();
  const { register, errorOf, errors, pending, formProps } = useActionForm<ChoicesForm, { kinds: number }>({
    schema: choicesSchema,
    defaultValues: values,
    submit: (typed) => save(club, typed),
    onDone: () => toast({ title: words.kept }),
  });
  const offered = NOTICE_KINDS.filter((kind) => kinds.includes(kind));
  return (
    <form {...formProps} className="grid max-w-2xl gap-6">
      <FormErrorSummary errors={errors} />
      <CheckboxGroup
        label={words.kinds}
        stacked
        choices={offered.map((value) => ({ value, ...KIND_WORDS[value] }))}
        {...register('kinds')}
        error={errorOf('kinds')}
      />
      {kinds.includes('wind_turned') && (
        <Select
          label={words.windPoints}
          hint={words.windPointsHint}
          options={POINTS}
          className="max-w-48"
          {...register('windPoints')}
          error={errorOf('windPoints')}
        />
      )}
      <div className="grid gap-4 sm:grid-cols-2">
        <TimeInput label={words.quietFrom} {...register('quietFrom')} error={errorOf('quietFrom')} />
        <TimeInput label={words.quietTo} {...register('quietTo')} error={errorOf('quietTo')} />
      </div>
      <p className="text-ink-soft text-sm">{words.quietNote}</p>
      <SubmitRow label={words.save} pending={pending} pendingLabel={words.saving} />
    </form>
  );
}
