import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import readExif from 'exif-reader';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeDiskFiles } from '@/adapters/files/disk';
import type { FilesPort } from '@/adapters/files/port';
import { GET } from '@/app/api/clubs/[club]/photos/[photo]/route';
import { reader, write } from '@/db/client';
import { features, photos, sits, stands } from '@/db/schema';
import { addPhoto } from '@/features/photos/add-photo';
import { captionPhoto, removePhoto } from '@/features/photos/change-photo';
import { keepFilesIn, photoKey } from '@/features/photos/files';
import type { AddPhoto } from '@/features/photos/photo-schema';
import { preparePhoto } from '@/features/photos/prepare-photo';
import { readPhotos } from '@/features/photos/read-photos';
import { removeOrphans } from '@/features/photos/remove-orphans';
import { newId } from '@/lib/ids';
import { setClock } from '@/server/clock';
import { addMember, addStand, makeClub, TEST_NOW, type TestClub, type TestMember } from '../helpers/make-club';
import { inRequest } from '../helpers/request';

const folder = mkdtempSync(join(tmpdir(), 'windrest-photos-'));
const disk: FilesPort = makeDiskFiles(folder);
const HOUR = 3_600_000;

/** As a phone writes it: lying on its side, with a place and an hour. */
function phonePhoto(width = 900, height = 600): Promise<Buffer> {
  return sharp({ create: { width, height, channels: 3, background: '#446633' } })
    .withExif({
      IFD0: { Make: 'Acme', Orientation: '6' },
      IFD2: { DateTimeOriginal: '2026:10:31 06:42:10' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '34/1 7/1 1/1', GPSLongitudeRef: 'W', GPSLongitude: '84/1 0/1 1/1' },
    })
    .withMetadata({ orientation: 6 })
    .jpeg()
    .toBuffer();
}

let club: TestClub;
let steward: TestMember;
let member: TestMember;
let other: TestMember;
let standId: string;
let sitId: string;

