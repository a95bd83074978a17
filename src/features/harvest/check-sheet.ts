import { dayOf, localToUtc } from '@/core/day-time';
import type { Tx } from '@/db/client';
import { getStand } from '@/features/ground/stands-data';
import { findLoggable } from '@/features/logs/logs-data';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { mayWriteFor } from './harvest-access';
import type { HarvestInput } from './harvest-schema';
import { findHunter, type HarvestRow } from './harvests-data';
import { HARVEST_ERRORS } from './words/sheet';

const AHEAD_MS = 15 * 60_000;

const wrong = (field: string, message: string) => new AppError('invalid', message, { fields: { [field]: message } });

export type SheetValues = Omit<
  HarvestRow,
  'id' | 'clubId' | 'version' | 'writtenBy' | 'createdAt' | 'removedAt' | 'requestKey'
>;

/** Whose count the deer goes on: a guest's on the sponsor. */
async function countedOn(scope: ClubScope, tx: Tx, input: HarvestInput) {
  const hunter = await findHunter(scope, input.hunterId, tx);
  if (!hunter) throw wrong('hunterId', HARVEST_ERRORS.notInClub);
  if (!mayWriteFor(scope, hunter)) {
    throw new AppError('forbidden', HARVEST_ERRORS.notYours(hunter.name));
  }
  if (hunter.role !== 'guest') {
    return {
      memberId: hunter.id,
      guestId: null,
      guestName: input.guestName,
      hunterName: input.guestName || hunter.name,
    };
  }
  if (input.guestName !== '') throw wrong('guestName', HARVEST_ERRORS.guestTwice(hunter.name));
  if (hunter.sponsorId === null) throw wrong('hunterId', HARVEST_ERRORS.noSponsor(hunter.name));
  return { memberId: hunter.sponsorId, guestId: hunter.id, guestName: hunter.name, hunterName: hunter.name };
}

/** A sheet as it may be kept, inside the transaction that will write it. */
export async function checkSheet(
  scope: ClubScope,
  tx: Tx,
  input: HarvestInput,
  before: HarvestRow | null,
  now: number,
): Promise<{ values: SheetValues; hunterName: string }> {
  const { hunterId: _, clock, requestKey: __, ...facts } = input;
  const { zone } = scope.club;
  const takenAt = localToUtc(input.day, clock, zone);
  if (takenAt > now + AHEAD_MS) {
    throw wrong(input.day > dayOf(now, zone) ? 'day' : 'clock', HARVEST_ERRORS.toCome);
  }
  const { hunterName, ...counted } = await countedOn(scope, tx, input);
  const sameStand = input.standId === (before?.standId ?? null);
  if (input.standId !== null && !sameStand && !(await getStand(scope, input.standId, tx))) {
    throw wrong('standId', HARVEST_ERRORS.stand);
  }
  // A link from a log: dropped without a word where it does not hold.
  const sit = input.sitId === null ? null : await findLoggable(scope, input.sitId, tx);
  const sitId = sit && sit.day === input.day ? sit.id : null;
  return { values: { ...facts, ...counted, sitId, takenAt }, hunterName };
}
