import { readdirSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import type { DoorInfo } from '@/server/doors/info';

const app = resolve(import.meta.dirname, '../../src/app');

export type DoorExport = ((...args: unknown[]) => Promise<unknown>) & { door: DoorInfo };

export interface FoundDoor {
  /** Under src/app. */
  file: string;
  name: string;
  run: DoorExport;
}

/** What Next reads beside the door itself; none of it may depend on who asks. */
const BESIDE_A_DOOR = ['metadata', 'dynamic', 'revalidate', 'runtime', 'maxDuration'];

const isDoor = (value: unknown): value is DoorExport => typeof value === 'function' && 'door' in value;

function sourceFiles(): string[] {
  return readdirSync(app, { recursive: true, encoding: 'utf8' })
    .filter((file) => /\.tsx?$/.test(file) && !/\.test\.tsx?$/.test(file))
    .sort();
}

/** Every file of src/app that answers a request. */
export function filesThatAnswer(): string[] {
  return sourceFiles().filter((file) => /(^|\/)(page\.tsx?|route\.tsx?|actions\.ts)$/.test(file));
}

/** Files that declare server actions anywhere else: there, no test would find them. */
export function hiddenActions(): string[] {
  return sourceFiles()
    .filter((file) => !/(^|\/)actions\.ts$/.test(file))
    .filter((file) => /^\s*['"]use server['"]/m.test(readFileSync(join(app, file), 'utf8')));
}

export interface FoundDoors {
  doors: FoundDoor[];
  /** Exports that answer a request without a door, as file and name. */
  bare: string[];
}

export async function findDoors(): Promise<FoundDoors> {
  const found: FoundDoors = { doors: [], bare: [] };
  for (const file of filesThatAnswer()) {
    const loaded: Record<string, unknown> = await import(join(app, file));
    for (const [name, value] of Object.entries(loaded)) {
      if (isDoor(value)) found.doors.push({ file, name, run: value });
      else if (!BESIDE_A_DOOR.includes(name)) found.bare.push(`${file} ${name}`);
    }
  }
  return found;
}
