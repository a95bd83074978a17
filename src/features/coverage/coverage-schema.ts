import { z } from 'zod';
import type { WindowName } from '@/core/condition-types';
import type { ScoredStand, Suitability } from '@/core/ground-types';
import { readArcs } from '@/features/ground/arc-text';

const shared = {
  trial: z.string().trim().max(200),
  window: z.enum(['both', 'morning', 'evening']),
};
const lat = z.coerce.number().min(-90).max(90);
const lon = z.coerce.number().min(-180).max(180);

/** A trial stand as the address holds it: its good winds, the windows it would be hunted in, and its place if it has one. */
export const coverageAskSchema = z.object({
  trial: shared.trial.default(''),
  window: shared.window.catch('both').default('both'),
  lat: lat.optional().catch(undefined),
  lon: lon.optional().catch(undefined),
});
export type CoverageAsk = z.output<typeof coverageAskSchema>;

/** A trial stand that has a place, asked about its seat. */
export const trialSeatSchema = z.object({ ...shared, lat, lon });
export type TrialSeatAsk = z.output<typeof trialSeatSchema>;

export function readCoverageAsk(search: Record<string, string | string[] | undefined>): CoverageAsk {
  const one = Object.fromEntries(
    Object.entries(search).filter(
      (entry): entry is [string, string] => typeof entry[1] === 'string' && entry[1] !== '',
    ),
  );
  const asked = coverageAskSchema.safeParse(one);
  return asked.success ? asked.data : { trial: '', window: 'both', lat: undefined, lon: undefined };
}

export type TrialWindow = CoverageAsk['window'];

/** Good winds of the trial as they are typed, or what is wrong with them; none typed is none. */
export function trialArcs(typed: string) {
  return typed.trim() === '' ? { ok: true as const, arcs: [] } : readArcs(typed, null);
}

/** A trial is hunted alike in the windows chosen, in the others not at all. */
export function trialSuitability(chosen: TrialWindow): ScoredStand['suitability'] {
  const rated = (window: WindowName): Suitability => (chosen === 'both' || chosen === window ? 'usable' : 'avoid');
  return { morning: rated('morning'), evening: rated('evening') };
}
