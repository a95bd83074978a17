import type { z } from 'zod';

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

/** Reads text fields one by one; each mistake stands beside its field and none hides the next. */
export function formReader(ctx: z.RefinementCtx) {
  let failed = false;
  const fail = (path: (string | number)[], message: string) => {
    failed = true;
    ctx.addIssue({ code: 'custom', path, message });
  };
  const readNumber = (path: (string | number)[], text: string, rule: NumberRule): number | null => {
    if (text.trim() === '') return null;
    const value = parseNumber(text);
    const { label, min, max, whole, unit } = rule;
    if (value === null || value < min || value > max || (whole && !Number.isInteger(value))) {
      const kind = whole ? 'a whole number' : 'a number';
      fail(path, `${label}: type ${kind} from ${min} to ${max}${unit ? ` ${unit}` : ''}.`);
      return null;
    }
    return value;
  };
  return {
    failed: () => failed,
    fail,
    /** Blank is null: no such limit. */
    number: readNumber,
    /** Blank is a mistake. */
    needNumber(path: (string | number)[], text: string, rule: NumberRule): number {
      if (text.trim() === '') fail(path, `${rule.label} is needed.`);
      return readNumber(path, text, rule) ?? 0;
    },
  };
}

export type TextReader = ReturnType<typeof formReader>;
