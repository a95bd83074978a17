import { z } from 'zod';

/** Made by the browser at the press: the key keeps a change from being made twice, the instant says when it was meant. */
export const sentSchema = z.object({
  key: z.guid('Reload the page and try again.'),
  at: z.int('Reload the page and try again.').min(0, 'Reload the page and try again.'),
});
export type Sent = z.output<typeof sentSchema>;
