'use client';

import { type ReactNode, useRef, useState } from 'react';
import { Button } from './button';
import { CONTROL_CLASSES, Field } from './field';
import { COPY_WORDS } from './words/forms';

export interface CopyFieldProps {
  label: ReactNode;
  value: string;
  hint?: ReactNode;
  /** Hidden until shown, as an address that opens without a password. */
  secret?: boolean;
}

export function CopyField({ label, value, hint, secret }: CopyFieldProps) {
  const box = useRef<HTMLInputElement>(null);
  const [shown, setShown] = useState(!secret);
  const [said, setSaid] = useState('');

  async function copy() {
    try {
      await navigator.clipboard.writeText(value);
      setSaid(COPY_WORDS.copied);
    } catch {
      // No clipboard outside a secure page: leave it marked for the person's own copy key.
      setShown(true);
      box.current?.focus();
      box.current?.select();
      setSaid(COPY_WORDS.selected);
    }
  }

  return (
    <Field label={label} hint={hint}>
      {(control) => (
        <div className="flex flex-wrap gap-2">
          <input
            {...control}
            ref={box}
            readOnly
            type={shown ? 'text' : 'password'}
            autoComplete="off"
            value={value}
            onFocus={(event) => event.currentTarget.select()}
            className={`${CONTROL_CLASSES} min-w-48 flex-1 basis-60`}
          />
          {secret && (
            <Button aria-pressed={shown} onClick={() => setShown(!shown)}>
              {shown ? COPY_WORDS.hide : COPY_WORDS.show}
            </Button>
          )}
          <Button onClick={copy}>{COPY_WORDS.copy}</Button>
          <span role="status" className="self-center text-sm">
            {said}
          </span>
        </div>
      )}
    </Field>
  );
}
