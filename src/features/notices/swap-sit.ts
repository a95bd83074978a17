import { changeSit } from '@/features/bookings/change-sit';
import { findSit, type SitDetail } from '@/features/bookings/data';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import type { SwapSitInput } from './swap-schema';

/** Moves a sit to another stand and leaves the rest as it is; every rule of booking is asked anew. */
export async function swapSit(scope: ClubScope, input: SwapSitInput, now: number): Promise<SitDetail> {
  const sit = await findSit(scope, input.sitId);
  if (!sit) throw notFound();
  const { day, windows, weapon, guests, note } = sit;
  return changeSit(scope, { ...input, day, windows, weapon, guests, note }, now);
}
