'use client';

import { useFormContext } from 'react-hook-form';
import { Checkbox, RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { NumberInput } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
import { RulesOverdue } from './rules-overdue';
import { useRulesFields } from './use-rules-fields';

const AHEAD = [
  { value: 'days', label: 'By days', note: 'A sit may be booked so many days before.' },
  { value: 'hunt_time', label: 'Only at hunt time', note: 'Within so many hours of the start, one stand at a time.' },
];

export function RulesBooking() {
  const { watch } = useFormContext<RulesForm>();
  const field = useRulesFields();
  return (
    <>
      <Section title="Booking">
        <div className="flex flex-col gap-5">
          <RadioCards label="How far ahead" across choices={AHEAD} {...field('claimAhead')} />
          {watch('claimAhead') === 'days' ? (
            <NumberInput label="Days ahead" unit="days" step="1" {...field('claimDays')} />
          ) : (
            <NumberInput label="Hours before the window" unit="hours" step="1" {...field('claimHours')} />
          )}
          <NumberInput
            label="Sits booked at once"
            hint="Most that a member may hold. Blank: no limit."
            optional
            step="1"
            {...field('maxLiveClaims')}
          />
          <NumberInput
            label="Hold"
            hint="Minutes after the window began at which a sit nobody signed in for lapses. Blank: never."
            optional
            unit="minutes"
            step="1"
            {...field('holdMinutes')}
          />
          <Checkbox label="A free stand may be taken after its window has begun" {...field('walkUpSits')} />
          <NumberInput
            label="Back-by allowance"
            hint="After the back-by time, before a person counts as overdue."
            unit="minutes"
            step="1"
            {...field('backByMinutes')}
          />
        </div>
      </Section>
      <RulesOverdue />
      <Section title="Rest, limits and guests">
        <div className="grid gap-5 sm:grid-cols-2">
          <NumberInput
            label="Rest of a stand"
            hint="Full days unused between sits, where the stand sets none of its own."
            unit="days"
            step="1"
            {...field('restDays')}
          />
          <NumberInput
            label="Sits a season"
            hint="Most a member may have. Blank: no limit."
            optional
            step="1"
            {...field('mostSitsPerMember')}
          />
          <NumberInput
            label="Guest days a season"
            hint="Most days a member may bring guests. Blank: no limit."
            optional
            unit="days"
            step="1"
            {...field('guestDays')}
          />
          <NumberInput label="Guests at once" hint="0: members bring none." step="1" {...field('guestsAtOnce')} />
        </div>
      </Section>
    </>
  );
}
