import { findSit } from '@/features/bookings/data';
import { type SitView, sitView } from '@/features/bookings/sit-view';
import { readQuotaCautions } from '@/features/harvest/quota-cautions';
import { loadForecast } from '@/features/sits/load-forecast';
import type { ClubScope } from '@/server/scope';
import { findAlternatives, judgeSit, worthOf } from './judge-sits';
import { worthText } from './words/worth';

const MOST = 3;

export interface SwapView {
  sit: SitView;
  /** The sit can still be moved. */
  open: boolean;
  now: string | null;
  /** Quotas that are met on the count of whoever sits. */
  quotas: string[];
  choices: { standId: string; name: string; approachId: string | null; approachName: string | null; text: string }[];
}

/** One's own sit as it stands now, with the quieter stands that are free in its place; null when there is none of one's own. */
export async function readSwap(scope: ClubScope, sitId: string, now: number): Promise<SwapView | null> {
  const sit = await findSit(scope, sitId);
  if (!sit || (sit.memberId !== scope.member.id && !scope.can('sits.book_for_others'))) return null;
  const open = sit.status === 'booked' && sit.startAt > now;
  const view = sitView(scope, sit);
  if (!open) return { sit: view, open, now: null, quotas: [], choices: [] };
  const kept = await loadForecast(scope, now);
  const worth = worthOf(await judgeSit(scope, sit, kept, now));
  const free = worth ? await findAlternatives(scope, sit, worth.quiet, kept, now) : [];
  return {
    sit: view,
    open,
    now: worth && worthText(worth),
    quotas: (await readQuotaCautions(scope, { day: sit.day, memberId: sit.memberId })).map(({ text }) => text),
    choices: free.slice(0, MOST).map((one) => ({
      standId: one.standId,
      name: one.name,
      approachId: one.approachId,
      approachName: one.approachName,
      text: worthText(one),
    })),
  };
}
