'use client';

import { CALENDAR_PRIVACY, SIGHTINGS_SEEN_BY } from '@/core/booking/rules';
import { RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { PRIVACY_WORDS, SIGHTINGS_WORDS } from '../words/rules';
import { RULES_SHARING_WORDS } from '../words/rules-form';
import { StatedFields } from './stated-fields';
import { useRulesFields } from './use-rules-fields';

const SIGHTINGS_NOTES: Record<(typeof SIGHTINGS_SEEN_BY)[number], string> = {
  all: RULES_SHARING_WORDS.allNote,
  officers: RULES_SHARING_WORDS.officersNote,
  after_season: RULES_SHARING_WORDS.afterSeasonNote,
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
      <Section title={RULES_SHARING_WORDS.title}>
        <div className="flex flex-col gap-5">
          <RadioCards label={RULES_SHARING_WORDS.sightings} choices={SIGHTINGS} {...field('sightingsSeenBy')} />
          <RadioCards label={RULES_SHARING_WORDS.calendar} choices={PRIVACY} {...field('calendarPrivacy')} />
        </div>
      </Section>
      <Section title={RULES_SHARING_WORDS.orange} note={RULES_SHARING_WORDS.orangeNote}>
        <StatedFields
          field={field}
          paths={{ text: 'orangeText', source: 'orangeSource', statedOn: 'orangeStatedOn' }}
          rows={3}
        />
      </Section>
    </>
  );
}
