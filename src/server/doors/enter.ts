import type { Permission } from '@/core/permissions';
import { SERVER_ERRORS } from '@/server/words';
import { AppError, notFound } from '../errors';
import { type ClubScope, findScope } from '../scope';
import { type CurrentUser, currentUser } from '../session';

export async function requireUser(): Promise<CurrentUser> {
  const user = await currentUser();
  if (!user) throw new AppError('signed_out', SERVER_ERRORS.signIn);
  return user;
}

/** Session, membership, permission: a stranger to the club gets the answer a missing club gives. */
export async function requireScope(
  slug: unknown,
  permission: Permission,
): Promise<{ user: CurrentUser; scope: ClubScope }> {
  const user = await requireUser();
  if (typeof slug !== 'string' || !/^[a-z0-9-]{1,60}$/.test(slug)) throw notFound();
  const scope = await findScope(slug, user.id);
  if (!scope) throw notFound();
  if (!scope.can(permission)) {
    throw new AppError('forbidden', SERVER_ERRORS.forbidden(scope.club.name));
  }
  return { user, scope };
}
