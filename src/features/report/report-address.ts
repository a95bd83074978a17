import type { Period } from './choose-period';

/** An address that asks for the same days. */
export function reportAddress(
  path: string,
  { season, from, to }: Pick<Period, 'season' | 'from' | 'to'>,
  more: Record<string, string> = {},
): string {
  const asked = { season, ...(from && { from }), ...(to && { to }), ...more };
  return `${path}?${new URLSearchParams(asked)}`;
}
