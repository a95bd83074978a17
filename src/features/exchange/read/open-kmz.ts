import { Unzip, UnzipInflate } from 'fflate';
import { FILE_PROBLEMS } from '../words/files';
import { FileProblem } from './file-problem';
import { FREE_BYTES, MOST_ENTRIES, MOST_UNPACK_RATIO, MOST_UNPACKED_BYTES } from './limits';

const STEP = 64 * 1024;

interface Unpacked {
  chunks: Uint8Array[];
  done: boolean;
}

/**
 * Every KML of an archive: some programs put one layer to a file. Only these are unpacked, a piece at a time, and counted
 * as they come: what the archive says of its own sizes is not believed.
 */
export function openKmz(bytes: Uint8Array): Uint8Array[] {
  const found: Unpacked[] = [];
  let length = 0;
  let entries = 0;
  let problem: string | null = null;
  const most = Math.min(MOST_UNPACKED_BYTES, Math.max(FREE_BYTES, bytes.length * MOST_UNPACK_RATIO));
  const unzip = new Unzip((entry) => {
    entries += 1;
    if (entries > MOST_ENTRIES) problem ??= FILE_PROBLEMS.entries(MOST_ENTRIES);
    if (problem || !/\.kml$/i.test(entry.name)) return;
    const own: Unpacked = { chunks: [], done: false };
    found.push(own);
    entry.ondata = (error, chunk, final) => {
      if (error) problem ??= FILE_PROBLEMS.damagedKml;
      if (problem) return;
      length += chunk.length;
      if (length > most) problem = FILE_PROBLEMS.unpacked;
      else own.chunks.push(chunk);
      own.done ||= final;
    };
    entry.start();
  });
  unzip.register(UnzipInflate);
  try {
    for (let at = 0; at < bytes.length && !problem; at += STEP) {
      unzip.push(bytes.subarray(at, at + STEP), at + STEP >= bytes.length);
    }
  } catch {
    problem ??= FILE_PROBLEMS.damaged;
  }
  if (problem) throw new FileProblem(problem);
  if (found.length === 0) throw new FileProblem(FILE_PROBLEMS.noKml);
  if (found.some(({ done }) => !done)) throw new FileProblem(FILE_PROBLEMS.cutShort);
  return found.map(({ chunks }) => Buffer.concat(chunks));
}
