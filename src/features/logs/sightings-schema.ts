import { z } from 'zod';

/** What the season's tables are asked for; a year names the hunting year that begins in it. */
export const sightingsAskSchema = z.object({
  year: z.coerce.number().int().min(2000).max(2100).optional(),
  whose: z.enum(['club', 'own']).default('club'),
});
export type SightingsAsk = z.output<typeof sightingsAskSchema>;

export const sightingsFileSchema = sightingsAskSchema.extend({ what: z.enum(['logs', 'tables']).default('logs') });

/** An address typed by hand asks for what it can: anything else is left out. */
export function readSightingsAsk(search: Record<string, string | string[] | undefined>): SightingsAsk {
  const asked = sightingsAskSchema.safeParse(search);
  return asked.success ? asked.data : { whose: 'club' };
}
