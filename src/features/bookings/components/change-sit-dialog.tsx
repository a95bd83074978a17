'use client';

import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import type { ActionResult } from '@/server/doors';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { Dialog, DialogClose } from '@/ui/dialog';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { useActionForm } from '@/ui/form/use-action-form';
import { Notice } from '@/ui/notices';
import { queryClient } from '@/ui/query';
import { DateInput, Select, Textarea } from '@/ui/text-inputs';
import { useToast } from '@/ui/toast';
import type { SitOptions } from '../reads';
import { type ChangeSitValues, changeSitSchema } from '../sit-schema';
import type { SavedSit, SitView } from '../sit-view';
import { CHANGE_SIT_WORDS } from '../words/screens';
import { SIT_WINDOW_WORDS, SIT_WINDOWS } from '../words/sits';
import { GuestFields } from './guest-fields';

export type ChangeAction = (club: string, values: ChangeSitValues) => Promise<ActionResult<SavedSit>>;

/** What is said to whoever books on a day of a season. */
export interface SeasonTexts {
  fromDay: string;
  toDay: string;
  texts: string[];
}

interface ChangeSitProps {
  club: string;
  change: ChangeAction;
  sit: SitView;
  options: SitOptions;
  quotas: SeasonTexts[];
}

const WINDOW_CHOICES = SIT_WINDOWS.map((value) => ({ value, label: SIT_WINDOW_WORDS[value] }));

function ChangeSitForm({ club, change, sit, options, quotas, onDone }: ChangeSitProps & { onDone: () => void }) {
  const toast = useToast();
  const { form, register, errorOf, errors, pending, formProps } = useActionForm({
    schema: changeSitSchema,
    defaultValues: {
      sitId: sit.id,
      sequence: sit.sequence,
      standId: sit.standId,
      day: sit.day,
      windows: sit.windows,
      weapon: sit.weapon,
      approachId: sit.approachId ?? '',
      guests: sit.guests,
      note: sit.note,
    },
    submit: (values: ChangeSitValues) => change(club, values),
    onDone: async (saved: SavedSit) => {
      toast({ title: CHANGE_SIT_WORDS.done, text: `${saved.standName}, ${saved.whenText}, ${saved.timeText}.` });
      onDone();
      await queryClient().invalidateQueries();
    },
  });
  const [standId, guests, day] = useWatch({ control: form.control, name: ['standId', 'guests', 'day'] });
  const cautions = quotas.filter(({ fromDay, toDay }) => fromDay <= day && day <= toDay).flatMap(({ texts }) => texts);
  const stand = options.stands.find((one) => one.id === standId);
  const waysIn = options.waysIn.filter((way) => way.standId === standId);
  const most = Math.min(options.guestsAtOnce, stand ? stand.seats - 1 : options.guestsAtOnce);

  return (
    <form {...formProps} className="flex flex-col gap-4">
      <FormErrorSummary errors={errors} title={CHANGE_SIT_WORDS.failed} />
      <Select
        label={CHANGE_SIT_WORDS.standId}
        options={options.stands.map((one) => ({ value: one.id, label: one.name }))}
        error={errorOf('standId')}
        {...register('standId', { onChange: () => form.setValue('approachId', '') })}
      />
      <DateInput label={CHANGE_SIT_WORDS.day} required error={errorOf('day')} {...register('day')} />
      <RadioCards
        label={CHANGE_SIT_WORDS.windows}
        across
        choices={WINDOW_CHOICES}
        error={errorOf('windows')}
        {...register('windows')}
      />
      <Select
        label={CHANGE_SIT_WORDS.weapon}
        options={stand?.weapons ?? [{ value: sit.weapon, label: sit.weaponText }]}
        error={errorOf('weapon')}
        {...register('weapon')}
      />
      <Select
        label={CHANGE_SIT_WORDS.approachId}
        optional
        placeholder={CHANGE_SIT_WORDS.approachIdPlaceholder}
        options={waysIn.map((way) => ({ value: way.id, label: way.name }))}
        error={errorOf('approachId')}
        {...register('approachId')}
      />
      <GuestFields
        guests={guests ?? []}
        onChange={(list) => form.setValue('guests', list, { shouldDirty: true })}
        known={options.guests}
        most={Math.max(0, most)}
        errorOf={errorOf}
      />
      <Textarea
        label={CHANGE_SIT_WORDS.note}
        optional
        rows={2}
        maxLength={500}
        error={errorOf('note')}
        {...register('note')}
      />
      {cautions.length > 0 && (
        <Notice level="caution" title={CHANGE_SIT_WORDS.care}>
          <ul className="list-disc pl-5">
            {cautions.map((text) => (
              <li key={text}>{text}</li>
            ))}
          </ul>
        </Notice>
      )}
      <SubmitRow label={CHANGE_SIT_WORDS.save} pending={pending}>
        <DialogClose>
          <Button>{CHANGE_SIT_WORDS.keep}</Button>
        </DialogClose>
      </SubmitRow>
    </form>
  );
}

export function ChangeSitDialog(props: ChangeSitProps) {
  const [open, setOpen] = useState(false);
  const label = CHANGE_SIT_WORDS.changeLabel(props.sit.standName, props.sit.whenText);
  return (
    <Dialog
      title={CHANGE_SIT_WORDS.title}
      description={CHANGE_SIT_WORDS.description}
      trigger={<Button aria-label={label}>{CHANGE_SIT_WORDS.change}</Button>}
      open={open}
      onOpenChange={setOpen}
    >
      <ChangeSitForm {...props} onDone={() => setOpen(false)} />
    </Dialog>
  );
}
