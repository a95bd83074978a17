import { chooseFiles } from '@/adapters/files/choose';
import type { FilesPort } from '@/adapters/files/port';
import { env } from '@/env';

const holder: { files?: FilesPort } = {};

/** The store of this process. */
export function files(): FilesPort {
  holder.files ??= chooseFiles(env);
  return holder.files;
}

/** Puts another store in its place (tests). */
export function keepFilesIn(port: FilesPort): void {
  holder.files = port;
}

export type PhotoSize = 'full' | 'thumb';

export const PHOTO_PREFIX = 'photos/';

export function photoKey(clubId: string, photoId: string, size: PhotoSize): string {
  return `${PHOTO_PREFIX}${clubId}/${photoId}-${size}.jpg`;
}

/** The photo a key belongs to; null for anything else. */
export function photoOfKey(key: string): string | null {
  return /^photos\/[^/]+\/([a-z0-9_]+)-(full|thumb)\.jpg$/.exec(key)?.[1] ?? null;
}
