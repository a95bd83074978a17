const MINUTE = 60_000;

export const MOST_ATTEMPTS = 8;
/** Wait after the first, second, ... failed try; the last holds for all that follow. Our choice: about a day in all. */
const WAITS_MIN = [1, 5, 15, 60, 240, 480, 720];

/** How long to wait after `attempts` failed tries (1 or more); null: give up. */
export function waitAfter(attempts: number): number | null {
  if (attempts >= MOST_ATTEMPTS) return null;
  const minutes = WAITS_MIN[Math.max(0, attempts - 1)] ?? WAITS_MIN.at(-1) ?? 0;
  return minutes * MINUTE;
}
