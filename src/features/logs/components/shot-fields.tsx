'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { isClock, localToUtc } from '@/core/day-time';
import { FOLLOW_UPS, followFrom, HIT_PLACES, SHOTS } from '@/core/log/follow-up';
import { clockText } from '@/features/bookings/sit-words';
import { RadioCards } from '@/ui/choices';
import { Notice } from '@/ui/notices';
import { Textarea, TimeInput } from '@/ui/text-inputs';
import type { LogForm } from '../log-schema';
import { FOLLOW_WORDS, HIT_WORDS, SHOT_WORDS, WAIT_ADVICE } from '../log-words';

interface ShotFieldsProps {
  day: string;
  zone: string;
  units: 'us' | 'metric';
}

/** The shot, and of a hit where, how long to wait, and what came of it. */
export function ShotFields({ day, zone, units }: ShotFieldsProps) {
  const { register, control, formState, getFieldState } = useFormContext<LogForm>();
  const [shot, shotClock, hitPlace] = useWatch({ control, name: ['shot', 'shotClock', 'hitPlace'] });
  const field = (name: keyof LogForm) => ({ ...register(name), error: getFieldState(name, formState).error?.message });
  const place = HIT_PLACES.find((one) => one === hitPlace);
  return (
    <div className="flex flex-col gap-5">
      <RadioCards
        label="Shot"
        across
        {...field('shot')}
        choices={SHOTS.map((value) => ({ value, label: SHOT_WORDS[value] }))}
      />
      {shot !== 'none' && <TimeInput label="Time of the shot" {...field('shotClock')} />}
      {shot === 'hit' && (
        <>
          <RadioCards
            label="Where it was hit"
            across
            {...field('hitPlace')}
            choices={HIT_PLACES.map((value) => ({ value, label: HIT_WORDS[value] }))}
          />
          <Notice level="caution" title={waitTitle(day, shotClock, place, { zone, units })} live>
            <p>{WAIT_ADVICE}</p>
          </Notice>
          <RadioCards
            label="How it stands"
            across
            {...field('followUp')}
            choices={FOLLOW_UPS.map((value) => ({ value, label: FOLLOW_WORDS[value] }))}
          />
          <Textarea label="Where it stood, was last seen and was found" optional rows={2} {...field('followUpNotes')} />
        </>
      )}
    </div>
  );
}

function waitTitle(
  day: string,
  clock: string,
  place: (typeof HIT_PLACES)[number] | undefined,
  club: { zone: string; units: 'us' | 'metric' },
): string {
  if (!place) return 'Wait before you follow';
  if (!isClock(clock)) return place === 'heart_lungs' ? 'Wait 30 minutes' : 'Wait 4 to 6 hours';
  const { earliest, latest } = followFrom(localToUtc(day, clock, club.zone), place);
  const from = clockText(earliest, club);
  return earliest === latest
    ? `Follow from ${from}`
    : `Follow from ${from} at the earliest, better ${clockText(latest, club)}`;
}
