import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Debian: gdal-bin. */
export const HAS_GDAL = spawnSync('ogr2ogr', ['--version']).status === 0;

/** One of GDAL's own commands, in a folder of its own with the files given; gives a file it wrote, or what it printed. */
export function runGdal(
  command: string,
  args: string[],
  files: Record<string, string | Uint8Array>,
  wanted?: string,
): Buffer {
  const folder = mkdtempSync(join(tmpdir(), 'windrest-gdal-'));
  try {
    for (const [name, body] of Object.entries(files)) writeFileSync(join(folder, name), body);
    const done = spawnSync(command, args, { cwd: folder, maxBuffer: 64 * 1024 * 1024 });
    if (done.status !== 0) throw new Error(`${command} ${args.join(' ')} failed: ${done.stderr}`);
    return wanted === undefined ? done.stdout : readFileSync(join(folder, wanted));
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}
