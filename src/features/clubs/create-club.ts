import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import { write } from '@/db/client';
import { newId } from '@/lib/ids';
import { audit } from '@/server/audit';
import { AppError } from '@/server/errors';
import { takeRate } from '@/server/rate-limit';
import type { CreateClubInput } from './club-schema';
import { insertClub, insertMembership, slugTaken } from './data';
import { CLUB_AUDIT } from './words/audit';
import { CLUB_ERRORS } from './words/errors';

/** Our choice: a person starts a club or two, a script hundreds. */
const CLUBS_A_DAY = { name: 'create-club', most: 10, windowMs: 24 * 60 * 60_000 };

interface Founder {
  id: string;
  name: string;
  emailVerifiedAt: number | null;
}

/** Starts a club with its founder as the first admin. The e-mail address must be confirmed: the club writes to others. */
export async function createClub(user: Founder, input: CreateClubInput, now: number): Promise<{ slug: string }> {
  if (user.emailVerifiedAt === null) {
    throw new AppError('forbidden', CLUB_ERRORS.confirmFirst);
  }
  await takeRate(CLUBS_A_DAY, [user.id], now);
  const clubId = newId('club');
  const { slug, name, lat, lon, zone, units } = input;
  await write(async (tx) => {
    if (await slugTaken(tx, slug)) {
      const message = CLUB_ERRORS.slugTaken;
      throw new AppError('conflict', message, { fields: { slug: message } });
    }
    const place = { name, lat, lon, zone, units };
    await insertClub(tx, { id: clubId, slug, ...place, rules: DEFAULT_CLUB_RULES, createdAt: now });
    await insertMembership(tx, { id: newId('membership'), clubId, userId: user.id, role: 'admin', joinedAt: now });
    await audit(
      tx,
      {
        clubId,
        actor: { userId: user.id, name: user.name },
        action: 'club.created',
        subjectType: 'club',
        subjectId: clubId,
        summary: CLUB_AUDIT.started(user.name, name),
        detail: { slug, ...place },
      },
      now,
    );
  });
  return { slug };
}
