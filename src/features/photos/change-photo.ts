import { type Tx, write } from '@/db/client';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { getPhoto, type PhotoRow, updatePhoto } from './data';
import { files, photoKey } from './files';
import { mayChangePhoto, rightsTo, type SubjectRights } from './photo-access';
import { PHOTO_AUDIT, PHOTO_ERRORS } from './words';

async function openPhoto(
  scope: ClubScope,
  tx: Tx,
  id: string,
  now: number,
): Promise<{ photo: PhotoRow; rights: SubjectRights }> {
  const photo = await getPhoto(scope, id, tx);
  const rights = photo && (await rightsTo(scope, { subject: photo.subjectType, id: photo.subjectId }, now, tx));
  if (!photo || !rights) throw notFound();
  if (!mayChangePhoto(scope, rights, photo)) {
    throw new AppError('forbidden', PHOTO_ERRORS.notYours);
  }
  return { photo, rights };
}

export function captionPhoto(
  scope: ClubScope,
  input: { id: string; caption: string },
  now: number,
): Promise<{ caption: string }> {
  return write(async (tx) => {
    await openPhoto(scope, tx, input.id, now);
    await updatePhoto(scope, tx, input.id, { caption: input.caption });
    return { caption: input.caption };
  });
}

/** Takes a photo away, the picture itself as well. */
export async function removePhoto(scope: ClubScope, input: { id: string }, now: number): Promise<{ id: string }> {
  await write(async (tx) => {
    const { photo, rights } = await openPhoto(scope, tx, input.id, now);
    await updatePhoto(scope, tx, photo.id, { removedAt: now });
    await audit(
      tx,
      {
        clubId: scope.club.id,
        actor: scope.actor,
        action: 'photo.removed',
        subjectType: photo.subjectType,
        subjectId: photo.subjectId,
        summary: PHOTO_AUDIT.removed(rights.name),
      },
      now,
    );
  });
  // Should this fail, nobody sees the photo any more and the job removes its files.
  await files()
    .remove([photoKey(scope.club.id, input.id, 'full'), photoKey(scope.club.id, input.id, 'thumb')])
    .catch(() => undefined);
  return { id: input.id };
}
