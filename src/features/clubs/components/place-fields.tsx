'use client';

import { useState } from 'react';
import { useFormContext } from 'react-hook-form';
import { slugOf } from '@/lib/slug';
import { Button } from '@/ui/button';
import { RadioCards } from '@/ui/choices';
import { Section } from '@/ui/page-parts';
import { Select, TextInput } from '@/ui/text-inputs';
import { proposeZone, zoneChoices } from '../propose-zone';

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
    if (!navigator.geolocation) return setFinding('This browser cannot tell where it is. Type the numbers.');
    setFinding('Looking for your position…');
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        setValue('lat', coords.latitude.toFixed(5), { shouldDirty: true, shouldValidate: true });
        setValue('lon', coords.longitude.toFixed(5), { shouldDirty: true, shouldValidate: true });
        setFinding(`Filled in, to about ${Math.round(coords.accuracy)} m.`);
        void fillZone();
      },
      () => setFinding('The position was not given. Type the numbers.'),
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
      <Section title="Name">
        <div className="flex flex-col gap-5">
          <TextInput
            label="Name of the club"
            autoComplete="organization"
            {...name}
            error={errors.name?.message}
            required
          />
          {withSlug && (
            <TextInput
              label="Address"
              hint="Stands in every link of the club and cannot be changed later: small letters, digits and dashes."
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
      <Section
        title="Place"
        note="About the middle of the ground. Sunrise, weather and distances are worked out from here."
      >
        <div className="grid gap-5 sm:grid-cols-2">
          <TextInput
            label="Latitude"
            hint="Degrees north, such as 34.117"
            inputMode="text"
            autoComplete="off"
            {...register('lat', { onBlur: () => void fillZone() })}
            error={errors.lat?.message}
            required
          />
          <TextInput
            label="Longitude"
            hint="Degrees east; west is minus, such as -84"
            inputMode="text"
            autoComplete="off"
            {...register('lon', { onBlur: () => void fillZone() })}
            error={errors.lon?.message}
            required
          />
        </div>
        <div className="mt-3 flex flex-wrap items-center gap-3">
          <Button onClick={fillPlace}>Use where I am now</Button>
          <p role="status" className="text-ink-soft text-sm">
            {finding}
          </p>
        </div>
        <div className="mt-5 flex flex-col gap-5">
          <Select
            label="Time zone"
            hint="Proposed from the place. Every clock of the club is read in it."
            placeholder="Choose a zone"
            options={zoneChoices(zones, zone).map((one) => ({ value: one, label: one.replaceAll('_', ' ') }))}
            fieldClassName="max-w-sm"
            {...register('zone')}
            value={zone}
            error={errors.zone?.message}
            required
          />
          <RadioCards
            label="Units"
            across
            choices={[
              { value: 'us', label: 'Yards, feet, °F', note: '12-hour clock' },
              { value: 'metric', label: 'Metres, °C', note: '24-hour clock' },
            ]}
            {...register('units')}
            error={errors.units?.message}
          />
        </div>
      </Section>
    </>
  );
}
