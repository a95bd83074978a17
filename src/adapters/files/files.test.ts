import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makeDiskFiles } from './disk';
import { type FakeS3, serveFakeS3 } from './fake/serve-s3';
import type { FilesPort } from './port';
import { makeS3Files } from './s3';

const folder = mkdtempSync(join(tmpdir(), 'windrest-files-'));
let store: FakeS3;
const ports = new Map<string, FilesPort>();

beforeAll(async () => {
  store = await serveFakeS3('club-files');
  ports.set('disk', makeDiskFiles(folder));
  const keys = { accessKeyId: 'id', secretAccessKey: 'secret' };
  ports.set('s3', makeS3Files({ endpoint: store.url, region: 'us-east-1', bucket: 'club-files', ...keys }));
});

afterAll(async () => {
  await store.stop();
  rmSync(folder, { recursive: true, force: true });
});

const keysOf = async (port: FilesPort, prefix: string) => {
  const keys: string[] = [];
  for await (const { key } of port.list(prefix)) keys.push(key);
  return keys.sort();
};

describe.each(['disk', 's3'])('files on %s', (name) => {
  const files = () => {
    const port = ports.get(name);
    if (!port) throw new Error('No such port.');
    return port;
  };

  it('come back byte for byte, are written over and removed', async () => {
    const bytes = Uint8Array.from({ length: 70_000 }, (_, i) => i % 251);
    await files().put('photos/a/one.jpg', bytes, 'image/jpeg');
    expect(Buffer.from((await files().get('photos/a/one.jpg')) ?? []).equals(Buffer.from(bytes))).toBe(true);
    await files().put('photos/a/one.jpg', Uint8Array.of(1), 'image/jpeg');
    expect([...((await files().get('photos/a/one.jpg')) ?? [])]).toEqual([1]);
    await files().remove(['photos/a/one.jpg', 'photos/a/never.jpg']);
    expect(await files().get('photos/a/one.jpg')).toBeNull();
  });

  it('are listed by what their keys begin with, however many', async () => {
    const before = Date.now() - 60_000;
    const keys = Array.from({ length: 7 }, (_, i) => `list/b/${i}.jpg`);
    for (const key of [...keys, 'other/b/0.jpg']) await files().put(key, Uint8Array.of(1), 'image/jpeg');
    expect(await keysOf(files(), 'list/')).toEqual(keys);
    for await (const { writtenAt } of files().list('list/')) expect(writtenAt).toBeGreaterThan(before);
    await files().remove(keys);
    expect(await keysOf(files(), 'list/')).toEqual([]);
    expect(await keysOf(files(), 'other/')).toEqual(['other/b/0.jpg']);
  });

  it.each(['../out', 'a/../../b', '/etc/passwd', 'a//b', '.hidden', 'a/.b', ''])('refuse the key "%s"', async (key) => {
    await expect(files().put(key, Uint8Array.of(1), 'x/y')).rejects.toThrow('No key of a file');
    await expect(files().get(key)).rejects.toThrow('No key of a file');
  });
});

it('a store that cannot be reached fails, and is not taken for an empty one', async () => {
  const keys = { accessKeyId: 'id', secretAccessKey: 'secret' };
  const wrong = makeS3Files({ endpoint: store.url, region: 'us-east-1', bucket: 'another', ...keys });
  await expect(wrong.get('a/b.jpg')).rejects.toThrow();
});
