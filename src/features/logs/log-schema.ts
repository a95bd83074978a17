import { z } from 'zod';
import { isClock } from '@/core/day-time';
import { FOLLOW_UPS, HIT_PLACES, SHOTS } from '@/core/log/follow-up';
import { sentSchema } from '@/lib/sent-schema';
import { LOG_FIELD_ERRORS as ERRORS } from './words/form';

const MOST_DEER = 200;
const count = z.int(ERRORS.whole).min(0, ERRORS.negative).max(MOST_DEER, ERRORS.most(MOST_DEER));
const clock = z.string().refine(isClock, ERRORS.time);
const notChosen = z.union([z.literal(''), z.null()]).transform(() => null);
const words = (most: number) => z.string().trim().max(most, ERRORS.long(most));

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
    shot: z.enum(SHOTS, { error: ERRORS.shot }),
    shotClock: z.string().max(5),
    hitPlace: z.enum(HIT_PLACES).or(notChosen),
    followUp: z.enum(FOLLOW_UPS).or(notChosen),
    followUpNotes: words(500),
    notes: words(1000),
  })
  .superRefine((log, ctx) => {
    const fail = (field: string, message: string) => ctx.addIssue({ code: 'custom', path: [field], message });
    if (isClock(log.startClock) && isClock(log.endClock) && log.endClock <= log.startClock) {
      fail('endClock', ERRORS.endFirst);
    }
    if (log.shot === 'none') return;
    if (!isClock(log.shotClock)) fail('shotClock', ERRORS.shotTime);
    if (log.shot === 'missed') return;
    if (log.hitPlace === null) fail('hitPlace', ERRORS.hit);
    if (log.followUp === null) fail('followUp', ERRORS.followUp);
  });
export type LogInput = z.output<typeof logFormSchema>;
export type LogForm = z.input<typeof logFormSchema>;
