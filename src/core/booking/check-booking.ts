import type { Gate } from '../verdict-types';
import type { BookingCheck } from './booking-types';
import { claimAheadGates, windowOverGates } from './claim-ahead';
import { liveClaimGates, seasonLimitGates } from './claim-limits';
import { memberBusyGates, takenGates } from './claims';
import { closedDayGates, standClosureGates } from './closures';
import { guestGates } from './guest-days';
import { passThroughGates } from './pass-through';
import { restGates } from './rest';
import { seasonGates, weaponGates } from './seasons';
import { spacingGates } from './spacing';
import { whoMayHuntGates } from './who-may-hunt';

export type { BookingCheck, BookingMember, BookingStand, GuestHunt, OtherSit } from './booking-types';

/**
 * Every rule that forbids a sit, in a fixed order: the ground, the season, the person, the claim, rest, neighbours, limits.
 * Empty when it may be booked. Each gate says in plain words which rule it is and who or what holds it; `endsOn` is a day
 * or an ISO instant.
 */
export function checkBooking(input: BookingCheck): Gate[] {
  const { stand, member, day, windows, weapon, rules, now, zone, units } = input;
  const sits = input.otherSits.filter((sit) => sit.sitId !== input.exceptSitId);
  const spans = input.spans.filter((span) => span.day === day && windows.includes(span.window));
  const claim = { day, windows, sits };
  return [
    ...standClosureGates(stand, day),
    ...closedDayGates(input.closedDays, day),
    ...seasonGates(rules, day, weapon),
    ...weaponGates(stand, weapon),
    ...whoMayHuntGates(stand, member),
    ...windowOverGates(spans, now, rules.walkUpSits, zone),
    ...takenGates(stand, claim),
    ...memberBusyGates(member, stand, claim),
    ...restGates({
      standName: stand.name,
      restDays: stand.restDays ?? rules.restDaysDefault,
      day,
      sits: sits.filter((sit) => sit.standId === stand.id),
    }),
    ...spacingGates({ rules, stand, day, windows, weapon, sits, units }),
    ...passThroughGates({ passThroughM: rules.passThroughM, stand, day, windows, sits, units }),
    ...claimAheadGates({ rule: rules.claimAhead, day, spans, now, zone }),
    ...liveClaimGates({ rules, member, sits, now }),
    ...seasonLimitGates({ rules, stand, member, day, counts: input.seasonCounts }),
    ...guestGates({
      rules,
      member,
      hunt: { day, windows, guests: input.guests },
      others: input.guestHunts.filter((hunt) => hunt.sitId !== input.exceptSitId),
    }),
  ];
}
