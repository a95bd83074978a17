import type {
  MoveBackByValues,
  SignInSitValues,
  SignOutSitInput,
  SitLinkInput,
  WalkUpValues,
} from '@/features/outings/outing-schema';
import type { ActionResult } from '@/server/doors';
import type { SavedOuting } from '../saved-outing';

type Act<V, T> = (club: string, values: V) => Promise<ActionResult<T>>;

/** What a person may do on the board; the server decides again. */
export interface BoardActions {
  signIn: Act<SignInSitValues, SavedOuting>;
  signOut: Act<SignOutSitInput, SavedOuting>;
  move: Act<MoveBackByValues, SavedOuting>;
  walkUp: Act<WalkUpValues, SavedOuting>;
  share: Act<SitLinkInput, { url: string }>;
  revoke: Act<SitLinkInput, { revoked: number }>;
}
