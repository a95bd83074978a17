import { addPhoto } from '@/features/photos/add-photo';
import { addPhotoQuery } from '@/features/photos/photo-schema';
import { clubRoute } from '@/server/doors';

/** Takes the photo itself as the body. */
export const POST = clubRoute('log.write', {
  query: addPhotoQuery,
  run: ({ scope, query, request, now }) => addPhoto(scope, query, request, now),
});
