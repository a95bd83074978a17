import { z } from 'zod';
import { CALENDAR_ERRORS } from './words';

export const FEED_SCOPES = ['own', 'club'] as const;
export type FeedScope = (typeof FEED_SCOPES)[number];

const scope = z.enum(FEED_SCOPES, { error: CALENDAR_ERRORS.scope });

export const makeFeedSchema = z.object({
  scope,
  /** Stand positions in the entries: only when asked for. */
  withPlace: z.boolean().default(false),
});
export type MakeFeedInput = z.output<typeof makeFeedSchema>;

export const revokeFeedSchema = z.object({ scope });
export type RevokeFeedInput = z.output<typeof revokeFeedSchema>;
