import { Worker } from 'node:worker_threads';
import { FILE_PROBLEMS } from '../words/files';
import { FREE_BYTES, MOST_UNPACK_RATIO } from './limits';
import { type ReadFile, readMapFile } from './read-file';

/** Smaller files are read sooner than a thread starts. Our choice. */
const SMALL_BYTES = 1024 * 1024;
/** A track of 199 000 points took some 7 s of one core and fitted into 700 MB when this was set. Our choice. */
const MOST_MS = 300_000;
const MOST_MEMORY_MB = 1536;

const startThread = () =>
  new Worker(new URL('./read-thread.ts', import.meta.url), {
    resourceLimits: { maxOldGenerationSizeMb: MOST_MEMORY_MB },
  });

export interface Thread {
  start: () => Worker;
  mostMs: number;
}

/** Of a thread that runs out of memory. */
const isTooMuch = (error: unknown) =>
  error instanceof Error && 'code' in error && error.code === 'ERR_WORKER_OUT_OF_MEMORY';

/** Reads in a thread of its own, which is stopped when it takes too long. */
export function readInThread(bytes: Uint8Array, { start, mostMs }: Thread): Promise<ReadFile> {
  return new Promise((resolve, reject) => {
    const thread = start();
    const settle = (done: () => void) => {
      clearTimeout(timer);
      void thread.terminate();
      done();
    };
    const giveUp = () => settle(() => resolve({ ok: false, message: FILE_PROBLEMS.tooMuch }));
    const timer = setTimeout(giveUp, mostMs);
    thread.once('message', (read: ReadFile) => settle(() => resolve(read)));
    thread.once('error', (error) => (isTooMuch(error) ? giveUp() : settle(() => reject(error))));
    thread.once('exit', () => settle(() => reject(new Error('The thread that reads a file ended without an answer.'))));
    thread.postMessage(bytes);
  });
}

/** What a file may hold once it is open. */
function mayHold(bytes: Uint8Array): number {
  const packed = bytes.length > 0 && bytes[0] === 0x50 && bytes[1] === 0x4b;
  return packed ? Math.max(FREE_BYTES, bytes.length * MOST_UNPACK_RATIO) : bytes.length;
}

/** The same as `readMapFile`; a large file is read apart, so that it holds up nobody else. */
export async function readApart(
  bytes: Uint8Array,
  thread: Thread = { start: startThread, mostMs: MOST_MS },
): Promise<ReadFile> {
  return mayHold(bytes) <= SMALL_BYTES ? readMapFile(bytes) : readInThread(bytes, thread);
}
