'use client';

import { useFormContext } from 'react-hook-form';
import { Checkbox, RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { NumberInput } from '@/ui/text-inputs';
import type { RulesForm } from '../rules-form-schema';
import { COUNT_WORDS, RULES_BOOKING_WORDS } from '../words/rules-form';
import { RulesOverdue } from './rules-overdue';
import { useRulesFields } from './use-rules-fields';

const AHEAD = [
  { value: 'days', label: RULES_BOOKING_WORDS.days, note: RULES_BOOKING_WORDS.daysNote },
  { value: 'hunt_time', label: RULES_BOOKING_WORDS.huntTime, note: RULES_BOOKING_WORDS.huntTimeNote },
];

export function RulesBooking() {
  const { watch } = useFormContext<RulesForm>();
  const field = useRulesFields();
  return (
    <>
      <Section title={RULES_BOOKING_WORDS.booking}>
        <div className="flex flex-col gap-5">
          <RadioCards label={RULES_BOOKING_WORDS.howFarAhead} across choices={AHEAD} {...field('claimAhead')} />
          {watch('claimAhead') === 'days' ? (
            <NumberInput
              label={RULES_BOOKING_WORDS.daysAhead}
              unit={COUNT_WORDS.days}
              step="1"
              {...field('claimDays')}
            />
          ) : (
            <NumberInput
              label={RULES_BOOKING_WORDS.hoursBeforeWindow}
              unit={COUNT_WORDS.hours}
              step="1"
              {...field('claimHours')}
            />
          )}
          <NumberInput
            label={RULES_BOOKING_WORDS.sitsBookedOnce}
            hint={RULES_BOOKING_WORDS.sitsBookedOnceHint}
            optional
            step="1"
            {...field('maxLiveClaims')}
          />
          <NumberInput
            label={RULES_BOOKING_WORDS.hold}
            hint={RULES_BOOKING_WORDS.holdHint}
            optional
            unit={COUNT_WORDS.minutes}
            step="1"
            {...field('holdMinutes')}
          />
          <Checkbox label={RULES_BOOKING_WORDS.walkUp} {...field('walkUpSits')} />
          <NumberInput
            label={RULES_BOOKING_WORDS.backByAllowance}
            hint={RULES_BOOKING_WORDS.backByAllowanceHint}
            unit={COUNT_WORDS.minutes}
            step="1"
            {...field('backByMinutes')}
          />
        </div>
      </Section>
      <RulesOverdue />
      <Section title={RULES_BOOKING_WORDS.limits}>
        <div className="grid gap-5 sm:grid-cols-2">
          <NumberInput
            label={RULES_BOOKING_WORDS.restStand}
            hint={RULES_BOOKING_WORDS.restStandHint}
            unit={COUNT_WORDS.days}
            step="1"
            {...field('restDays')}
          />
          <NumberInput
            label={RULES_BOOKING_WORDS.sitsASeason}
            hint={RULES_BOOKING_WORDS.sitsASeasonHint}
            optional
            step="1"
            {...field('mostSitsPerMember')}
          />
          <NumberInput
            label={RULES_BOOKING_WORDS.guestDaysSeason}
            hint={RULES_BOOKING_WORDS.guestDaysSeasonHint}
            optional
            unit={COUNT_WORDS.days}
            step="1"
            {...field('guestDays')}
          />
          <NumberInput
            label={RULES_BOOKING_WORDS.guestsAtOnce}
            hint={RULES_BOOKING_WORDS.guestsAtOnceHint}
            step="1"
            {...field('guestsAtOnce')}
          />
        </div>
      </Section>
    </>
  );
}
