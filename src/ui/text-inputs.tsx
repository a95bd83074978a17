import type { ComponentProps, ReactNode } from 'react';
import { CONTROL_CLASSES, Field, type FieldText } from './field';
import { joinClasses } from './join-classes';

export interface TextInputProps extends ComponentProps<'input'>, FieldText {
  /** Class of the whole field; `className` goes to the input itself. */
  fieldClassName?: string;
  /** Short unit written after the input, as "yd". */
  unit?: ReactNode;
}

/** Label, hint, input and error in one. Takes react-hook-form's `register()` props as they are. */
export function TextInput({ label, hint, error, optional, fieldClassName, unit, className, ...input }: TextInputProps) {
  return (
    <Field
      id={input.id}
      label={label}
      hint={hint}
      error={error}
      optional={optional}
      required={input.required}
      className={fieldClassName}
    >
      {(control) => {
        const box = <input type="text" {...input} {...control} className={joinClasses(CONTROL_CLASSES, className)} />;
        if (!unit) return box;
        return (
          <span className="flex items-center gap-2">
            {box}
            <span className="shrink-0 text-ink-soft">{unit}</span>
          </span>
        );
      }}
    </Field>
  );
}

export function NumberInput({ className, ...rest }: TextInputProps) {
  return (
    <TextInput
      step="any"
      {...rest}
      type="number"
      inputMode={rest.inputMode ?? 'decimal'}
      className={joinClasses('max-w-36', className)}
    />
  );
}

/** A day, YYYY-MM-DD. */
export function DateInput({ className, ...rest }: TextInputProps) {
  return <TextInput {...rest} type="date" className={joinClasses('max-w-52', className)} />;
}

/** A clock time, HH:MM. */
export function TimeInput({ className, ...rest }: TextInputProps) {
  return <TextInput {...rest} type="time" className={joinClasses('max-w-40', className)} />;
}

export interface TextareaProps extends ComponentProps<'textarea'>, FieldText {
  fieldClassName?: string;
}

export function Textarea({ label, hint, error, optional, fieldClassName, className, ...area }: TextareaProps) {
  return (
    <Field
      id={area.id}
      label={label}
      hint={hint}
      error={error}
      optional={optional}
      required={area.required}
      className={fieldClassName}
    >
      {(control) => <textarea rows={4} {...area} {...control} className={joinClasses(CONTROL_CLASSES, className)} />}
    </Field>
  );
}

export interface Option {
  value: string;
  label: string;
  disabled?: boolean;
}

export interface SelectProps extends ComponentProps<'select'>, FieldText {
  /** Leave out to give <option> children of your own. */
  options?: readonly Option[];
  /** First choice with an empty value, as "Choose a stand". */
  placeholder?: string;
  fieldClassName?: string;
}

export function Select({
  label,
  hint,
  error,
  optional,
  fieldClassName,
  className,
  options,
  placeholder,
  children,
  ...select
}: SelectProps) {
  return (
    <Field
      id={select.id}
      label={label}
      hint={hint}
      error={error}
      optional={optional}
      required={select.required}
      className={fieldClassName}
    >
      {(control) => (
        <select {...select} {...control} className={joinClasses(CONTROL_CLASSES, 'pr-8', className)}>
          {placeholder !== undefined && <option value="">{placeholder}</option>}
          {options?.map((option) => (
            <option key={option.value} value={option.value} disabled={option.disabled}>
              {option.label}
            </option>
          ))}
          {children}
        </select>
      )}
    </Field>
  );
}
