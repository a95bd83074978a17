'use client';

import { WEAPONS } from '@/core/ground-types';
import { WEAPON_WORDS } from '@/features/ground/words/kinds';
import { DateInput, Select, Textarea, TextInput, TimeInput } from '@/ui/text-inputs';
import type { HarvestFormChoices } from '../sheet-reads';
import { TAKEN_FORM_WORDS } from '../words/sheet';
import { useHarvestFields } from './use-harvest-fields';

const words = TAKEN_FORM_WORDS;
const WEAPON_OPTIONS = WEAPONS.map((value) => ({ value, label: WEAPON_WORDS[value] }));

/** Who took it, when, where and with what. */
export function TakenFields({ choices }: { choices: HarvestFormChoices }) {
  const field = useHarvestFields();
  return (
    <>
      <Select label={words.hunter} hint={words.hunterHint} options={choices.hunters} {...field('hunterId')} />
      <TextInput label={words.guest} hint={words.guestHint} optional autoComplete="off" {...field('guestName')} />
      <div className="grid grid-cols-2 gap-4">
        <DateInput label={words.day} {...field('day')} />
        <TimeInput label={words.time} {...field('clock')} />
      </div>
      <Select label={words.weapon} options={WEAPON_OPTIONS} {...field('weapon')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          label={words.stand}
          options={[{ value: '', label: words.noStand }, ...choices.stands]}
          {...field('standId')}
        />
        <TextInput label={words.place} optional autoComplete="off" {...field('place')} />
      </div>
      <Textarea label={words.notes} optional rows={3} {...field('notes')} />
    </>
  );
}
