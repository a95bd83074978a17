import { huntingYear } from '@/core/booking/hunting-year';
import { type CountOwner, metText, quotaStates } from '@/core/harvest/quotas';
import type { Caution } from '@/core/verdict-types';
import { type ReadFrom, reader } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { findHunter, listCounted } from './harvests-data';
import { QUOTA_ERRORS } from './words/season';

export type QuotaCaution = Pick<Caution, 'code' | 'text' | 'level'>;

export interface QuotaAsk {
  day: string;
  /** Membership of whoever is booked for; left out: the reader. */
  memberId?: string | null | undefined;
}

interface Counted {
  /** null: nobody's count, only the club's quotas. */
  countId: string | null;
  owner: CountOwner;
}

async function countedFor(scope: ClubScope, memberId: string, from: ReadFrom): Promise<Counted> {
  const { member } = scope;
  if (memberId === member.id) {
    const guest = member.role === 'guest';
    const countId = guest ? member.sponsorId : member.id;
    return { countId: member.userId === null ? null : countId, owner: guest ? 'sponsor' : 'own' };
  }
  const hunter = await findHunter(scope, memberId, from);
  if (!hunter) throw notFound();
  const guest = hunter.role === 'guest';
  return { countId: guest ? hunter.sponsorId : hunter.id, owner: { name: hunter.name, guest } };
}

/** What is said before a booking when a quota of the club, or on the count of whoever is booked for, is met. Nothing is refused. */
export async function readQuotaCautions(
  scope: ClubScope,
  { day, memberId }: QuotaAsk,
  from: ReadFrom = reader(),
): Promise<QuotaCaution[]> {
  const { harvestQuotas } = scope.club.rules;
  if (harvestQuotas.length === 0) return [];
  const { countId, owner } = await countedFor(scope, memberId ?? scope.member.id, from);
  const taken = await listCounted(scope, huntingYear(day), from);
  return quotaStates(harvestQuotas, taken, countId)
    .filter((state) => state.met)
    .map((state) => ({ code: 'quota_met', level: 'caution', text: metText(state, owner) }));
}

/** The same asked by somebody who may book for that person. */
export async function readQuotasOf(scope: ClubScope, ask: QuotaAsk): Promise<QuotaCaution[]> {
  if (ask.memberId && ask.memberId !== scope.member.id && !scope.can('sits.book_for_others')) {
    throw new AppError('forbidden', QUOTA_ERRORS.others);
  }
  return readQuotaCautions(scope, ask);
}

export interface SeasonCautions {
  fromDay: string;
  toDay: string;
  texts: string[];
}

/** The reader's own for each hunting year that one of the days lies in. */
export async function readSeasonCautions(scope: ClubScope, days: string[]): Promise<SeasonCautions[]> {
  const years = new Map(days.map((day) => [huntingYear(day).fromDay, huntingYear(day)]));
  return Promise.all(
    [...years.values()].map(async ({ fromDay, toDay }) => ({
      fromDay,
      toDay,
      texts: (await readQuotaCautions(scope, { day: fromDay })).map(({ text }) => text),
    })),
  );
}
