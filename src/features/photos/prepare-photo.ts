import readExif from 'exif-reader';
import sharp from 'sharp';
import { PHOTO_ERRORS } from './words';

/** Longest side of what is kept, and of the small one in a list. */
const FULL_PX = 2048;
const THUMB_PX = 480;
/** A picture that unpacks to more than this is no photo of a phone or trail camera. */
const MOST_PIXELS = 120_000_000;
const FORMATS = ['jpeg', 'png', 'webp', 'heif', 'tiff', 'gif'];

export interface PreparedPhoto {
  full: Buffer;
  thumb: Buffer;
  width: number;
  height: number;
  /** 'YYYY-MM-DD HH:MM' by the camera's own clock; null: it wrote none. */
  takenAt: string | null;
}

export type Prepared = { ok: true; photo: PreparedPhoto } | { ok: false; message: string };

/** EXIF tells the camera's clock without a zone; the reader gives it as if it were UTC. */
function takenAt(exif: Buffer | undefined): string | null {
  if (!exif) return null;
  try {
    const at = readExif(exif).Photo?.DateTimeOriginal;
    return at && Number.isFinite(at.getTime()) ? at.toISOString().slice(0, 16).replace('T', ' ') : null;
  } catch {
    return null;
  }
}

/**
 * A picture made anew from its pixels: turned the right way up, no larger than a screen needs, and without anything else
 * the file held, its position above all. What it is called and what type was claimed count for nothing.
 */
export async function preparePhoto(bytes: Uint8Array): Promise<Prepared> {
  const notOne = { ok: false, message: PHOTO_ERRORS.noPhoto } as const;
  if (bytes.length === 0) return { ok: false, message: PHOTO_ERRORS.empty };
  try {
    const source = sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: 'error' });
    const meta = await source.metadata();
    if (!FORMATS.includes(meta.format ?? '')) return notOne;
    const upright = source.rotate().flatten({ background: '#fff' });
    const full = await upright
      .clone()
      .resize(FULL_PX, FULL_PX, { fit: 'inside', withoutEnlargement: true })
      .jpeg({ quality: 82, mozjpeg: true })
      .toBuffer({ resolveWithObject: true });
    const thumb = await upright
      .clone()
      .resize(THUMB_PX, THUMB_PX, { fit: 'inside', withoutEnlargement: true })
      .jpeg({ quality: 74, mozjpeg: true })
      .toBuffer();
    const { width, height } = full.info;
    return { ok: true, photo: { full: full.data, thumb, width, height, takenAt: takenAt(meta.exif) } };
  } catch (error) {
    const tooBig = error instanceof Error && /pixel limit/i.test(error.message);
    return tooBig ? { ok: false, message: PHOTO_ERRORS.tooManyPixels } : notOne;
  }
}
