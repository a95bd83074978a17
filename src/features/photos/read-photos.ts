import { reader } from '@/db/client';
import { notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { getPhoto, listPhotos, type Subject } from './data';
import { files, type PhotoSize, photoKey } from './files';
import { mayChangePhoto, rightsTo } from './photo-access';

export interface PhotoView {
  id: string;
  caption: string;
  width: number;
  height: number;
  takenAt: string | null;
  byName: string;
  mayChange: boolean;
}

export interface PhotosView {
  subject: Subject;
  mayAdd: boolean;
  photos: PhotoView[];
}

/** The photos of a thing; null where a person may see none of it. */
export async function readPhotos(scope: ClubScope, subject: Subject, now: number): Promise<PhotosView | null> {
  const rights = await rightsTo(scope, subject, now, reader());
  if (!rights) return null;
  const rows = await listPhotos(scope, subject);
  return {
    subject,
    mayAdd: rights.add,
    photos: rows.map(({ photo, byName }) => {
      const { id, caption, width, height, takenAt } = photo;
      return { id, caption, width, height, takenAt, byName, mayChange: mayChangePhoto(scope, rights, photo) };
    }),
  };
}

/** The picture itself, for whoever may see what it is of. */
export async function readPicture(scope: ClubScope, id: string, size: PhotoSize, now: number): Promise<Uint8Array> {
  const photo = await getPhoto(scope, id);
  const subject = photo && { subject: photo.subjectType, id: photo.subjectId };
  if (!photo || !subject || !(await rightsTo(scope, subject, now, reader()))) throw notFound();
  const bytes = await files().get(photoKey(scope.club.id, photo.id, size));
  if (!bytes) throw notFound();
  return bytes;
}
