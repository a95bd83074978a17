'use client';

import { useRouter } from 'next/navigation';
import { useFieldArray } from 'react-hook-form';
import { DEFAULT_POINT_RULES } from '@/core/draw/points';
import { SIT_WINDOWS } from '@/features/bookings/words/sits';
import type { ActionResult } from '@/server/doors';
import { Button, ButtonLink } from '@/ui/button';
import { Checkbox, CheckboxGroup } from '@/ui/choices';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { DateInput, NumberInput, Select, Textarea, TimeInput } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import { MOST_SLOTS, type OpenDrawValues, openDrawSchema } from '../draw-schema';
import { OPEN_DRAW_FORM_WORDS as WORDS } from '../words/forms';

export interface OpenDrawFormProps {
  club: string;
  stands: { value: string; label: string }[];
  open: (club: string, values: OpenDrawValues) => Promise<ActionResult<{ id: string }>>;
}

const WINDOWS = SIT_WINDOWS.map((value) => ({ value, label: WORDS.windows[value] }));

export function OpenDrawForm({ club, stands, open }: OpenDrawFormProps) {
  const router = useRouter();
  const toast = useToast();
  const { form, register, errorOf, errors, pending, formProps } = useActionForm<OpenDrawValues, { id: string }>({
    schema: openDrawSchema,
    defaultValues: {
      slots: [{ day: '', windows: 'morning' }],
      standIds: stands.map((stand) => stand.value),
      closesDay: '',
      closesClock: '17:00',
      pointsPerMiss: DEFAULT_POINT_RULES.pointsPerMiss,
      resetOnGiven: DEFAULT_POINT_RULES.resetOnGiven,
      workHoursPerPoint: DEFAULT_POINT_RULES.workHoursPerPoint ?? 0,
      note: '',
    },
    submit: (typed) => open(club, typed),
    onDone: ({ id }) => {
      toast({ title: WORDS.opened });
      router.push(`/clubs/${club}/draws/${id}`);
    },
  });
  const slots = useFieldArray({ control: form.control, name: 'slots' });
  const several = slots.fields.length > 1;
  const addSlot = () => {
    const last = form.getValues('slots').at(-1);
    const windows = last?.windows === 'morning' ? 'evening' : 'morning';
    slots.append({ day: last?.day ?? '', windows });
  };
  return (
    <form {...formProps} className="grid max-w-2xl gap-5">
      <FormErrorSummary errors={errors} />
      <div className="grid gap-3">
        {slots.fields.map((field, at) => (
          <div key={field.id} className="grid items-start gap-x-4 gap-y-2 sm:grid-cols-[1fr_1fr_auto]">
            <DateInput
              label={several ? WORDS.dayOf(at + 1) : WORDS.day}
              {...register(`slots.${at}.day`)}
              error={errorOf(`slots.${at}.day`)}
            />
            <Select
              label={several ? WORDS.windowOf(at + 1) : WORDS.window}
              options={WINDOWS}
              {...register(`slots.${at}.windows`)}
              error={errorOf(`slots.${at}.windows`)}
            />
            {several && (
              <div className="sm:pt-7">
                <Button look="quiet" aria-label={WORDS.removeSlotAbout(at + 1)} onClick={() => slots.remove(at)}>
                  {WORDS.removeSlot}
                </Button>
              </div>
            )}
          </div>
        ))}
        {slots.fields.length < MOST_SLOTS && (
          <div>
            <Button onClick={addSlot}>{WORDS.addSlot}</Button>
            <p className="mt-1 text-ink-soft text-sm">{WORDS.addHint}</p>
          </div>
        )}
      </div>
      <div className="grid gap-4 sm:grid-cols-2">
        <DateInput label={WORDS.closesDay} {...register('closesDay')} error={errorOf('closesDay')} />
        <TimeInput label={WORDS.closesClock} {...register('closesClock')} error={errorOf('closesClock')} />
      </div>
      <CheckboxGroup label={WORDS.stands} choices={stands} {...register('standIds')} error={errorOf('standIds')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <NumberInput label={WORDS.missPoints} {...register('pointsPerMiss')} error={errorOf('pointsPerMiss')} />
        <NumberInput
          label={WORDS.workHours}
          hint={WORDS.workHoursHint}
          unit={WORDS.workHoursUnit}
          {...register('workHoursPerPoint')}
          error={errorOf('workHoursPerPoint')}
        />
      </div>
      <Checkbox label={WORDS.reset} {...register('resetOnGiven')} />
      <Textarea label={WORDS.note} optional rows={2} {...register('note')} error={errorOf('note')} />
      <SubmitRow label={WORDS.submit} pending={pending} pendingLabel={WORDS.pending}>
        <ButtonLink href={`/clubs/${club}/draws`} look="quiet">
          {WORDS.back}
        </ButtonLink>
      </SubmitRow>
    </form>
  );
}
