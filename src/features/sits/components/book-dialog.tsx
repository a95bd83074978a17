'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { formatDay } from '@/core/day-time';
import { type BookSitValues, bookSitSchema, type ChangeSitValues } from '@/features/bookings/sit-schema';
import { quotasQuery } from '@/features/harvest/queries';
import { newRequestKey } from '@/lib/request-key';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import type { Closes } from '@/ui/lazy-part';
import { Notice } from '@/ui/notices';
import { queryClient, useRead } from '@/ui/query';
import { Select, Textarea } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { BookActions, Hunter } from '../book-actions';
import { sitsKey } from '../queries';
import type { RowBrief, SitsBrief } from '../view-types';
import { BOOK_FORM_WORDS as WORDS } from '../words/book';
import { windowTitle } from '../words/list';
import { WEAPON_LABELS, WINDOW_WORDS } from '../words/names';
import { clockText } from '../words/terms';
import { GuestFields } from './guest-fields';

export interface BookDialogProps {
  row: RowBrief;
  view: SitsBrief;
  actions: BookActions;
  hunters: Hunter[] | null;
}

/** Books a stand, or moves the reader's own sit to it. A refusal is shown with its rule, and the list is read again. */
export function BookDialog({ row, view, actions, hunters, onClose }: BookDialogProps & Closes) {
  const router = useRouter();
  const toast = useToast();
  const [requestKey] = useState(newRequestKey);
  const { club, window, mine } = view;
  const defaultValues: BookSitValues = {
    standId: row.standId,
    day: window.day,
    windows: mine?.windows ?? window.window,
    weapon: row.weapons.find((one) => one === (mine?.weapon ?? view.weapon)) ?? row.weapons[0] ?? 'bow',
    approachId: row.way?.approachId ?? null,
    guests: mine?.guests ?? [],
    note: mine?.note ?? '',
    memberId: null,
    requestKey,
  };
  const { form, register, errorOf, errors, pending, formProps } = useActionForm({
    schema: bookSitSchema,
    defaultValues,
    submit: async (values) => {
      const answer = mine
        ? await actions.change(club.slug, changeValues(values, mine))
        : await actions.book(club.slug, values);
      if (!answer.ok) router.refresh();
      return answer;
    },
    onDone: async (saved) => {
      onClose();
      toast({ title: mine ? WORDS.moved : WORDS.booked, text: WORDS.saved(saved.standName, saved.whenText) });
      // The list comes with the answer; opened rows are read anew.
      await queryClient().invalidateQueries({ queryKey: sitsKey(club.slug) });
    },
  });
  const guests = useFieldArray({ control: form.control, name: 'guests' });
  const forId = useWatch({ control: form.control, name: 'memberId' });
  const quotas = useRead({ ...quotasQuery(club.slug, { day: window.day, member: forId ?? '' }), enabled: !!forId });
  // The list was read for the reader: of another their own quotas count.
  const head = forId
    ? [...(quotas.data ?? []), ...view.cautions.filter(({ code }) => code !== 'quota_met')]
    : view.cautions;
  const cautions = [...head, ...row.cautions];
  const emptyIsNull = { setValueAs: (value: unknown) => value || null };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={mine ? WORDS.moveTo(row.name) : WORDS.book(row.name)}
      description={WORDS.about(windowTitle(formatDay(window.day, true), window.window), row.sentence)}
    >
      <form {...formProps} className="grid gap-4">
        <FormErrorSummary errors={errors} />
        <RadioCards
          label={WORDS.howLong}
          across
          {...register('windows')}
          defaultValue={defaultValues.windows}
          error={errorOf('windows')}
          choices={[
            {
              value: window.window,
              label: WORDS.thisWindow(WINDOW_WORDS[window.window]),
              note: WORDS.span(clockText(window.startAt, club), clockText(window.endAt, club)),
            },
            { value: 'all_day', label: WORDS.allDay, note: WORDS.allDayNote },
          ]}
        />
        {hunters && !mine && (
          <Select
            label={WORDS.forWhom}
            {...register('memberId', emptyIsNull)}
            error={errorOf('memberId')}
            options={[
              { value: '', label: WORDS.myself },
              ...hunters.map(({ id, name }) => ({ value: id, label: name })),
            ]}
          />
        )}
        <Select
          label={WORDS.weapon}
          {...register('weapon')}
          error={errorOf('weapon')}
          options={row.weapons.map((value) => ({ value, label: WEAPON_LABELS[value] }))}
        />
        <Select
          label={WORDS.wayIn}
          hint={
            row.way
              ? WORDS.wayHint(clockText(row.way.leaveBy, club), clockText(row.way.inBy, club), row.way.name)
              : undefined
          }
          {...register('approachId', emptyIsNull)}
          error={errorOf('approachId')}
          options={[
            { value: '', label: WORDS.notSaid },
            ...row.waysIn.map(({ id, name }) => ({ value: id, label: name })),
          ]}
        />
        <GuestFields
          fields={guests.fields}
          onAdd={() => guests.append({ name: '', memberId: null })}
          onRemove={guests.remove}
          nameOf={(index) => register(`guests.${index}.name`)}
          errorOf={(index) => errorOf(`guests.${index}.name`)}
          error={errorOf('guests')}
        />
        <Textarea label={WORDS.note} optional rows={2} {...register('note')} error={errorOf('note')} />
        {cautions.length > 0 && (
          <Notice level={cautions.some((caution) => caution.level === 'stop') ? 'stop' : 'caution'} title={WORDS.care}>
            <ul className="list-disc pl-5">
              {cautions.map((caution) => (
                <li key={caution.text}>{caution.text}</li>
              ))}
            </ul>
          </Notice>
        )}
        <SubmitRow
          label={mine ? WORDS.moveSit : WORDS.bookSit}
          pending={pending}
          pendingLabel={mine ? WORDS.moving : WORDS.booking}
        >
          <Button look="quiet" onClick={onClose}>
            {WORDS.notNow}
          </Button>
        </SubmitRow>
      </form>
    </Dialog>
  );
}

function changeValues(values: BookSitValues, mine: NonNullable<SitsBrief['mine']>): ChangeSitValues {
  const { memberId: _, requestKey: __, ...chosen } = values;
  return { ...chosen, sitId: mine.sitId, sequence: mine.sequence };
}
