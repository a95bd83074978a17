'use client';

import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { slugOf } from '@/lib/slug';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { Select, TextInput } from '@/ui/text-inputs';
import { proposeZone, zoneChoices } from '../propose-zone';
import { PLACE_WORDS } from '../words/club';

interface Fields {
  name: string;
  slug: string;
  lat: string;
  lon: string;
  zone: string;
  units: 'us' | 'metric';
}

interface Props {
  /** Every zone to choose from, as the server knows them. */
  zones: string[];
  /** A new club chooses its address; an old one keeps it. */
  withSlug?: boolean;
}

/** Name, place, zone and units of a club; stands inside a FormProvider. */
export function PlaceFields({ zones, withSlug = false }: Props) {
  const { register, formState, setValue, getValues, watch } = useFormContext<Fields>();
  const { errors, dirtyFields } = formState;
  const [finding, setFinding] = useState<string>();
  const zone = watch('zone');

  async function fillZone() {
    if (dirtyFields.zone && getValues('zone') !== '') return;
    const proposed = await proposeZone(getValues('lat'), getValues('lon'));
    if (proposed) setValue('zone', proposed, { shouldValidate: true });
  }

  function fillPlace() {
    if (!navigator.geolocation) return setFinding(PLACE_WORDS.noPosition);
    setFinding(PLACE_WORDS.looking);
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        setValue('lat', coords.latitude.toFixed(5), { shouldDirty: true, shouldValidate: true });
        setValue('lon', coords.longitude.toFixed(5), { shouldDirty: true, shouldValidate: true });
        setFinding(PLACE_WORDS.filled(Math.round(coords.accuracy)));
        void fillZone();
      },
      () => setFinding(PLACE_WORDS.positionRefused),
      { enableHighAccuracy: true, timeout: 20_000 },
    );
  }

  const name = register('name', {
    onChange: () => {
      if (withSlug && !dirtyFields.slug) setValue('slug', slugOf(getValues('name')));
    },
  });
  return (
    <>
      <Section title={PLACE_WORDS.name}>
        <div className="flex flex-col gap-5">
          <TextInput
            label={PLACE_WORDS.nameClub}
            autoComplete="organization"
            {...name}
            error={errors.name?.message}
            required
          />
          {withSlug && (
            <TextInput
              label={PLACE_WORDS.slug}
              hint={PLACE_WORDS.slugHint}
              autoComplete="off"
              autoCapitalize="none"
              spellCheck={false}
              {...register('slug')}
              error={errors.slug?.message}
              required
            />
          )}
        </div>
      </Section>
      <Section title={PLACE_WORDS.place} note={PLACE_WORDS.placeNote}>
        <div className="grid gap-5 sm:grid-cols-2">
          <TextInput
            label={PLACE_WORDS.lat}
            hint={PLACE_WORDS.latHint}
            inputMode="text"
            autoComplete="off"
            {...register('lat', { onBlur: () => void fillZone() })}
            error={errors.lat?.message}
            required
          />
          <TextInput
            label={PLACE_WORDS.lon}
            hint={PLACE_WORDS.lonHint}
            inputMode="text"
            autoComplete="off"
            {...register('lon', { onBlur: () => void fillZone() })}
            error={errors.lon?.message}
            required
          />
        </div>
        <div className="mt-3 flex flex-wrap items-center gap-3">
          <Button onClick={fillPlace}>{PLACE_WORDS.here}</Button>
          <p role="status" className="text-ink-soft text-sm">
            {finding}
          </p>
        </div>
        <div className="mt-5 flex flex-col gap-5">
          <Select
            label={PLACE_WORDS.zone}
            hint={PLACE_WORDS.zoneHint}
            placeholder={PLACE_WORDS.zonePlaceholder}
            options={zoneChoices(zones, zone).map((one) => ({ value: one, label: one.replaceAll('_', ' ') }))}
            fieldClassName="max-w-sm"
            {...register('zone')}
            value={zone}
            error={errors.zone?.message}
            required
          />
          <RadioCards
            label={PLACE_WORDS.units}
            across
            choices={[
              { value: 'us', label: PLACE_WORDS.us, note: PLACE_WORDS.usNote },
              { value: 'metric', label: PLACE_WORDS.metric, note: PLACE_WORDS.metricNote },
            ]}
            {...register('units')}
            error={errors.units?.message}
          />
        </div>
      </Section>
    </>
  );
}
