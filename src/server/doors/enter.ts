import type { Permission } from '@/core/permissions';
import { AppError, notFound } from '../errors';
import { type ClubScope, findScope } from '../scope';
import { type CurrentUser, currentUser } from '../session';

export async function requireUser(): Promise<CurrentUser> {
  const user = await currentUser();
  if (!user) throw new AppError('signed_out', 'Sign in to go on.');
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
    throw new AppError('forbidden', `Your role in ${scope.club.name} does not allow this. Ask a club admin.`);
  }
  return { user, scope };
}
