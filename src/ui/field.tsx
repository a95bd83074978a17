import { type ReactNode, useId } from 'react';
import { joinClasses } from './join-classes';
import { FIELD_WORDS } from './words/forms';

/** What a control takes so that its label, hint and error are tied to it. */
export interface FieldControl {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
  'aria-required': true | undefined;
}

export interface FieldText {
  label: ReactNode;
  hint?: ReactNode;
  error?: ReactNode;
  /** Marks the label "optional". Unmarked fields are required. */
  optional?: boolean;
}

export interface FieldProps extends FieldText {
  id?: string;
  required?: boolean;
  className?: string;
  children: (control: FieldControl) => ReactNode;
}

export function Field({ id, label, hint, error, optional, required, className, children }: FieldProps) {
  const ownId = useId();
  const controlId = id ?? ownId;
  const hintId = `${controlId}-hint`;
  const errorId = `${controlId}-error`;
  const describedBy = [hint && hintId, error && errorId].filter(Boolean).join(' ');
  return (
    <div className={joinClasses('flex min-w-0 flex-col gap-1', className)}>
      <label htmlFor={controlId} className="font-semibold">
        {label}
        {optional && <span className="font-normal text-ink-soft">{FIELD_WORDS.optional}</span>}
      </label>
      {hint && (
        <p id={hintId} className="text-ink-soft text-sm">
          {hint}
        </p>
      )}
      {children({
        id: controlId,
        'aria-describedby': describedBy || undefined,
        'aria-invalid': error ? true : undefined,
        'aria-required': required || undefined,
      })}
      <FieldError id={errorId}>{error}</FieldError>
    </div>
  );
}

export interface FieldGroupProps extends FieldText {
  className?: string;
  children: ReactNode;
}

/** Several controls under one legend: checkboxes, radio cards, a from-to pair. */
export function FieldGroup({ label, hint, error, optional, className, children }: FieldGroupProps) {
  const ownId = useId();
  const describedBy = [hint && `${ownId}-hint`, error && `${ownId}-error`].filter(Boolean).join(' ');
  return (
    <fieldset
      className={joinClasses('flex min-w-0 flex-col gap-1', className)}
      aria-describedby={describedBy || undefined}
    >
      <legend className="mb-1 font-semibold">
        {label}
        {optional && <span className="font-normal text-ink-soft">{FIELD_WORDS.optional}</span>}
      </legend>
      {hint && (
        <p id={`${ownId}-hint`} className="text-ink-soft text-sm">
          {hint}
        </p>
      )}
      {children}
      <FieldError id={`${ownId}-error`}>{error}</FieldError>
    </fieldset>
  );
}

export function FieldError({ id, children }: { id?: string; children?: ReactNode }) {
  if (!children) return null;
  return (
    <p id={id} className="flex gap-1.5 font-semibold text-clay text-sm">
      <span aria-hidden="true">▲</span>
      <span>{children}</span>
    </p>
  );
}

export const CONTROL_CLASSES =
  'min-h-11 w-full min-w-0 rounded-sm border border-rule-strong bg-panel px-3 py-2 text-ink placeholder:text-ink-soft placeholder:opacity-100 hover:border-ink aria-invalid:border-2 aria-invalid:border-clay disabled:opacity-60';
