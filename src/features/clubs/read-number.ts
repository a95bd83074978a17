import type { z } from 'zod';
import { FORM_ERRORS } from './words/field-errors';

export interface NumberRule {
  /** Begins the message: 'Rest days'. */
  label: string;
  min: number;
  max: number;
  whole?: boolean;
  /** Written after the bounds: 'yd'. */
  unit?: string;
}

const NUMBER = /^[+-]?(\d+(\.\d*)?|\.\d+)$/;

/** A number as typed, with a decimal point or comma and either minus sign; null when it is none. */
export function parseNumber(text: string): number | null {
  const plain = text
    .trim()
    .replace('−', '-')
    .replace(/^([+-]?\d*),(\d+)$/, '$1.$2');
  return NUMBER.test(plain) ? Number(plain) : null;
}

/** A number as a form shows it: no trailing noughts and no minus on a nought. */
export function numberText(value: number | null, decimals = 2): string {
  return value === null ? '' : String(Number(value.toFixed(decimals)) + 0);
}

type Path = string | (string | number)[];

/** Reads text fields one by one; each mistake stands beside its field and none hides the next. A path may be dotted. */
export function formReader(ctx: z.RefinementCtx) {
  let failed = false;
  const fail = (path: Path, message: string) => {
    failed = true;
    ctx.addIssue({ code: 'custom', path: typeof path === 'string' ? path.split('.') : path, message });
  };
  const number = (path: Path, text: string, rule: NumberRule): number | null => {
    if (text.trim() === '') return null;
    const value = parseNumber(text);
    const { min, max, whole } = rule;
    if (value === null || value < min || value > max || (whole && !Number.isInteger(value))) {
      fail(path, FORM_ERRORS.number(rule));
      return null;
    }
    return value;
  };
  return {
    failed: () => failed,
    fail,
    /** Blank is null: no such limit. */
    number,
    /** Blank is a mistake. */
    needNumber(path: Path, text: string, rule: NumberRule): number {
      if (text.trim() === '') fail(path, FORM_ERRORS.needed(rule.label));
      return number(path, text, rule) ?? 0;
    },
  };
}

export type TextReader = ReturnType<typeof formReader>;
