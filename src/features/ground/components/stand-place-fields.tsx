'use client';

import { WEAPONS } from '@/core/ground-types';
import type { Units } from '@/core/units';
import { FieldGroup } from '@/ui/field';
import { Section } from '@/ui/page-parts';
import { Select, TextInput } from '@/ui/text-inputs';
import { STAND_LIMITS, type StandForm } from '../stand-schema';
import { SHOT_SIDE_WORDS, STAND_KIND_WORDS, WEAPON_WORDS } from '../words/kinds';
import { STAND_PLACE_WORDS } from '../words/stand';
import { choicesOf } from './choices-of';
import type { Fields } from './form-types';
import { HereButton } from './here-button';

export function StandPlaceFields({ fields }: { fields: Fields<StandForm> }) {
  const { register, errorOf, form } = fields;
  return (
    <Section title={STAND_PLACE_WORDS.place} heading="margin">
      <div className="grid gap-4 sm:grid-cols-2">
        <TextInput label={STAND_PLACE_WORDS.name} error={errorOf('name')} autoComplete="off" {...register('name')} />
        <Select
          label={STAND_PLACE_WORDS.kind}
          options={choicesOf(STAND_KIND_WORDS)}
          error={errorOf('kind')}
          {...register('kind')}
        />
        <TextInput
          label={STAND_PLACE_WORDS.lat}
          hint={STAND_PLACE_WORDS.latHint}
          inputMode="text"
          autoComplete="off"
          error={errorOf('lat')}
          {...register('lat')}
        />
        <TextInput
          label={STAND_PLACE_WORDS.lon}
          hint={STAND_PLACE_WORDS.lonHint}
          autoComplete="off"
          error={errorOf('lon')}
          {...register('lon')}
        />
        <HereButton
          onPlace={({ lat, lon }) => {
            form.setValue('lat', lat, { shouldDirty: true });
            form.setValue('lon', lon, { shouldDirty: true, shouldValidate: true });
          }}
        />
      </div>
    </Section>
  );
}

export function StandSeatFields({ fields, units }: { fields: Fields<StandForm>; units: Units }) {
  const { register, errorOf } = fields;
  const { heightUnit, rangeUnit } = STAND_LIMITS[units];
  return (
    <Section title={STAND_PLACE_WORDS.seatAndShot} heading="margin">
      <div className="grid gap-4 sm:grid-cols-2">
        <TextInput
          label={STAND_PLACE_WORDS.seatHeight}
          inputMode="decimal"
          unit={heightUnit}
          error={errorOf('seatHeight')}
          {...register('seatHeight')}
        />
        <TextInput
          label={STAND_PLACE_WORDS.seats}
          inputMode="numeric"
          error={errorOf('seats')}
          {...register('seats')}
        />
        <TextInput
          label={STAND_PLACE_WORDS.facing}
          optional
          hint={STAND_PLACE_WORDS.facingHint}
          autoComplete="off"
          error={errorOf('facing')}
          {...register('facing')}
        />
        <Select
          label={STAND_PLACE_WORDS.shotSide}
          options={choicesOf(SHOT_SIDE_WORDS)}
          error={errorOf('shotSide')}
          {...register('shotSide')}
        />
      </div>
      <FieldGroup label={STAND_PLACE_WORDS.longestShot} hint={STAND_PLACE_WORDS.longestShotHint} className="mt-5">
        <div className="grid grid-cols-2 gap-4 lg:grid-cols-5">
          {WEAPONS.map((weapon) => (
            <TextInput
              key={weapon}
              label={WEAPON_WORDS[weapon]}
              inputMode="decimal"
              unit={rangeUnit}
              error={errorOf(`shotRange.${weapon}`)}
              {...register(`shotRange.${weapon}`)}
            />
          ))}
        </div>
      </FieldGroup>
    </Section>
  );
}