beforeAll(async () => {
  keepFilesIn(disk);
  setClock(() => TEST_NOW);
  club = await makeClub({ sightingsSeenBy: 'officers' });
  steward = await addMember(club, 'steward');
  member = await addMember(club, 'member');
  other = await addMember(club, 'member');
  standId = await addStand(club);
  sitId = newId('sit');
  await write((tx) =>
    tx.insert(sits).values({
      id: sitId,
      clubId: club.id,
      standId,
      memberId: member.id,
      day: '2026-11-03',
      windows: 'morning',
      weapon: 'bow',
      status: 'booked',
      startAt: TEST_NOW - 26 * HOUR,
      endAt: TEST_NOW - 22 * HOUR,
      guests: [],
      requestKey: 'one',
      bookedBy: member.id,
      createdAt: TEST_NOW - 50 * HOUR,
      updatedAt: TEST_NOW - 50 * HOUR,
    }),
  );
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

async function send(by: TestMember, ask: Partial<AddPhoto>, body: Buffer | string): Promise<string> {
  const request = new Request('http://127.0.0.1/', {
    method: 'POST',
    body: typeof body === 'string' ? body : new Uint8Array(body),
  });
  const full: AddPhoto = { subject: 'stand', id: standId, time: 'keep', ...ask };
  return (await addPhoto(by.scope, full, request, TEST_NOW)).id;
}

async function keptFiles(): Promise<string[]> {
  const keys: string[] = [];
  for await (const { key } of disk.list('photos/')) keys.push(key);
  return keys;
}

/** Through the door, as a browser asks. */
function ask(by: TestMember, photo: string, size = 'full'): Promise<Response> {
  const request = new Request(`http://127.0.0.1/x?size=${size}`);
  return inRequest(by.browser, () => GET(request, { params: Promise.resolve({ club: club.slug, photo }) }));
}

describe('a photo kept', () => {
  it('is turned upright, made small, and rid of its place and maker', async () => {
    const source = await phonePhoto(3000, 2000);
    const before = await sharp(source).metadata();
    // The sample must hold what is to be taken out.
    expect(readExif(before.exif ?? Buffer.alloc(0)).GPSInfo?.GPSLatitudeRef).toBe('N');
    const id = await send(steward, {}, source);
    for (const size of ['full', 'thumb'] as const) {
      const bytes = await disk.get(photoKey(club.id, id, size));
      const meta = await sharp(bytes ?? Buffer.alloc(0)).metadata();
      expect(meta).toMatchObject({
        format: 'jpeg',
        width: size === 'full' ? 1365 : 320,
        height: size === 'full' ? 2048 : 480,
      });
      expect([meta.exif, meta.xmp, meta.iptc, meta.orientation]).toEqual([undefined, undefined, undefined, undefined]);
      expect(Buffer.from(bytes ?? []).includes('Acme')).toBe(false);
    }
    const view = await readPhotos(steward.scope, { subject: 'stand', id: standId }, TEST_NOW);
    expect(view?.photos.find((one) => one.id === id)).toMatchObject({
      takenAt: '2026-10-31 06:42',
      width: 1365,
      height: 2048,
    });
  });

  it('forgets the hour where that is wanted', async () => {
    const id = await send(steward, { time: 'drop' }, await phonePhoto());
    const [row] = await reader().select().from(photos).where(eq(photos.id, id));
    expect(row?.takenAt).toBeNull();
  });

  it.each([
    ['a page', '<html><script>alert(1)</script></html>'],
    [
      'a drawing that could run',
      '<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"><script>alert(1)</script></svg>',
    ],
    ['nothing', ''],
    ['half a photo', Buffer.from('ffd8ffe000104a46494600010100000100010000ffdb', 'hex')],
  ])('is never %s', async (_, body) => {
    const before = await keptFiles();
    await expect(send(steward, {}, body)).rejects.toMatchObject({ code: 'invalid' });
    expect(await keptFiles()).toEqual(before);
  });

  it('is never one that unpacks to a wall of pixels', async () => {
    const wall = await sharp({ create: { width: 16_000, height: 9000, channels: 3, background: '#fff' } })
      .png({ compressionLevel: 9 })
      .toBuffer();
    expect(wall.length).toBeLessThan(2_000_000);
    expect(await preparePhoto(wall)).toEqual({ ok: false, message: expect.stringContaining('too many pixels') });
  });
});

describe('who may', () => {
  it('a member looks at a stand and adds none; a steward adds; a guest and a stranger see nothing', async () => {
    const id = await send(steward, {}, await phonePhoto());
    await expect(send(member, {}, await phonePhoto())).rejects.toMatchObject({ code: 'forbidden' });
    const answer = await ask(member, id, 'thumb');
    expect(answer.status).toBe(200);
    expect(answer.headers.get('cache-control')).toBe('private, max-age=3600');
    expect(answer.headers.get('content-type')).toBe('image/jpeg');
    const guest = await addMember(club, 'guest', {
      sponsorId: member.id,
      guestFrom: '2026-11-01',
      guestTo: '2026-11-10',
    });
    expect((await ask(guest, id)).status).toBe(403);
    expect((await ask(await addMember(await makeClub(), 'admin'), id)).status).toBe(404);
    await expect(removePhoto(member.scope, { id }, TEST_NOW)).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('photos of a sit follow the club rule for its log', async () => {
    const id = await send(member, { subject: 'sit', id: sitId }, await phonePhoto());
    expect((await ask(member, id)).status).toBe(200);
    expect((await ask(steward, id)).status).toBe(200);
    expect((await ask(other, id)).status).toBe(404);
    expect(await readPhotos(other.scope, { subject: 'sit', id: sitId }, TEST_NOW)).toBeNull();
    await expect(send(other, { subject: 'sit', id: sitId }, await phonePhoto())).rejects.toMatchObject({
      code: 'not_found',
    });
    await captionPhoto(member.scope, { id, caption: 'The rub by the creek' }, TEST_NOW);
    const view = await readPhotos(member.scope, { subject: 'sit', id: sitId }, TEST_NOW);
    expect(view?.photos[0]).toMatchObject({ caption: 'The rub by the creek', mayChange: true });
  });
});

describe('nothing is left behind', () => {
  it('by removing a photo', async () => {
    const id = await send(steward, {}, await phonePhoto());
    expect((await keptFiles()).filter((key) => key.includes(id))).toHaveLength(2);
    await removePhoto(steward.scope, { id }, TEST_NOW);
    expect((await keptFiles()).filter((key) => key.includes(id))).toEqual([]);
    expect((await ask(steward, id)).status).toBe(404);
  });

  it('by a store that fails, nor by a thing that goes: the job finds both', async () => {
    const featureId = newId('feature');
    await write((tx) =>
      tx.insert(features).values({
        id: featureId,
        clubId: club.id,
        name: 'Bed',
        kind: 'bedding',
        geometry: { type: 'Point', coordinates: [-84, 34.1] },
        months: [11],
      }),
    );
    const stays = await send(steward, {}, await phonePhoto());
    const ofGone = await send(steward, { subject: 'feature', id: featureId }, await phonePhoto());
    const stuck = await send(steward, {}, await phonePhoto());
    keepFilesIn({ ...disk, remove: () => Promise.reject(new Error('The store is away.')) });
    await removePhoto(steward.scope, { id: stuck }, TEST_NOW);
    keepFilesIn(disk);
    await disk.put('photos/nobody/pho_never-full.jpg', Uint8Array.of(1), 'image/jpeg');
    await write((tx) => tx.update(features).set({ removedAt: TEST_NOW }).where(eq(features.id, featureId)));
    const own = async (id: string) => (await keptFiles()).filter((key) => key.includes(id)).length;
    expect(await own(stuck)).toBe(2);

    // Files are young yet: one may belong to a photo whose row is being written.
    await removeOrphans(Date.now());
    expect([await own(stuck), await own(ofGone), await own('pho_never')]).toEqual([2, 2, 1]);
    const told = await removeOrphans(Date.now() + 2 * HOUR);
    expect(told.files).toBeGreaterThanOrEqual(5);
    expect([await own(stuck), await own(ofGone), await own('pho_never'), await own(stays)]).toEqual([0, 0, 0, 2]);
    expect(await removeOrphans(Date.now() + 2 * HOUR)).toEqual({ files: 0, photos: 0 });
    expect(await reader().select().from(stands).where(eq(stands.id, standId))).toHaveLength(1);
  });
});
