import { z } from 'zod';
import { PHOTO_ERRORS } from './words';

export const PHOTO_SUBJECTS = ['stand', 'feature', 'sit'] as const;
export type PhotoSubject = (typeof PHOTO_SUBJECTS)[number];

const id = z.string().min(1).max(40);

/** What a photo is of. `time`: 'keep' the hour the camera wrote into it, or 'drop' it. */
export const addPhotoQuery = z.object({
  subject: z.enum(PHOTO_SUBJECTS),
  id,
  time: z.enum(['keep', 'drop']),
});
export type AddPhoto = z.output<typeof addPhotoQuery>;

export const photoQuery = z.object({ size: z.enum(['full', 'thumb']) });

export const CAPTION_MAX = 200;
export const captionInput = z.object({
  id,
  caption: z.string().trim().max(CAPTION_MAX, PHOTO_ERRORS.caption(CAPTION_MAX)),
});
export const atPhoto = z.object({ id });

export const MOST_PHOTO_BYTES = 25 * 1024 * 1024;
export const MOST_PHOTOS = 30;
