'use client';

import { type ComponentProps, type MouseEvent, type ReactNode, useEffect, useRef } from 'react';
import { useFormStatus } from 'react-dom';
import { Button, type ButtonLook } from './button';
import { joinClasses } from './join-classes';
import { FORM_WORDS } from './words/forms';

export interface FormError {
  /** Name of the field the error stands beside; left out for the form as a whole. */
  name?: string;
  message: string;
}

/** What is wrong with a form, in one list that takes focus and leads to each field by its name. */
export function FormErrorSummary({ errors, title = FORM_WORDS.wrong }: { errors: FormError[]; title?: string }) {
  const box = useRef<HTMLDivElement>(null);
  const key = errors.map((error) => error.message).join('|');
  useEffect(() => {
    if (key) box.current?.focus();
  }, [key]);
  if (errors.length === 0) return null;

  function goTo(event: MouseEvent<HTMLAnchorElement>, name: string) {
    const form = box.current?.closest('form') ?? document;
    const field = form.querySelector(`[name="${CSS.escape(name)}"]`);
    if (!(field instanceof HTMLElement)) return;
    event.preventDefault();
    field.focus();
    field.scrollIntoView({ block: 'center' });
  }

  return (
    <div ref={box} tabIndex={-1} role="alert" className="border-2 border-clay bg-panel px-4 py-3">
      <p className="font-semibold text-clay">{title}</p>
      <ul className="mt-1 list-disc pl-5">
        {errors.map((error) => (
          <li key={`${error.name}:${error.message}`}>
            {error.name ? (
              <a
                href={`#${error.name}`}
                onClick={(event) => goTo(event, error.name ?? '')}
                className="underline underline-offset-2"
              >
                {error.message}
              </a>
            ) : (
              error.message
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}

export interface SubmitButtonProps extends Omit<ComponentProps<'button'>, 'type'> {
  look?: ButtonLook;
  /** For forms sent by script; a form with an action reports itself. */
  pending?: boolean;
  pendingLabel?: ReactNode;
}

export function SubmitButton({
  look = 'primary',
  pending,
  pendingLabel = FORM_WORDS.working,
  ...rest
}: SubmitButtonProps) {
  const status = useFormStatus();
  return (
    <Button
      {...rest}
      type="submit"
      look={look}
      pending={pending || status.pending}
      pendingLabel={pendingLabel}
      // Keeps the focus in the field: a fault shown as it is left would move the button from under the pointer.
      onMouseDown={(event) => event.preventDefault()}
    />
  );
}

export interface SubmitRowProps {
  label: ReactNode;
  look?: ButtonLook;
  pending?: boolean;
  pendingLabel?: ReactNode;
  disabled?: boolean;
  /** Other ways on, as a Cancel link. */
  children?: ReactNode;
  className?: string;
}

/** The foot of a form. */
export function SubmitRow({ label, look, pending, pendingLabel, disabled, children, className }: SubmitRowProps) {
  return (
    <div className={joinClasses('flex flex-wrap items-center gap-3 border-rule border-t pt-4', className)}>
      <SubmitButton look={look} pending={pending} pendingLabel={pendingLabel} disabled={disabled}>
        {label}
      </SubmitButton>
      {children}
    </div>
  );
}
