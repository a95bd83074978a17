export interface ElevationPlace {
  lat: number;
  lon: number;
}

export type ElevationFailure = {
  ok: false;
  /** unavailable: no answer; bad_answer: an answer that cannot be used; limit: asked too often. */
  reason: 'unavailable' | 'bad_answer' | 'limit';
  /** Plain words for people; holds no key and no address. */
  message: string;
};

export type ElevationResult = { ok: true; heightsM: number[] } | ElevationFailure;

/** Places that one request asks for at most. */
export const MOST_AT_ONCE = 100;

/** Where heights of the ground come from. An answer from it was checked; it never throws. */
export interface ElevationPort {
  /** The setting that chose it: fake or hosted. */
  readonly source: string;
  /** Written beside what is made of the heights, for people. */
  readonly label: string;
  /** At most MOST_AT_ONCE places, answered in their order. */
  heights(places: ElevationPlace[], signal?: AbortSignal): Promise<ElevationResult>;
}

export function elevationFailure(reason: ElevationFailure['reason'], message: string): ElevationFailure {
  return { ok: false, reason, message };
}
