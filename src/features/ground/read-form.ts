import type { z } from 'zod';
import { isDay } from '@/core/day-time';

/** Most characters a form's one-line and long fields are taken with at all. */
export const LINE_MAX = 200;
export const NOTES_MAX = 2000;
export const NAME_MAX = 60;

export interface NumberRule {
  /** Begins the message: 'Seats'. */
  label: string;
  min: number;
  max: number;
  whole?: boolean;
  /** Written after the bounds: 'ft'. */
  unit?: string;
}

const NUMBER = /^[+-]?(\d+(\.\d*)?|\.\d+)$/;

/** A number as typed, with a decimal point or comma; null when it is none. */
export function parseNumber(text: string): number | null {
  const plain = text
    .trim()
    .replace(/^([+-]?\d*),(\d+)$/, '$1.$2')
    .replace('−', '-');
  return NUMBER.test(plain) ? Number(plain) : null;
}

/** A number as a form shows it: up to so many decimals and no trailing noughts. */
export function numberText(value: number | null, decimals = 2): string {
  return value === null ? '' : String(Number(value.toFixed(decimals)) + 0);
}

/** Reads a form's text field by field and sets what is wrong beside each; nothing stops at the first mistake. */
export interface FormReader {
  failed(): boolean;
  fail(path: string, message: string): void;
  name(path: string, text: string): string;
  /** Blank is null. */
  number(path: string, text: string, rule: NumberRule): number | null;
  /** Blank is a mistake. */
  needNumber(path: string, text: string, rule: NumberRule): number;
  day(path: string, text: string): string;
}

export function readForm(ctx: z.RefinementCtx): FormReader {
  let failures = 0;
  const fail = (path: string, message: string) => {
    failures += 1;
    ctx.addIssue({ code: 'custom', path: path.split('.'), message });
  };
  const number = (path: string, text: string, { label, min, max, whole, unit }: NumberRule): number | null => {
    if (text.trim() === '') return null;
    const value = parseNumber(text);
    const kind = whole ? 'a whole number' : 'a number';
    if (value === null || (whole && !Number.isInteger(value)) || value < min || value > max) {
      fail(path, `${label}: type ${kind} from ${min} to ${max}${unit ? ` ${unit}` : ''}.`);
      return null;
    }
    return value;
  };
  return {
    failed: () => failures > 0,
    fail,
    number,
    name(path, text) {
      const name = text.trim().replace(/\s+/g, ' ');
      if (name === '') fail(path, 'Give it a name.');
      else if (name.length > NAME_MAX) fail(path, `Keep the name to ${NAME_MAX} characters.`);
      return name;
    },
    needNumber(path, text, rule) {
      if (text.trim() === '') fail(path, `${rule.label} is needed.`);
      return number(path, text, rule) ?? 0;
    },
    day(path, text) {
      if (!isDay(text.trim())) fail(path, 'Choose a day.');
      return text.trim();
    },
  };
}
