'use client';

import { CALENDAR_PRIVACY, SIGHTINGS_SEEN_BY } from '@/core/booking/rules';
import { RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { DateInput, Textarea, TextInput } from '@/ui/text-inputs';
import { PRIVACY_WORDS, SIGHTINGS_WORDS } from '../rules-words';
import { useRulesFields } from './use-rules-fields';

const SIGHTINGS_NOTES: Record<(typeof SIGHTINGS_SEEN_BY)[number], string> = {
  all: 'Counts stand in the tables as soon as they are written.',
  officers: 'A member sees their own.',
  after_season: 'Until the last season of the year is over each sees their own; officers see only that a log exists.',
};
const SIGHTINGS = SIGHTINGS_SEEN_BY.map((value) => ({
  value,
  label: SIGHTINGS_WORDS[value],
  note: SIGHTINGS_NOTES[value],
}));
const PRIVACY = CALENDAR_PRIVACY.map((value) => ({ value, label: PRIVACY_WORDS[value] }));

export function RulesSharing() {
  const field = useRulesFields();
  return (
    <>
      <Section title="Who sees what">
        <div className="flex flex-col gap-5">
          <RadioCards label="Sightings are seen by" choices={SIGHTINGS} {...field('sightingsSeenBy')} />
          <RadioCards label="The club's calendar shows" choices={PRIVACY} {...field('calendarPrivacy')} />
        </div>
      </Section>
      <Section
        title="Orange"
        note="What the club asks its hunters to wear, with where it is written. Shown as a caution; state law decides. Leave all three blank for none."
      >
        <div className="flex flex-col gap-5">
          <Textarea label="The rule" optional rows={3} {...field('orangeText')} />
          <TextInput label="Source" optional {...field('orangeSource')} />
          <DateInput label="Stated on" optional {...field('orangeStatedOn')} />
        </div>
      </Section>
    </>
  );
}
