import { z } from 'zod';
import { SENT_WORDS } from './words';

/** Made by the browser at the press: the key keeps a change from being made twice, the instant says when it was meant. */
export const sentSchema = z.object({
  key: z.guid(SENT_WORDS.reload),
  at: z.int(SENT_WORDS.reload).min(0, SENT_WORDS.reload),
});
export type Sent = z.output<typeof sentSchema>;
