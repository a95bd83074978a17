'use client';

import { useWatch } from 'react-hook-form';
import { arcsFor } from '@/core/arcs';
import type { Units } from '@/core/units';
import { SlopeOffer } from '@/features/terrain/components/slope-offer';
import { Section } from '@/ui/page-parts';
import { Select, TextInput } from '@/ui/text-inputs';
import { ARC_FIELDS, readArcs } from '../arc-text';
import { bearingText, formatBearing, parseBearing } from '../bearing-text';
import { parseDegrees } from '../place-text';
import type { StandForm } from '../stand-schema';
import { formatArcs } from '../view';
import { SHELTER_WORDS } from '../words/kinds';
import { STAND_AIR_WORDS, STAND_WIND_WORDS } from '../words/stand';
import { ArcBars } from './arc-bars';
import { choicesOf } from './choices-of';
import type { Fields } from './form-types';

const LABELS = {
  arcsBoth: {
    label: STAND_WIND_WORDS.goodWindsLabel,
    hint: STAND_WIND_WORDS.goodWindsHint,
  },
  arcsMorning: { label: STAND_WIND_WORDS.morning, hint: STAND_WIND_WORDS.addedHint },
  arcsEvening: { label: STAND_WIND_WORDS.evening, hint: STAND_WIND_WORDS.addedHint },
} as const;

export function StandWindFields({ fields }: { fields: Fields<StandForm> }) {
  const { register, errorOf, form } = fields;
  const typed = useWatch({ control: form.control, name: ['arcsBoth', 'arcsMorning', 'arcsEvening'] });
  const arcs = ARC_FIELDS.flatMap(({ window }, i) => {
    const read = readArcs(typed[i] ?? '', window);
    return read.ok ? read.arcs : [];
  });
  return (
    <Section title={STAND_WIND_WORDS.goodWinds} heading="margin" note={STAND_WIND_WORDS.goodWindsNote}>
      <div className="flex flex-col gap-4">
        {ARC_FIELDS.map(({ name }) => (
          <TextInput
            key={name}
            label={LABELS[name].label}
            hint={LABELS[name].hint}
            optional={name !== 'arcsBoth'}
            autoComplete="off"
            autoCapitalize="characters"
            spellCheck={false}
            error={errorOf(name)}
            {...register(name)}
          />
        ))}
      </div>
      <dl className="mt-4 grid gap-4 border-rule border-t pt-3 sm:grid-cols-2" aria-live="polite">
        {(['morning', 'evening'] as const).map((window) => (
          <div key={window}>
            <dt className="text-ink-soft text-sm">{STAND_WIND_WORDS.read[window]}</dt>
            <dd>
              <ArcBars arcs={arcsFor(arcs, window)} />
              {formatArcs(arcsFor(arcs, window))}
            </dd>
          </div>
        ))}
      </dl>
    </Section>
  );
}

interface StandAirFieldsProps {
  fields: Fields<StandForm>;
  club: string;
  units: Units;
}

export function StandAirFields({ fields, club, units }: StandAirFieldsProps) {
  const { register, errorOf, form } = fields;
  const [latText, lonText] = useWatch({ control: form.control, name: ['lat', 'lon'] });
  const [lat, lon] = [parseDegrees(latText, 'lat'), parseDegrees(lonText, 'lon')];
  const drain = parseBearing(useWatch({ control: form.control, name: 'drainBearing' }));
  const read = drain.ok ? drain.deg : null;
  return (
    <Section title={STAND_AIR_WORDS.title} heading="margin">
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          label={STAND_AIR_WORDS.shelter}
          hint={STAND_AIR_WORDS.shelterHint}
          options={choicesOf(SHELTER_WORDS)}
          error={errorOf('shelter')}
          {...register('shelter')}
        />
        <TextInput
          label={STAND_AIR_WORDS.drain}
          optional
          hint={read === null ? STAND_AIR_WORDS.drainHint : STAND_AIR_WORDS.drainHintRead(formatBearing(read))}
          autoComplete="off"
          error={errorOf('drainBearing')}
          {...register('drainBearing')}
        />
        <TextInput
          label={STAND_AIR_WORDS.slope}
          optional
          hint={STAND_AIR_WORDS.slopeHint}
          inputMode="decimal"
          unit="%"
          error={errorOf('slopePercent')}
          {...register('slopePercent')}
        />
      </div>
      <SlopeOffer
        club={club}
        units={units}
        at={lat === null || lon === null ? null : { lat, lon }}
        onTake={(slope) => {
          const options = { shouldDirty: true, shouldValidate: true };
          form.setValue('slopePercent', String(slope.slopePercent), options);
          form.setValue('drainBearing', bearingText(slope.drainBearingDeg), options);
        }}
      />
    </Section>
  );
}
