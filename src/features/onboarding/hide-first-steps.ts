import { write } from '@/db/client';
import { audit } from '@/server/audit';
import type { ClubScope } from '@/server/scope';
import { insertHidden, stepsAreHidden } from './data';
import { ONBOARDING_AUDIT } from './words';

/** Puts the first steps away for the whole club. */
export async function hideFirstSteps(scope: ClubScope, now: number): Promise<{ hidden: true }> {
  return write(async (tx) => {
    if (await stepsAreHidden(scope, tx)) return { hidden: true };
    await insertHidden(scope, tx, now);
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'club.first_steps_hidden',
        subjectType: 'club',
        subjectId: scope.club.id,
        summary: ONBOARDING_AUDIT.hidden(scope.member.name),
      },
      now,
    );
    return { hidden: true };
  });
}
