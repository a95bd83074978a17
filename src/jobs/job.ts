export interface Job {
  name: string;
  /** One run for each slot of this length, counted from the epoch. */
  everyMs: number;
  /** Says in a few words what it did. */
  run: (now: number) => Promise<string>;
}

export const SECOND = 1000;
export const MINUTE = 60 * SECOND;
export const DAY = 24 * 60 * MINUTE;
