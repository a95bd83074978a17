'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { isClock, localToUtc } from '@/core/day-time';
import { FOLLOW_UPS, followFrom, HIT_PLACES, SHOTS } from '@/core/log/follow-up';
import { clockText } from '@/features/bookings/words/sits';
import { RadioCards } from '@/ui/choices';
import { Notice } from '@/ui/notices';
import { Textarea, TimeInput } from '@/ui/text-inputs';
import type { LogForm } from '../log-schema';
import { SHOT_FORM_WORDS } from '../words/form';
import { FOLLOW_WORDS, HIT_WORDS, SHOT_WORDS, WAIT_ADVICE } from '../words/log';

const words = SHOT_FORM_WORDS;

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
        label={words.shot}
        across
        {...field('shot')}
        choices={SHOTS.map((value) => ({ value, label: SHOT_WORDS[value] }))}
      />
      {shot !== 'none' && <TimeInput label={words.time} {...field('shotClock')} />}
      {shot === 'hit' && (
        <>
          <RadioCards
            label={words.hit}
            across
            {...field('hitPlace')}
            choices={HIT_PLACES.map((value) => ({ value, label: HIT_WORDS[value] }))}
          />
          <Notice level="caution" title={waitTitle(day, shotClock, place, { zone, units })} live>
            <p>{WAIT_ADVICE}</p>
          </Notice>
          <RadioCards
            label={words.followUp}
            across
            {...field('followUp')}
            choices={FOLLOW_UPS.map((value) => ({ value, label: FOLLOW_WORDS[value] }))}
          />
          <Textarea label={words.followUpNotes} optional rows={2} {...field('followUpNotes')} />
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
  if (!place) return words.wait;
  if (!isClock(clock)) return place === 'heart_lungs' ? words.waitShort : words.waitLong;
  const { earliest, latest } = followFrom(localToUtc(day, clock, club.zone), place);
  const from = clockText(earliest, club);
  return earliest === latest ? words.followFrom(from) : words.followBetween(from, clockText(latest, club));
}
