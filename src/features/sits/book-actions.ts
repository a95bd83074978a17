import type { BookSitValues, ChangeSitValues } from '@/features/bookings/sit-schema';
import type { ActionResult } from '@/server/doors';

interface Saved {
  standName: string;
  whenText: string;
}

/** The page's own actions, handed to the screen. */
export interface BookActions {
  book: (club: string, values: BookSitValues) => Promise<ActionResult<Saved>>;
  change: (club: string, values: ChangeSitValues) => Promise<ActionResult<Saved>>;
}

export interface Hunter {
  id: string;
  name: string;
}
