'use client';

import { type Closes, makeLazy } from '@/ui/lazy-part';
import type { MoveDialogProps } from './move-dialog';
import type { ShareDialogProps } from './share-dialog';
import type { SignInDialogProps } from './sign-in-dialog';
import type { SignOutDialogProps } from './sign-out-dialog';
import type { WalkUpDialogProps } from './walk-up-dialog';

/** What opens from the board, each with its form and schema: none of it is needed to read who is in the woods. */
export const lazySignIn = makeLazy<SignInDialogProps & Closes>(() =>
  import('./sign-in-dialog').then((parts) => parts.SignInDialog),
);

export const lazySignOut = makeLazy<SignOutDialogProps & Closes>(() =>
  import('./sign-out-dialog').then((parts) => parts.SignOutDialog),
);

export const lazyMove = makeLazy<MoveDialogProps & Closes>(() =>
  import('./move-dialog').then((parts) => parts.MoveDialog),
);

export const lazyShare = makeLazy<ShareDialogProps & Closes>(() =>
  import('./share-dialog').then((parts) => parts.ShareDialog),
);

export const lazyWalkUp = makeLazy<WalkUpDialogProps & Closes>(() =>
  import('./walk-up-dialog').then((parts) => parts.WalkUpDialog),
);
