import type { WindowName } from '@/core/condition-types';
import type { Tx } from '@/db/client';
import { isUniqueViolation } from '@/db/errors';
import type { ClubScope } from '@/server/scope';
import { claimConflict } from './check-sit';
import { insertClaims, listClaimHolders, type SitRow } from './data';

/** Takes the claims of a sit; the two unique indexes have the last word. */
export async function claimWindows(
  scope: ClubScope,
  tx: Tx,
  sit: Pick<SitRow, 'id' | 'standId' | 'memberId' | 'day'>,
  windows: WindowName[],
): Promise<void> {
  try {
    await insertClaims(scope, tx, sit, windows);
  } catch (error) {
    if (!isUniqueViolation(error)) throw error;
    throw claimConflict(await listClaimHolders(scope, tx, sit, windows), sit.day);
  }
}
