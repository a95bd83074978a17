'use client';

import { useId } from 'react';
import { FieldError } from './field';
import { joinClasses } from './join-classes';
import { LessSign, MoreSign } from './signs';
import { STEPPER_WORDS } from './words/forms';

export interface StepperProps {
  label: string;
  name: string;
  value: number;
  onChange: (value: number) => void;
  onBlur?: () => void;
  most?: number;
  error?: string;
  /** big: for a cold thumb; the default fits several in a row. */
  size?: 'big' | 'usual';
  className?: string;
}

const KNOB =
  'grid shrink-0 place-items-center rounded-sm border border-rule-strong bg-panel hover:border-ink hover:bg-sunk active:bg-rule disabled:opacity-50';

/** A whole number that is counted up and down; it can be typed too. */
export function Stepper({ label, name, value, onChange, onBlur, most = 200, error, size, className }: StepperProps) {
  const id = useId();
  const knob = joinClasses(KNOB, size === 'big' ? 'size-14' : 'size-11');
  const set = (next: number) => onChange(Math.min(most, Math.max(0, next)));
  return (
    <div className={className}>
      <div className={joinClasses('flex items-center justify-between gap-x-3 gap-y-1', size !== 'big' && 'flex-wrap')}>
        <label htmlFor={id} className={size === 'big' ? 'font-semibold text-lg leading-tight' : 'font-semibold'}>
          {label}
        </label>
        <span className="flex items-center gap-1.5">
          <button
            type="button"
            className={knob}
            aria-label={STEPPER_WORDS.less(label)}
            disabled={value <= 0}
            onClick={() => set(value - 1)}
          >
            <LessSign className="size-6" />
          </button>
          <input
            id={id}
            name={name}
            type="text"
            inputMode="numeric"
            pattern="[0-9]*"
            autoComplete="off"
            value={String(value)}
            onFocus={(event) => event.target.select()}
            onChange={(event) => set(Number(event.target.value.replace(/\D/g, '').slice(0, 3)))}
            onBlur={onBlur}
            aria-invalid={error ? true : undefined}
            aria-describedby={error ? `${id}-error` : undefined}
            className={joinClasses(
              'border-0 border-rule-strong border-b bg-transparent text-center text-ink aria-invalid:border-clay',
              size === 'big' ? 'h-14 w-14 font-serif text-2xl' : 'h-11 w-11 text-lg',
              value > 0 && 'font-semibold',
            )}
          />
          <button type="button" className={knob} aria-label={STEPPER_WORDS.more(label)} onClick={() => set(value + 1)}>
            <MoreSign className="size-6" />
          </button>
        </span>
      </div>
      <FieldError id={`${id}-error`}>{error}</FieldError>
    </div>
  );
}
