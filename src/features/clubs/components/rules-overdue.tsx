'use client';

import { Checkbox } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { NumberInput } from '@/ui/text-inputs';
import { COUNT_WORDS, RULES_OVERDUE_WORDS } from '../words/rules-form';
import { useRulesFields } from './use-rules-fields';

/** Who is told when somebody is overdue, and when. */
export function RulesOverdue() {
  const field = useRulesFields();
  return (
    <Section title={RULES_OVERDUE_WORDS.overdue} note={RULES_OVERDUE_WORDS.overdueNote}>
      <div className="grid gap-5 sm:grid-cols-3">
        <NumberInput
          label={RULES_OVERDUE_WORDS.member}
          unit={COUNT_WORDS.minutes}
          step="1"
          {...field('overdueMember')}
        />
        <NumberInput
          label={RULES_OVERDUE_WORDS.officers}
          unit={COUNT_WORDS.minutes}
          step="1"
          {...field('overdueOfficers')}
        />
        <NumberInput
          label={RULES_OVERDUE_WORDS.contact}
          hint={RULES_OVERDUE_WORDS.contactHint}
          unit={COUNT_WORDS.minutes}
          step="1"
          {...field('overdueContact')}
        />
      </div>
      <Checkbox
        className="mt-5"
        label={RULES_OVERDUE_WORDS.showsPlace}
        hint={RULES_OVERDUE_WORDS.showsPlaceHint}
        {...field('overdueShowsPlace')}
      />
    </Section>
  );
}
