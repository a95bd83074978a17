import { huntingYear } from '@/core/booking/hunting-year';
import { metText, quotaStates } from '@/core/harvest/quotas';
import type { Caution } from '@/core/types';
import { type ReadFrom, reader } from '@/db/client';
import type { ClubScope } from '@/server/scope';
import { listCounted } from './harvests-data';

/** What is said before booking when a quota of the club, or of the reader's own count, is met. Nothing is refused. */
export async function readQuotaCautions(
  scope: ClubScope,
  day: string,
  from: ReadFrom = reader(),
): Promise<Pick<Caution, 'code' | 'text' | 'level'>[]> {
  const { club, member } = scope;
  const { harvestQuotas } = club.rules;
  if (harvestQuotas.length === 0) return [];
  const guest = member.role === 'guest';
  const countId = guest ? member.sponsorId : member.id;
  const taken = await listCounted(scope, huntingYear(day), from);
  return quotaStates(harvestQuotas, taken, member.userId === null ? null : countId)
    .filter((state) => state.met)
    .map((state) => ({ code: 'quota_met', level: 'caution', text: metText(state, guest ? 'sponsor' : 'own') }));
}
