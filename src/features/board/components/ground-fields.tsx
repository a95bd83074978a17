'use client';

import type { UseFormRegisterReturn } from 'react-hook-form';
import { TextLink } from '@/ui/button';
import { Checkbox } from '@/ui/choices';
import { Select, TextInput, TimeInput } from '@/ui/text-inputs';

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
  { value: '', label: 'Not said' },
  ...list.map(({ id, name }) => ({ value: id, label: name })),
];

/** What others need to know of somebody on the ground. */
export function GroundFields({ register, errorOf, waysIn, parkings, own, contactName }: Props) {
  return (
    <>
      <TimeInput
        label="Back by"
        hint="At the parking place, by the club's clock. You can move it."
        {...register('backBy')}
        error={errorOf('backBy')}
      />
      <Select label="Way in" options={options(waysIn)} {...register('approachId')} error={errorOf('approachId')} />
      <Select label="Parked at" options={options(parkings)} {...register('parkingId')} error={errorOf('parkingId')} />
      <TextInput
        label="Vehicle"
        optional
        hint="Colour, make, plate: what somebody would look for."
        maxLength={80}
        {...register('vehicle')}
        error={errorOf('vehicle')}
      />
      {own && contactName === null && (
        <p className="text-ink-soft text-sm">
          Nobody at home is told when you are overdue: <TextLink href="/account">name a safety contact</TextLink>.
        </p>
      )}
      {own && contactName !== null && (
        <Checkbox
          label={`Do not tell ${contactName} this time`}
          hint="Your safety contact. Otherwise they are mailed when you are overdue."
          {...register('contactOff')}
        />
      )}
    </>
  );
}
