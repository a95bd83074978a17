import { type ComponentProps, type ReactNode, useId } from 'react';
import { FieldError, FieldGroup, type FieldText } from './field';
import { joinClasses } from './join-classes';

const TICK = joinClasses('tick', 'size-5 shrink-0');

export interface CheckboxProps extends Omit<ComponentProps<'input'>, 'type'> {
  label: ReactNode;
  hint?: ReactNode;
  error?: ReactNode;
}

export function Checkbox({ label, hint, error, className, ...input }: CheckboxProps) {
  const ownId = useId();
  const id = input.id ?? ownId;
  const describedBy = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <div className={joinClasses('flex flex-col', className)}>
      <label htmlFor={id} className="flex min-h-11 items-start gap-3 py-2">
        <input
          {...input}
          id={id}
          type="checkbox"
          aria-describedby={describedBy || undefined}
          aria-invalid={error ? true : undefined}
          className={TICK}
        />
        <span>{label}</span>
      </label>
      {hint && (
        <p id={`${id}-hint`} className="-mt-1 pl-8 text-ink-soft text-sm">
          {hint}
        </p>
      )}
      <FieldError id={`${id}-error`}>{error}</FieldError>
    </div>
  );
}

export interface Choice {
  value: string;
  label: ReactNode;
  note?: ReactNode;
  disabled?: boolean;
}

type InputShare = Omit<ComponentProps<'input'>, 'type' | 'value' | 'defaultValue' | 'children' | 'className'>;

export interface CheckboxGroupProps extends FieldText, InputShare {
  choices: readonly Choice[];
  /** Chosen at first; for a controlled group give `value` and `onChange`. */
  defaultValue?: readonly string[];
  value?: readonly string[];
  /** One under another, for choices that explain themselves; default side by side where there is room. */
  stacked?: boolean;
  className?: string;
}

/** Several of a short list. Spread `register('name')` in: every box gets it and the form's value is a list. */
export function CheckboxGroup(props: CheckboxGroupProps) {
  const { label, hint, error, optional, choices, defaultValue, value, stacked, className, ...input } = props;
  return (
    <FieldGroup label={label} hint={hint} error={error} optional={optional} className={className}>
      <div className={stacked ? 'grid' : 'flex flex-wrap gap-x-6'}>
        {choices.map((choice) => (
          <label key={choice.value} className="flex min-h-11 items-start gap-3 py-2">
            <input
              {...input}
              type="checkbox"
              value={choice.value}
              disabled={input.disabled || choice.disabled}
              defaultChecked={value ? undefined : defaultValue?.includes(choice.value)}
              checked={value?.includes(choice.value)}
              className={TICK}
            />
            <ChoiceText choice={choice} />
          </label>
        ))}
      </div>
    </FieldGroup>
  );
}

export interface RadioCardsProps extends FieldText, InputShare {
  name: string;
  choices: readonly Choice[];
  defaultValue?: string;
  value?: string;
  /** Cards side by side where there is room; default one under another. */
  across?: boolean;
  className?: string;
}

export function RadioCards(props: RadioCardsProps) {
  const { label, hint, error, optional, choices, defaultValue, value, across, className, ...input } = props;
  return (
    <FieldGroup label={label} hint={hint} error={error} optional={optional} className={className}>
      <div className={joinClasses('grid', across && 'sm:auto-cols-fr sm:grid-flow-col')}>
        {choices.map((choice) => (
          <label
            key={choice.value}
            className={joinClasses(
              '-mt-px flex min-h-12 items-start gap-3 border border-rule-strong bg-panel px-3 py-2.5 first:mt-0 hover:bg-sunk',
              'has-checked:z-10 has-checked:border-2 has-checked:border-moss has-focus-visible:outline-2 has-focus-visible:outline-clay',
              across && 'sm:mt-0 sm:-ml-px sm:first:ml-0',
            )}
          >
            <input
              {...input}
              type="radio"
              value={choice.value}
              disabled={input.disabled || choice.disabled}
              defaultChecked={
                value === undefined && defaultValue !== undefined ? defaultValue === choice.value : undefined
              }
              checked={value === undefined ? undefined : value === choice.value}
              className={TICK}
            />
            <ChoiceText choice={choice} />
          </label>
        ))}
      </div>
    </FieldGroup>
  );
}

function ChoiceText({ choice }: { choice: Choice }) {
  return (
    <span className={choice.disabled ? 'text-ink-soft' : undefined}>
      {choice.label}
      {choice.note && <span className="block text-ink-soft text-sm">{choice.note}</span>}
    </span>
  );
}
