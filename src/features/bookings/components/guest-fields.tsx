'use client';

import { useId } from 'react';
import { Button } from '@/ui/button';
import { FieldGroup } from '@/ui/field';
import { TextInput } from '@/ui/text-inputs';
import { GUEST_WORDS } from '../words/screens';

export interface GuestValue {
  name: string;
  memberId?: string | null | undefined;
}

interface GuestFieldsProps {
  guests: GuestValue[];
  onChange: (guests: GuestValue[]) => void;
  /** Guests with an account: the same name is taken to be the same person. */
  known: { id: string; name: string }[];
  most: number;
  errorOf: (path: `guests.${number}.name` | 'guests') => string | undefined;
}

/** Names of those who come along, as many as the club allows at once. */
export function GuestFields({ guests, onChange, known, most, errorOf }: GuestFieldsProps) {
  const listId = useId();
  if (most === 0 && guests.length === 0) return null;

  const named = (name: string): GuestValue => ({ name, memberId: known.find((one) => one.name === name)?.id ?? null });
  const replace = (at: number, name: string) => onChange(guests.map((guest, n) => (n === at ? named(name) : guest)));

  return (
    <FieldGroup label={GUEST_WORDS.guests} optional hint={GUEST_WORDS.guestsHint(most)} error={errorOf('guests')}>
      <datalist id={listId}>
        {known.map((guest) => (
          <option key={guest.id} value={guest.name} />
        ))}
      </datalist>
      {guests.map((guest, at) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: two guests may bear one name while it is typed
        <div key={at} className="flex flex-wrap items-end gap-2">
          <TextInput
            name={`guests.${at}.name`}
            label={GUEST_WORDS.name(at + 1)}
            list={listId}
            maxLength={60}
            value={guest.name}
            onChange={(event) => replace(at, event.currentTarget.value)}
            error={errorOf(`guests.${at}.name`)}
            fieldClassName="flex-1 basis-48"
          />
          <Button
            look="quiet"
            aria-label={GUEST_WORDS.removeLabel(at + 1)}
            onClick={() => onChange(guests.filter((_, n) => n !== at))}
          >
            {GUEST_WORDS.remove}
          </Button>
        </div>
      ))}
      {guests.length < most && (
        <div>
          <Button onClick={() => onChange([...guests, { name: '', memberId: null }])}>{GUEST_WORDS.add}</Button>
        </div>
      )}
    </FieldGroup>
  );
}
