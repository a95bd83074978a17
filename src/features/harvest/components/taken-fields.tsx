'use client';

import { WEAPONS } from '@/core/types';
import { WEAPON_WORDS } from '@/features/ground/words';
import { DateInput, Select, Textarea, TextInput, TimeInput } from '@/ui/text-inputs';
import type { HarvestFormChoices } from '../sheet-reads';
import { useHarvestFields } from './use-harvest-fields';

const WEAPON_OPTIONS = WEAPONS.map((value) => ({ value, label: WEAPON_WORDS[value] }));

/** Who took it, when, where and with what. */
export function TakenFields({ choices }: { choices: HarvestFormChoices }) {
  const field = useHarvestFields();
  return (
    <>
      <Select
        label="Taken by"
        hint="A guest's deer counts on the member who answers for them."
        options={choices.hunters}
        {...field('hunterId')}
      />
      <TextInput
        label="Guest without an account"
        hint="The guest's name, if it was their deer. It counts on the member above."
        optional
        autoComplete="off"
        {...field('guestName')}
      />
      <div className="grid grid-cols-2 gap-4">
        <DateInput label="Day" {...field('day')} />
        <TimeInput label="Time" {...field('clock')} />
      </div>
      <Select label="Weapon" options={WEAPON_OPTIONS} {...field('weapon')} />
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          label="Stand"
          options={[{ value: '', label: 'Not from a stand' }, ...choices.stands]}
          {...field('standId')}
        />
        <TextInput label="Place in words" optional autoComplete="off" {...field('place')} />
      </div>
      <Textarea label="Notes" optional rows={3} {...field('notes')} />
    </>
  );
}
