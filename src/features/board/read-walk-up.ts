import { weaponWord } from '@/core/booking/seasons';
import { formatClock } from '@/core/day-time';
import { WEAPONS, type Weapon } from '@/core/ground-types';
import { reader } from '@/db/client';
import { loadGates } from '@/features/bookings/load-gates';
import { listStandsForRules } from '@/features/bookings/rules-data';
import { listApproaches } from '@/features/ground/approaches-data';
import { readQuotaCautions } from '@/features/harvest/quota-cautions';
import { listLastVehicles } from '@/features/outings/data';
import { expectedBackBy } from '@/features/outings/walk-out';
import { walkUpWindow } from '@/features/outings/walk-up';
import type { ClubScope } from '@/server/scope';
import { windowText } from './walk-up-offer';

export interface WalkUpStand {
  id: string;
  name: string;
  weapons: { value: Weapon; label: string }[];
  waysIn: { id: string; name: string; parkingId: string | null }[];
  /** The club's clock, 24 h. */
  backBy: string;
}

export interface WalkUpOptions {
  /** null: no window is near. */
  windowText: string | null;
  /** Stands that no rule closes to the reader now. */
  stands: WalkUpStand[];
  vehicle: string;
  /** Quotas that are met. */
  cautions: string[];
}

/** What a member at the gate may take now. */
export async function readWalkUp(scope: ClubScope, now: number): Promise<WalkUpOptions> {
  const window = walkUpWindow(scope, now);
  if (!window) return { windowText: null, stands: [], vehicle: '', cautions: [] };
  const memberId = scope.member.id;
  const { gatesByStand } = await loadGates(scope, { ...window, memberId, weapon: null, now });
  const ways = await listApproaches(scope);
  const stands = await listStandsForRules(scope, null, reader());
  const vehicles = await listLastVehicles(scope, [memberId]);
  const { day, window: windows, endAt } = window;
  return {
    windowText: windowText(scope, window),
    vehicle: vehicles.get(memberId) ?? '',
    cautions: (await readQuotaCautions(scope, { day })).map(({ text }) => text),
    stands: stands
      .filter(({ id }) => gatesByStand.get(id)?.length === 0)
      .map((stand) => {
        const weapons = WEAPONS.filter((weapon) => stand.shotRangeM[weapon] !== undefined);
        const sit = { standId: stand.id, approachId: null, day, windows, endAt, weapon: weapons[0] ?? 'bow' };
        return {
          id: stand.id,
          name: stand.name,
          weapons: weapons.map((value) => ({ value, label: weaponWord(value) })),
          waysIn: ways
            .filter((way) => way.standId === stand.id && way.direction !== 'out')
            .map(({ id, name, parkingId }) => ({ id, name, parkingId })),
          backBy: formatClock(expectedBackBy(scope.club, ways, sit), scope.club.zone),
        };
      }),
  };
}
