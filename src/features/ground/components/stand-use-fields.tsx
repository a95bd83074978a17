'use client';

import { useWatch } from 'react-hook-form';
import { CheckboxGroup, RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { Select, Textarea, TextInput } from '@/ui/text-inputs';
import type { Hunter } from '../people-data';
import type { StandForm } from '../stand-schema';
import { SUITABILITY_WORDS } from '../words/kinds';
import { STAND_USE_WORDS } from '../words/stand';
import { choicesOf } from './choices-of';
import type { Fields } from './form-types';

export function StandUseFields({ fields, restDaysDefault }: { fields: Fields<StandForm>; restDaysDefault: number }) {
  const { register, errorOf } = fields;
  const suitabilities = choicesOf(SUITABILITY_WORDS);
  return (
    <Section title={STAND_USE_WORDS.useAndRest} heading="margin">
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          label={STAND_USE_WORDS.morning}
          options={suitabilities}
          error={errorOf('morning')}
          {...register('morning')}
        />
        <Select
          label={STAND_USE_WORDS.evening}
          options={suitabilities}
          error={errorOf('evening')}
          {...register('evening')}
        />
        <TextInput
          label={STAND_USE_WORDS.restDays}
          optional
          hint={STAND_USE_WORDS.restDaysHint(restDaysDefault)}
          inputMode="numeric"
          error={errorOf('restDays')}
          {...register('restDays')}
        />
        <TextInput
          label={STAND_USE_WORDS.mostSitsSeason}
          optional
          hint={STAND_USE_WORDS.mostSitsSeasonHint}
          inputMode="numeric"
          error={errorOf('mostSitsSeason')}
          {...register('mostSitsSeason')}
        />
      </div>
    </Section>
  );
}

const WHO = [
  { value: 'everyone', label: STAND_USE_WORDS.everyone },
  { value: 'named', label: STAND_USE_WORDS.named },
];

export function StandWhoFields({ fields, hunters }: { fields: Fields<StandForm>; hunters: Hunter[] }) {
  const { register, errorOf, form } = fields;
  const who = useWatch({ control: form.control, name: 'whoMayHunt' });
  return (
    <Section title={STAND_USE_WORDS.whoAndNotes} heading="margin">
      <div className="flex flex-col gap-5">
        <RadioCards
          label={STAND_USE_WORDS.whoMayHunt}
          across
          choices={WHO}
          error={errorOf('whoMayHunt')}
          {...register('whoMayHunt')}
        />
        {who === 'named' && (
          <CheckboxGroup
            label={STAND_USE_WORDS.allowedMemberIds}
            choices={hunters.map(({ id, name, role }) => ({ value: id, label: name, note: role }))}
            error={errorOf('allowedMemberIds')}
            {...register('allowedMemberIds')}
          />
        )}
        <Textarea
          label={STAND_USE_WORDS.notes}
          optional
          hint={STAND_USE_WORDS.notesHint}
          error={errorOf('notes')}
          {...register('notes')}
        />
      </div>
    </Section>
  );
}
