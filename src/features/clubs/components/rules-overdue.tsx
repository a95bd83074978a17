'use client';

import { Checkbox } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { NumberInput } from '@/ui/text-inputs';
import { useRulesFields } from './use-rules-fields';

/** Who is told when somebody is overdue, and when. */
export function RulesOverdue() {
  const field = useRulesFields();
  return (
    <Section title="Overdue" note="Minutes after a person counts as overdue. Each is told once by e-mail.">
      <div className="grid gap-5 sm:grid-cols-3">
        <NumberInput label="Tell the member" unit="minutes" step="1" {...field('overdueMember')} />
        <NumberInput label="Tell the officers" unit="minutes" step="1" {...field('overdueOfficers')} />
        <NumberInput
          label="Tell the safety contact"
          hint="Only one who has said yes."
          unit="minutes"
          step="1"
          {...field('overdueContact')}
        />
      </div>
      <Checkbox
        className="mt-5"
        label="The safety contact's page shows the stand's position"
        hint="Off: it names stand, way in and parking only."
        {...field('overdueShowsPlace')}
      />
    </Section>
  );
}
