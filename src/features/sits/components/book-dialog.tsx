'use client';

import { useState } from 'react';
import { useFieldArray, useWatch } from 'react-hook-form';
import { formatDay } from '@/core/day-time';
import { type BookSitValues, bookSitSchema, type ChangeSitValues } from '@/features/bookings/sit-schema';
import { quotasQuery } from '@/features/harvest/queries';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { Dialog } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { queryClient, useRead } from '@/ui/query';
import { Select, Textarea } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { BookActions, Hunter } from '../book-actions';
import { sitsKey } from '../queries';
import { newRequestKey } from '../request-key';
import type { OpenRow, SitsView } from '../view-types';
import { clockText, WEAPON_LABELS, WINDOW_WORDS } from '../words';
import { GuestFields } from './guest-fields';

interface BookDialogProps {
  row: OpenRow;
  view: SitsView;
  actions: BookActions;
  hunters: Hunter[] | null;
  onClose: () => void;
}

/** Books a stand, or moves the reader's own sit to it. A refusal is shown with its rule, and the list is read again. */
export function BookDialog({ row, view, actions, hunters, onClose }: BookDialogProps) {
  const client = queryClient();
  const toast = useToast();
  const [requestKey] = useState(newRequestKey);
  const { club, window, mine } = view;
  const refresh = () => client.invalidateQueries({ queryKey: sitsKey(club.slug) });
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
      if (!answer.ok) await refresh();
      return answer;
    },
    onDone: async (saved) => {
      onClose();
      const text = `${saved.standName}, ${saved.whenText}`;
      toast(mine ? { title: 'Sit moved', text } : { title: 'Sit booked', text });
      await refresh();
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
      title={`${mine ? 'Move to' : 'Book'} ${row.name}`}
      description={`${formatDay(window.day, true)}, ${WINDOW_WORDS[window.window]}. ${row.sentence}.`}
    >
      <form {...formProps} className="grid gap-4">
        <FormErrorSummary errors={errors} />
        <RadioCards
          label="How long"
          across
          {...register('windows')}
          defaultValue={defaultValues.windows}
          error={errorOf('windows')}
          choices={[
            {
              value: window.window,
              label: `This ${WINDOW_WORDS[window.window]}`,
              note: `${clockText(window.startAt, club)} to ${clockText(window.endAt, club)}`,
            },
            { value: 'all_day', label: 'All day', note: 'Morning and evening' },
          ]}
        />
        {hunters && !mine && (
          <Select
            label="For"
            {...register('memberId', emptyIsNull)}
            error={errorOf('memberId')}
            options={[{ value: '', label: 'Myself' }, ...hunters.map(({ id, name }) => ({ value: id, label: name }))]}
          />
        )}
        <Select
          label="Weapon"
          {...register('weapon')}
          error={errorOf('weapon')}
          options={row.weapons.map((value) => ({ value, label: WEAPON_LABELS[value] }))}
        />
        <Select
          label="Way in"
          hint={
            row.way
              ? `Leave by ${clockText(row.way.leaveBy, club)}, in by ${clockText(row.way.inBy, club)} by ${row.way.name}.`
              : undefined
          }
          {...register('approachId', emptyIsNull)}
          error={errorOf('approachId')}
          options={[
            { value: '', label: 'Not said' },
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
        <Textarea label="Note" optional rows={2} {...register('note')} error={errorOf('note')} />
        {cautions.length > 0 && (
          <Notice level={cautions.some((caution) => caution.level === 'stop') ? 'stop' : 'caution'} title="Take care">
            <ul className="list-disc pl-5">
              {cautions.map((caution) => (
                <li key={caution.text}>{caution.text}</li>
              ))}
            </ul>
          </Notice>
        )}
        <SubmitRow
          label={mine ? 'Move my sit here' : 'Book this sit'}
          pending={pending}
          pendingLabel={mine ? 'Moving' : 'Booking'}
        >
          <Button look="quiet" onClick={onClose}>
            Not now
          </Button>
        </SubmitRow>
      </form>
    </Dialog>
  );
}

function changeValues(values: BookSitValues, mine: NonNullable<SitsView['mine']>): ChangeSitValues {
  const { memberId: _, requestKey: __, ...chosen } = values;
  return { ...chosen, sitId: mine.sitId, sequence: mine.sequence };
}
