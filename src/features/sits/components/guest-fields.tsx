'use client';

import type { UseFormRegisterReturn } from 'react-hook-form';
import { Button } from '@/ui/button';
import { FieldGroup } from '@/ui/field';
import { TextInput } from '@/ui/text-inputs';
import { GUEST_WORDS } from '../words/book';

interface GuestFieldsProps {
  fields: { id: string }[];
  onAdd: () => void;
  onRemove: (index: number) => void;
  nameOf: (index: number) => UseFormRegisterReturn;
  errorOf: (index: number) => string | undefined;
  error: string | undefined;
}

/** Names of guests who come along. */
export function GuestFields({ fields, onAdd, onRemove, nameOf, errorOf, error }: GuestFieldsProps) {
  return (
    <FieldGroup label={GUEST_WORDS.guests} optional error={error}>
      <div className="grid gap-2">
        {fields.map((field, index) => (
          <div key={field.id} className="flex items-end gap-2">
            <TextInput
              label={GUEST_WORDS.guest(index + 1)}
              autoComplete="off"
              fieldClassName="flex-1"
              {...nameOf(index)}
              error={errorOf(index)}
            />
            <Button look="quiet" onClick={() => onRemove(index)}>
              {GUEST_WORDS.remove}
              <span className="sr-only">{GUEST_WORDS.removeWhich(index + 1)}</span>
            </Button>
          </div>
        ))}
        <Button className="justify-self-start" onClick={onAdd}>
          {GUEST_WORDS.add}
        </Button>
      </div>
    </FieldGroup>
  );
}
