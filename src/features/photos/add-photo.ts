import { reader, write } from '@/db/client';
import { newId } from '@/lib/ids';
import { audit } from '@/server/audit';
import { AppError, notFound } from '@/server/errors';
import { readBody } from '@/server/read-body';
import type { ClubScope } from '@/server/scope';
import { countPhotos, insertPhoto } from './data';
import { files, photoKey } from './files';
import { rightsTo } from './photo-access';
import { type AddPhoto, MOST_PHOTO_BYTES, MOST_PHOTOS } from './photo-schema';
import { preparePhoto } from './prepare-photo';
import { PHOTO_AUDIT, PHOTO_ERRORS } from './words';

/** Keeps a photo of a stand, a feature or a sit, made anew and without its position. */
export async function addPhoto(
  scope: ClubScope,
  ask: AddPhoto,
  request: Request,
  now: number,
): Promise<{ id: string }> {
  const subject = { subject: ask.subject, id: ask.id };
  const rights = await rightsTo(scope, subject, now, reader());
  if (!rights) throw notFound();
  if (!rights.add) throw new AppError('forbidden', PHOTO_ERRORS.mayNotAdd(rights.name));
  const tooMuch = PHOTO_ERRORS.tooBig(MOST_PHOTO_BYTES / 1024 / 1024);
  const prepared = await preparePhoto(await readBody(request, MOST_PHOTO_BYTES, tooMuch));
  if (!prepared.ok) throw new AppError('invalid', prepared.message);
  const { full, thumb, width, height, takenAt } = prepared.photo;
  const id = newId('photo');
  const keys = [photoKey(scope.club.id, id, 'full'), photoKey(scope.club.id, id, 'thumb')] as const;
  // Files first: a row is only ever of a photo that is there. What a failure leaves behind, the job finds.
  await files().put(keys[0], full, 'image/jpeg');
  await files().put(keys[1], thumb, 'image/jpeg');
  try {
    await write(async (tx) => {
      if ((await countPhotos(scope, subject, tx)) >= MOST_PHOTOS) {
        throw new AppError('limit', PHOTO_ERRORS.tooMany(MOST_PHOTOS, rights.name));
      }
      await insertPhoto(scope, tx, {
        id,
        subjectType: ask.subject,
        subjectId: ask.id,
        caption: '',
        width,
        height,
        bytes: full.length,
        takenAt: ask.time === 'keep' ? takenAt : null,
        byMemberId: scope.member.id,
        createdAt: now,
      });
      await audit(
        tx,
        {
          clubId: scope.club.id,
          actor: scope.actor,
          action: 'photo.added',
          subjectType: ask.subject,
          subjectId: ask.id,
          summary: PHOTO_AUDIT.added(rights.name),
        },
        now,
      );
    });
  } catch (error) {
    await files()
      .remove([...keys])
      .catch(() => undefined);
    throw error;
  }
  return { id };
}
