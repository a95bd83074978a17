'use client';

import type { UseFormRegisterReturn } from 'react-hook-form';
import { HereButton } from '@/features/ground/components/here-button';
import { Select, TextInput } from '@/ui/text-inputs';
import { PLACE_CHOICE_WORDS } from '../words/visits';

const words = PLACE_CHOICE_WORDS;

interface PlaceChoiceProps {
  placeholder: string;
  groups: { label: string; options: { value: string; label: string }[] }[];
  /** A position is asked for besides: the chosen place is 'point'. */
  byPosition: boolean;
  fields: Record<'place' | 'lat' | 'lon', UseFormRegisterReturn>;
  errorOf: (field: 'place' | 'lat' | 'lon') => string | undefined;
  onHere: (at: { lat: string; lon: string }) => void;
}

/** Where something is: a place the club knows, or a position typed or taken from the browser. */
export function PlaceChoice({ placeholder, groups, byPosition, fields, errorOf, onHere }: PlaceChoiceProps) {
  return (
    <>
      <Select label={words.where} placeholder={placeholder} {...fields.place} error={errorOf('place')}>
        {groups.map((group) => (
          <optgroup key={group.label} label={group.label}>
            {group.options.map((option) => (
              <option key={option.value} value={option.value}>
                {option.label}
              </option>
            ))}
          </optgroup>
        ))}
        <option value="point">{words.byPosition}</option>
      </Select>
      {byPosition && (
        <div className="flex flex-col gap-4">
          <div className="grid gap-4 sm:grid-cols-2">
            <TextInput label={words.lat} inputMode="decimal" {...fields.lat} error={errorOf('lat')} />
            <TextInput label={words.lon} inputMode="decimal" {...fields.lon} error={errorOf('lon')} />
          </div>
          <HereButton onPlace={onHere} />
        </div>
      )}
    </>
  );
}
