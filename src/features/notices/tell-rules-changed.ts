import { z } from 'zod';
import { dayOf } from '@/core/day-time';
import { reader, write } from '@/db/client';
import { listClubs } from '@/db/queries/memberships';
import { env } from '@/env';
import { hasMail } from '@/features/mail/data';
import { systemScopeById } from '@/server/scope';
import { listNoticePeople } from './choices-data';
import { listRuleChanges } from './outlooks-data';
import { queueNotice, wanting } from './queue-notice';
import { RULES_MAIL } from './words/mails';

/** A change older than this is known by now, or was made before the member chose to be told. */
const SINCE_MS = 48 * 3_600_000;

const changedLines = z.object({
  changed: z.array(z.object({ label: z.string(), before: z.string().nullable(), after: z.string().nullable() })),
});

/** Tells every member once of each change of the club's rules, but for whoever made it. */
export async function tellRulesChanged(now: number): Promise<{ told: number }> {
  let told = 0;
  for (const club of await listClubs()) {
    const scope = await systemScopeById(club.id);
    for (const change of await listRuleChanges(scope, now - SINCE_MS)) {
      const lines = changedLines.safeParse(change.detail);
      if (!lines.success) continue;
      const today = dayOf(now, club.zone);
      const people = wanting(await listNoticePeople(scope), 'rules_changed', today).filter(
        ({ userId, joinedAt }) => userId !== change.actorUserId && joinedAt <= change.at,
      );
      const keyOf = (memberId: string) => `notice.rules_changed:${change.id}:${memberId}`;
      const keys = people.map(({ memberId }) => keyOf(memberId));
      const known = await hasMail(keys, reader());
      const left = people.filter(({ memberId }) => !known.has(keyOf(memberId)));
      if (left.length === 0) continue;
      told += await write(async (tx) => {
        let count = 0;
        for (const person of left) {
          const mail = {
            kind: 'rules_changed' as const,
            dedupeKey: keyOf(person.memberId),
            subject: RULES_MAIL.subject(lines.data.changed.map(({ label }) => label)).slice(0, 180),
            paragraphs: [RULES_MAIL.opening(change.actorName, club.name), ...lines.data.changed.map(RULES_MAIL.change)],
            button: { label: RULES_MAIL.button, url: `${env.appUrl}/clubs/${club.slug}/club/rules` },
          };
          if (await queueNotice(tx, scope, person, mail, now)) count += 1;
        }
        return count;
      });
    }
  }
  return { told };
}
