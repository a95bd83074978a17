import { z } from 'zod';
import { readArcs } from '@/features/ground/arc-text';

/** A trial stand as the address holds it: its good winds, the windows it would be hunted in, and its place if it has one. */
export const coverageAskSchema = z.object({
  trial: z.string().trim().max(200).default(''),
  window: z.enum(['both', 'morning', 'evening']).catch('both').default('both'),
  lat: z.coerce.number().min(-90).max(90).optional().catch(undefined),
  lon: z.coerce.number().min(-180).max(180).optional().catch(undefined),
});
export type CoverageAsk = z.output<typeof coverageAskSchema>;

export function readCoverageAsk(search: Record<string, string | string[] | undefined>): CoverageAsk {
  const one = Object.fromEntries(
    Object.entries(search).filter(
      (entry): entry is [string, string] => typeof entry[1] === 'string' && entry[1] !== '',
    ),
  );
  const asked = coverageAskSchema.safeParse(one);
  return asked.success ? asked.data : { trial: '', window: 'both', lat: undefined, lon: undefined };
}

/** Good winds of the trial, what is wrong with how they are typed, or null for none. */
export function trialArcs(ask: Pick<CoverageAsk, 'trial' | 'window'>) {
  if (ask.trial === '') return null;
  return readArcs(ask.trial, ask.window === 'both' ? null : ask.window);
}
