import type { ReadFrom } from '@/db/client';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { listHunters } from './people-data';
import { GROUND_ERRORS } from './words/errors';

/** Only this club's own members may be named for a stand. */
export async function refuseUnknownMembers(scope: ClubScope, ids: string[] | null, from: ReadFrom): Promise<void> {
  if (ids === null) return;
  const known = new Set((await listHunters(scope, from)).map((hunter) => hunter.id));
  if (ids.every((id) => known.has(id))) return;
  const message = GROUND_ERRORS.memberGone;
  throw new AppError('invalid', message, { fields: { allowedMemberIds: message } });
}
