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
import { SHELTER_WORDS } from '../words';
import { ArcBars } from './arc-bars';
import { choicesOf } from './choices-of';
import type { Fields } from './form-types';

const LABELS = {
  arcsBoth: {
    label: 'Good winds, morning and evening',
    hint: 'Where the wind may come from: NW-N, or 310-20, or both',
  },
  arcsMorning: { label: 'Good in the morning only', hint: 'Added to the winds above' },
  arcsEvening: { label: 'Good in the evening only', hint: 'Added to the winds above' },
} as const;

export function StandWindFields({ fields }: { fields: Fields<StandForm> }) {
  const { register, errorOf, form } = fields;
  const typed = useWatch({ control: form.control, name: ['arcsBoth', 'arcsMorning', 'arcsEvening'] });
  const arcs = ARC_FIELDS.flatMap(({ window }, i) => {
    const read = readArcs(typed[i] ?? '', window);
    return read.ok ? read.arcs : [];
  });
  return (
    <Section
      title="Good winds"
      heading="margin"
      note="Compass points hold their whole sector; spans run clockwise and may cross north; 'any' is all the way round."
    >
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
            <dt className="text-ink-soft text-sm">{window === 'morning' ? 'Morning' : 'Evening'}, as read</dt>
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
  const read = drain.ok && drain.deg !== null ? `Read as ${formatBearing(drain.deg)}. ` : '';
  return (
    <Section title="Air about the seat" heading="margin">
      <div className="grid gap-4 sm:grid-cols-2">
        <Select
          label="Shelter"
          hint="How open the ground is to the wind"
          options={choicesOf(SHELTER_WORDS)}
          error={errorOf('shelter')}
          {...register('shelter')}
        />
        <TextInput
          label="Cold air drains toward"
          optional
          hint={`${read}Downhill from the seat on a still evening, a compass point or degrees`}
          autoComplete="off"
          error={errorOf('drainBearing')}
          {...register('drainBearing')}
        />
        <TextInput
          label="Slope"
          optional
          hint="Rise in 100 along the ground"
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
