import { write } from '@/db/client';
import { findKept, removePhotosOfRemoved } from './data';
import { files, PHOTO_PREFIX, photoOfKey } from './files';

/** A photo just sent has files before it has a row. */
const GRACE_MS = 60 * 60 * 1000;
const AT_ONCE = 200;

/** Removes files of photos that are no longer kept, and photos of what is no longer there. */
export async function removeOrphans(now: number): Promise<{ files: number; photos: number }> {
  const photos = await write((tx) => removePhotosOfRemoved(tx, now));
  let removed = 0;
  let batch: string[] = [];
  const settle = async () => {
    const kept = await findKept([...new Set(batch.flatMap((key) => photoOfKey(key) ?? []))]);
    const orphans = batch.filter((key) => !kept.has(photoOfKey(key) ?? ''));
    await files().remove(orphans);
    removed += orphans.length;
    batch = [];
  };
  for await (const { key, writtenAt } of files().list(PHOTO_PREFIX)) {
    if (writtenAt > now - GRACE_MS) continue;
    batch.push(key);
    if (batch.length >= AT_ONCE) await settle();
  }
  if (batch.length > 0) await settle();
  return { files: removed, photos };
}
