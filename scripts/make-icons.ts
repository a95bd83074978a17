import { readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import sharp from 'sharp';

/** Draws the icons of an installed Windrest from src/app/icon.svg; run again after a change of it. */
const root = resolve(import.meta.dirname, '..');
const drawing = readFileSync(join(root, 'src/app/icon.svg'));
const PAPER = '#f4efe3';

async function draw(to: string, size: number, margin = 0): Promise<void> {
  const inner = Math.round(size * (1 - 2 * margin));
  const picture = await sharp(drawing, { density: 72 * (size / 32) })
    .resize(inner, inner)
    .png()
    .toBuffer();
  const before = Math.floor((size - inner) / 2);
  const after = size - inner - before;
  await sharp(picture)
    .extend({ top: before, left: before, bottom: after, right: after, background: PAPER })
    .png({ compressionLevel: 9, palette: true })
    .toFile(join(root, to));
  console.log(to);
}

await draw('public/icon-192.png', 192);
await draw('public/icon-512.png', 512);
// A mask may cut away all but the middle four fifths (W3C, Maskable icons).
await draw('public/icon-maskable-512.png', 512, 0.12);
await draw('src/app/apple-icon.png', 180, 0.06);
