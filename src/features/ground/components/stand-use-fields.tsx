'use client';

import { useWatch } from 'react-hook-form';
import { CheckboxGroup, RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { Select, Textarea, TextInput } from '@/ui/text-inputs';
import type { Hunter } from '../people-data';
import type { StandForm } from '../stand-schema';
import { SUITABILITY_WORDS } from '../words';
import { choicesOf } from './choices-of';
import type { Fields } from './form-types';

export function StandUseFields({ fields, restDaysDefault }: { fields: Fields<StandForm>; restDaysDefault: number }) {
  const { register, errorOf } = fields;
  const suitabilities = choicesOf(SUITABILITY_WORDS);
  return (
    <Section title="Use and rest" heading="margin">
      <div className="grid gap-4 sm:grid-cols-2">
        <Select label="Morning" options={suitabilities} error={errorOf('morning')} {...register('morning')} />
        <Select label="Evening" options={suitabilities} error={errorOf('evening')} {...register('evening')} />
        <TextInput
          label="Rest days after a sit"
          optional
          hint={`Left blank, the club's ${restDaysDefault}`}
          inputMode="numeric"
          error={errorOf('restDays')}
          {...register('restDays')}
        />
        <TextInput
          label="Most sits in a season"
          optional
          hint="Left blank, no limit"
          inputMode="numeric"
          error={errorOf('mostSitsSeason')}
          {...register('mostSitsSeason')}
        />
      </div>
    </Section>
  );
}

const WHO = [
  { value: 'everyone', label: 'Everyone who hunts in the club' },
  { value: 'named', label: 'Named members only' },
];

export function StandWhoFields({ fields, hunters }: { fields: Fields<StandForm>; hunters: Hunter[] }) {
  const { register, errorOf, form } = fields;
  const who = useWatch({ control: form.control, name: 'whoMayHunt' });
  return (
    <Section title="Who, and notes" heading="margin">
      <div className="flex flex-col gap-5">
        <RadioCards
          label="Who may hunt it"
          across
          choices={WHO}
          error={errorOf('whoMayHunt')}
          {...register('whoMayHunt')}
        />
        {who === 'named' && (
          <CheckboxGroup
            label="Members"
            choices={hunters.map(({ id, name, role }) => ({ value: id, label: name, note: role }))}
            error={errorOf('allowedMemberIds')}
            {...register('allowedMemberIds')}
          />
        )}
        <Textarea
          label="Notes"
          optional
          hint="What a person should know before going in: the climb, strap dates, phone signal."
          error={errorOf('notes')}
          {...register('notes')}
        />
      </div>
    </Section>
  );
}
