import { z } from 'zod';
import { isClock } from '@/core/day-time';
import { FOLLOW_UPS, HIT_PLACES, SHOTS } from '@/core/log/follow-up';
import { sentSchema } from '@/lib/sent-schema';

const MOST_DEER = 200;
const count = z
  .int('Give a whole number.')
  .min(0, 'There cannot be fewer than none.')
  .max(MOST_DEER, `At most ${MOST_DEER}.`);
const clock = z.string().refine(isClock, 'Give a time.');
const notChosen = z.union([z.literal(''), z.null()]).transform(() => null);
const words = (most: number) => z.string().trim().max(most, `Keep it to ${most} characters.`);

export const COUNT_FIELDS = ['antleredBucks', 'does', 'fawns', 'unknown'] as const;
export const BUMP_FIELDS = ['bumpedIn', 'bumpedSitting', 'bumpedOut'] as const;

/** A log as the form holds it: clocks of the sit's day in the club's zone. */
export const logFormSchema = z
  .object({
    sitId: z.string().min(1).max(40),
    sent: sentSchema.optional(),
    /** The log's version when the form was opened; 0: there was none. */
    version: z.int().min(0),
    startClock: clock,
    endClock: clock,
    antleredBucks: count,
    does: count,
    fawns: count,
    unknown: count,
    bumpedIn: count,
    bumpedSitting: count,
    bumpedOut: count,
    bumpedWhere: words(200),
    shot: z.enum(SHOTS, { error: 'Choose what came of it.' }),
    shotClock: z.string().max(5),
    hitPlace: z.enum(HIT_PLACES).or(notChosen),
    followUp: z.enum(FOLLOW_UPS).or(notChosen),
    followUpNotes: words(500),
    notes: words(1000),
  })
  .superRefine((log, ctx) => {
    const fail = (field: string, message: string) => ctx.addIssue({ code: 'custom', path: [field], message });
    if (isClock(log.startClock) && isClock(log.endClock) && log.endClock <= log.startClock) {
      fail('endClock', 'The end comes after the start.');
    }
    if (log.shot === 'none') return;
    if (!isClock(log.shotClock)) fail('shotClock', 'Give the time of the shot.');
    if (log.shot === 'missed') return;
    if (log.hitPlace === null) fail('hitPlace', 'Choose where, or that you are not sure.');
    if (log.followUp === null) fail('followUp', 'Choose how it stands.');
  });
export type LogInput = z.output<typeof logFormSchema>;
export type LogForm = z.input<typeof logFormSchema>;
