'use client';

import { useRouter } from 'next/navigation';
import { useWatch } from 'react-hook-form';
import { INSPECTION_RESULTS, itemsFor } from '@/core/upkeep/inspection';
import type { ActionResult } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { Checkbox, RadioCards } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, Textarea, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type InspectionForm, inspectionSchema } from '../inspection-schema';
import type { SavedInspection } from '../save-inspection';
import type { ClosedBy } from '../upkeep-reads';
import { INSPECTION_FORM_WORDS, RESULT_NOTES, RESULT_WORDS } from '../words/inspections';
import { AnswerField } from './answer-field';

export interface InspectionFormProps {
  club: string;
  values: InspectionForm;
  /** What a pass may open again. */
  closedBy: ClosedBy | null;
  save: (club: string, values: InspectionForm) => Promise<ActionResult<SavedInspection>>;
}

const words = INSPECTION_FORM_WORDS;
const RESULTS = INSPECTION_RESULTS.map((value) => ({ value, label: RESULT_WORDS[value], note: RESULT_NOTES[value] }));

function toldText({ told, chore, opened }: SavedInspection): string {
  return [told > 0 && words.told(told), chore && words.chore, opened && words.opened].filter(Boolean).join(' ');
}

export function InspectionFormView({ club, values, closedBy, save }: InspectionFormProps) {
  const router = useRouter();
  const toast = useToast();
  const back = `/clubs/${club}/chores/stands/${values.standId}`;
  const { form, register, errorOf, errors, pending, formProps } = useActionForm({
    schema: inspectionSchema,
    defaultValues: values,
    submit: (typed: InspectionForm) => save(club, typed),
    onDone: (saved) => {
      toast({ title: words.saved(saved.standName), text: toldText(saved) });
      router.push(back);
    },
  });
  const items = itemsFor(values.kind);
  const result = useWatch({ control: form.control, name: 'result' });
  return (
    <form {...formProps} className="grid max-w-3xl gap-6">
      <FormErrorSummary errors={errors} />
      <DateInput label={words.day} {...register('day')} error={errorOf('day')} />
      <div className="grid gap-5">
        {items.map((item) => (
          <AnswerField key={item} item={item} error={errorOf(`answers.${item}`)} {...register(`answers.${item}`)} />
        ))}
      </div>
      {items.includes('straps') && (
        <div className="grid gap-5 sm:grid-cols-2">
          <DateInput label={words.strap} optional {...register('strapFittedOn')} error={errorOf('strapFittedOn')} />
          <TextInput
            label={words.years}
            hint={words.yearsHint}
            optional
            unit="y"
            inputMode="decimal"
            className="max-w-28"
            {...register('strapYears')}
            error={errorOf('strapYears')}
          />
        </div>
      )}
      <RadioCards label={words.result} choices={RESULTS} {...register('result')} error={errorOf('result')} />
      {closedBy && result === 'pass' && (
        <Checkbox
          label={words.reopen}
          hint={words.reopenHint(closedBy.dayText, closedBy.reason)}
          {...register('reopen')}
          error={errorOf('reopen')}
        />
      )}
      <Textarea label={words.notes} hint={words.notesHint} rows={3} {...register('notes')} error={errorOf('notes')} />
      <DateInput label={words.next} {...register('nextDueOn')} error={errorOf('nextDueOn')} />
      <SubmitRow label={words.save} pending={pending} pendingLabel={words.saving}>
        <ButtonLink href={back} look="quiet">
          {words.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
