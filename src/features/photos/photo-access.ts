import type { ReadFrom } from '@/db/client';
import { getFeature } from '@/features/ground/features-data';
import { getStand } from '@/features/ground/stands-data';
import { maySeeLog, mayWriteLog } from '@/features/logs/log-access';
import { findLoggable } from '@/features/logs/logs-data';
import type { ClubScope } from '@/server/scope';
import type { PhotoRow, Subject } from './data';
import { sitAsSubject } from './words';

export interface SubjectRights {
  name: string;
  add: boolean;
}

/** What a person may do with photos of a thing; null: it is not there, or not theirs to see. */
export async function rightsTo(
  scope: ClubScope,
  { subject, id }: Subject,
  now: number,
  from: ReadFrom,
): Promise<SubjectRights | null> {
  if (subject === 'stand') {
    const stand = scope.can('stands.read') ? await getStand(scope, id, from) : null;
    return stand && { name: stand.name, add: scope.can('stands.write') };
  }
  if (subject === 'feature') {
    const feature = scope.can('features.read') ? await getFeature(scope, id, from) : null;
    return feature && { name: feature.name, add: scope.can('features.write') };
  }
  const sit = await findLoggable(scope, id, from);
  if (sit?.status !== 'booked' || sit.startAt > now) return null;
  const write = mayWriteLog(scope, sit, now);
  if (!write && !maySeeLog(scope, sit, now)) return null;
  return { name: sitAsSubject(sit.standName), add: write };
}

/** Whoever added it, and whoever may add others and answers for the ground. */
export function mayChangePhoto(scope: ClubScope, rights: SubjectRights, photo: Pick<PhotoRow, 'byMemberId'>): boolean {
  return photo.byMemberId === scope.member.id || (rights.add && scope.can('features.write'));
}
