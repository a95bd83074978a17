'use client';

import type { UseFormRegisterReturn } from 'react-hook-form';
import { TextLink } from '@/ui/button';
import { Checkbox } from '@/ui/choices';
import { Select, TextInput, TimeInput } from '@/ui/text-inputs';
import { GROUND_FIELD_WORDS as WORDS } from '../words/dialogs';

export type GroundField = 'approachId' | 'parkingId' | 'vehicle' | 'backBy' | 'contactOff';

export const EMPTY_IS_NULL = { setValueAs: (value: unknown) => value || null };

interface Props {
  register: (name: GroundField) => UseFormRegisterReturn;
  errorOf: (name: GroundField) => string | undefined;
  waysIn: { id: string; name: string }[];
  parkings: { id: string; name: string }[];
  /** For oneself: offers to leave the contact out this time, or to name one. */
  own: boolean;
  contactName: string | null;
}

const options = (list: { id: string; name: string }[]) => [
  { value: '', label: WORDS.notSaid },
  ...list.map(({ id, name }) => ({ value: id, label: name })),
];

/** What others need to know of somebody on the ground. */
export function GroundFields({ register, errorOf, waysIn, parkings, own, contactName }: Props) {
  return (
    <>
      <TimeInput label={WORDS.backBy} hint={WORDS.backByHint} {...register('backBy')} error={errorOf('backBy')} />
      <Select label={WORDS.wayIn} options={options(waysIn)} {...register('approachId')} error={errorOf('approachId')} />
      <Select
        label={WORDS.parking}
        options={options(parkings)}
        {...register('parkingId')}
        error={errorOf('parkingId')}
      />
      <TextInput
        label={WORDS.vehicle}
        optional
        hint={WORDS.vehicleHint}
        maxLength={80}
        {...register('vehicle')}
        error={errorOf('vehicle')}
      />
      {own && contactName === null && (
        <p className="text-ink-soft text-sm">
          {WORDS.noContact} <TextLink href="/account">{WORDS.nameOne}</TextLink>.
        </p>
      )}
      {own && contactName !== null && (
        <Checkbox label={WORDS.contactOff(contactName)} hint={WORDS.contactOffHint} {...register('contactOff')} />
      )}
    </>
  );
}
