import { write } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { putChoices } from './choices-data';
import type { ChoicesInput } from './choices-schema';

/** Keeps what a member wants to be told. Nobody else's business: no audit row. */
export async function saveChoices(scope: ClubScope, input: ChoicesInput, now: number): Promise<{ kinds: number }> {
  await write((tx) => putChoices(tx, { clubId: scope.club.id, memberId: scope.member.id, now }, input));
  return { kinds: input.kinds.length };
}
