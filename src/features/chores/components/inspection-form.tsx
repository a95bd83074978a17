'use client';

import { useRouter } from 'next/navigation';
import { INSPECTION_RESULTS, itemsFor } from '@/core/upkeep/inspection';
import type { ActionResult } from '@/server/doors';
import { ButtonLink } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, Textarea, TextInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { type InspectionForm, inspectionSchema, RESULT_WORDS } from '../inspection-schema';
import type { SavedInspection } from '../save-inspection';
import { AnswerField } from './answer-field';

export interface InspectionFormProps {
  club: string;
  values: InspectionForm;
  save: (club: string, values: InspectionForm) => Promise<ActionResult<SavedInspection>>;
}

const RESULT_NOTES = {
  pass: 'Nothing to mend.',
  fix_first: 'A chore is made to mend it. The stand stays open: say in the notes what to mind.',
  closed: 'Shut at once. Members booked there are told by mail, and a chore is made.',
};
const RESULTS = INSPECTION_RESULTS.map((value) => ({ value, label: RESULT_WORDS[value], note: RESULT_NOTES[value] }));

function toldText({ told, chore }: SavedInspection): string {
  const mailed = told > 0 ? `${told} booked ${told === 1 ? 'sit' : 'sits'}: members told by mail. ` : '';
  return `${mailed}${chore ? 'A chore was made to mend it.' : ''}`.trim();
}

export function InspectionFormView({ club, values, save }: InspectionFormProps) {
  const router = useRouter();
  const toast = useToast();
  const back = `/clubs/${club}/chores/stands/${values.standId}`;
  const { register, errorOf, errors, pending, formProps } = useActionForm({
    schema: inspectionSchema,
    defaultValues: values,
    submit: (typed: InspectionForm) => save(club, typed),
    onDone: (saved) => {
      toast({ title: `${saved.standName} inspected`, text: toldText(saved) });
      router.push(back);
    },
  });
  const items = itemsFor(values.kind);
  return (
    <form {...formProps} className="grid max-w-3xl gap-6">
      <FormErrorSummary errors={errors} />
      <DateInput label="Day of the look" {...register('day')} error={errorOf('day')} />
      <div className="grid gap-5">
        {items.map((item) => (
          <AnswerField key={item} item={item} error={errorOf(`answers.${item}`)} {...register(`answers.${item}`)} />
        ))}
      </div>
      {items.includes('straps') && (
        <div className="grid gap-5 sm:grid-cols-2">
          <DateInput
            label="Main strap fitted on"
            optional
            {...register('strapFittedOn')}
            error={errorOf('strapFittedOn')}
          />
          <TextInput
            label="Maker's years"
            hint="As its instructions say. Blank: two years, which is usual practice and no standard."
            optional
            unit="y"
            inputMode="decimal"
            className="max-w-28"
            {...register('strapYears')}
            error={errorOf('strapYears')}
          />
        </div>
      )}
      <RadioCards label="Result" choices={RESULTS} {...register('result')} error={errorOf('result')} />
      <Textarea
        label="Notes"
        hint="What was found. Needed when the stand does not pass; its first line stands beside the closure."
        rows={3}
        {...register('notes')}
        error={errorOf('notes')}
      />
      <DateInput label="Next look due" {...register('nextDueOn')} error={errorOf('nextDueOn')} />
      <SubmitRow label="Save inspection" pending={pending} pendingLabel="Saving…">
        <ButtonLink href={back} look="quiet">
          Back without saving
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
