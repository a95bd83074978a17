'use server';

import { captionPhoto, removePhoto } from '@/features/photos/change-photo';
import { atPhoto, captionInput } from '@/features/photos/photo-schema';
import { clubAction } from '@/server/doors';

export const captionPhotoAction = clubAction({
  permission: 'log.write',
  input: captionInput,
  run: ({ scope, input, now }) => captionPhoto(scope, input, now),
});

export const removePhotoAction = clubAction({
  permission: 'log.write',
  input: atPhoto,
  run: ({ scope, input, now }) => removePhoto(scope, input, now),
});
