import { z } from 'zod';
import { SWAP_ERRORS } from './words/swap';

const id = z.string().min(1).max(60);

export const swapSitSchema = z.object({
  sitId: id,
  /** The sit's sequence when the page was made. */
  sequence: z.int(SWAP_ERRORS.reload).min(0),
  standId: id,
  approachId: id.nullable(),
});
export type SwapSitInput = z.output<typeof swapSitSchema>;
