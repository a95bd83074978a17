import { tieEnds } from '@/features/ground/approach-schema';
import { insertApproach, updateApproach } from '@/features/ground/data';
import { refuseTakenName } from '@/features/ground/refuse';
import { TAKEN_NAMES } from '@/features/ground/words/errors';
import { newId } from '@/lib/ids';
import { AppError } from '@/server/errors';
import type { SetChange } from './drawing-schema';
import { geometryFor, keep, nameFor, noteSet, others, type Saving } from './set-drawn';
import { MAP_AUDIT } from './words/audit';
import { MAP_ERRORS } from './words/errors';

/** Saves a way to a stand, tied to the stand and the parking place as they are now. */
export async function setApproach(saving: Saving, change: Extract<SetChange, { kind: 'approach' }>): Promise<void> {
  const { scope, tx, rows, ids } = saving;
  const name = nameFor(change, MAP_ERRORS.approachNeedsName);
  const before = change.version === 0 ? null : (rows.approaches.find((one) => one.id === change.id) ?? null);
  const standId = ids[change.standId] ?? change.standId;
  const parkingId = change.parkingId === null ? null : (ids[change.parkingId] ?? change.parkingId);
  const stand = others(saving, rows.stands).find((one) => one.id === standId);
  const parking = others(saving, rows.parkings).find((one) => one.id === parkingId);
  if (!stand) throw new AppError('invalid', MAP_ERRORS.leadsNowhere(name));
  if (parkingId !== null && !parking) throw new AppError('invalid', MAP_ERRORS.parkingGone(name));
  const ofStand = others(saving, rows.approaches).filter((one) => one.standId === standId);
  refuseTakenName(ofStand, name, (taken) => TAKEN_NAMES.approachTo(stand.name, taken), change.id);
  const geometry = geometryFor(saving, change, name);
  const points = geometry?.type === 'LineString' ? geometry.coordinates : (before?.points ?? []);
  const tied = tieEnds(scope.club, points, { stand, parking });
  const values = {
    name,
    standId,
    parkingId,
    direction: change.direction,
    points: tied.points,
    vehicleToIndex:
      change.vehicleToIndex === 0 ? 0 : Math.min(change.vehicleToIndex + tied.added, tied.points.length - 1),
  };
  const id = before?.id ?? newId('approach');
  const note = { subject: 'approach' as const, id, what: MAP_AUDIT.approach(name, stand.name), before, values };
  if (before) {
    const row = await updateApproach(scope, tx, change, values);
    if (row) keep(rows.approaches, row);
    return noteSet(saving, note);
  }
  const made = { ...values, notes: '', id };
  await insertApproach(scope, tx, made);
  keep(rows.approaches, { ...made, clubId: scope.club.id, version: 1, removedAt: null });
  ids[change.id] = id;
  return noteSet(saving, note);
}
