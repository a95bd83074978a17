import { Worker } from 'node:worker_threads';
import { strToU8, zipSync } from 'fflate';
import { describe, expect, it } from 'vitest';
import { readApart, readInThread } from './read-apart';

/** Threads of plain script: TypeScript is not run in a thread without a bundler. The built one is walked in Chromium. */
const thread = (code: string) => () =>
  new Worker(`const { parentPort } = require('node:worker_threads'); ${code}`, { eval: true });
const answering = thread(
  `parentPort.once('message', (bytes) => parentPort.postMessage({ ok: false, message: 'Read ' + bytes.length }));`,
);

const waypoint = '<wpt lat="34" lon="-84"><name>Oak</name></wpt>';
const gpx = (more = '') =>
  strToU8(`<?xml version="1.0"?><gpx version="1.1" xmlns="http://www.topografix.com/GPX/1/1">${waypoint}${more}</gpx>`);

describe('a file read apart', () => {
  it('is handed to the thread whole, and what the thread says is the answer', async () => {
    const bytes = gpx(`<!-- ${'x'.repeat(1024 * 1024)} -->`);
    expect(await readApart(bytes, { start: answering, mostMs: 60_000 })).toEqual({
      ok: false,
      message: `Read ${bytes.length}`,
    });
  });

  it('is an archive that may unpack to much, however small it is', async () => {
    const kmz = zipSync({ 'doc.kml': strToU8('<kml/>'), 'pad.bin': crypto.getRandomValues(new Uint8Array(20_000)) });
    expect(await readApart(kmz, { start: answering, mostMs: 60_000 })).toEqual({
      ok: false,
      message: `Read ${kmz.length}`,
    });
  });

  it('is none when it is small: that is read on the spot', async () => {
    const never = () => {
      throw new Error('A thread was started.');
    };
    expect(await readApart(gpx(), { start: never, mostMs: 60_000 })).toMatchObject({
      ok: true,
      things: [{ name: 'Oak' }],
    });
  });

  it('is given up when it takes too long or too much memory', async () => {
    const hangs = { start: thread('setInterval(() => undefined, 1000);'), mostMs: 50 };
    expect(await readInThread(gpx(), hangs)).toMatchObject({ ok: false, message: expect.stringContaining('split it') });
    const grows = () =>
      new Worker('const all = []; for (;;) all.push(new Array(10000).fill(Math.random()));', {
        eval: true,
        resourceLimits: { maxOldGenerationSizeMb: 16 },
      });
    expect(await readInThread(gpx(), { start: grows, mostMs: 60_000 })).toMatchObject({ ok: false });
  }, 60_000);

  it('fails as a fault of ours when the thread breaks or ends without an answer', async () => {
    const broken = { start: thread(`throw new Error('broken');`), mostMs: 60_000 };
    await expect(readInThread(gpx(), broken)).rejects.toThrow('broken');
    await expect(readInThread(gpx(), { start: thread('process.exit(0);'), mostMs: 60_000 })).rejects.toThrow(
      'ended without an answer',
    );
  });
});
