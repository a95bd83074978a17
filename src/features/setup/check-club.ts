import { createHash } from 'node:crypto';
import { setImmediate } from 'node:timers/promises';
import { checkSetup } from '@/core/setup-check/check-setup';
import type { Finding, SetupEffect } from '@/core/setup-check/setup-types';
import { makeWeigher } from '@/core/setup-check/weigh-finding';
import type { ClubScope } from '@/server/scope';
import { type LoadedSetup, loadSetup } from './load-setup';

const MOST_KEPT = 60;

interface Checked {
  mark: string;
  findings: Finding[];
  effects: Promise<(SetupEffect | null)[]> | null;
}

const kept = new Map<string, Checked>();

/** Everything the check and its weighing look at. */
function markOf({ input, ground }: LoadedSetup): string {
  return createHash('sha256')
    .update(JSON.stringify([input, ground]))
    .digest('base64');
}

/** A pause after each lets other requests be answered between. */
async function weighAll({ ground, input }: LoadedSetup, findings: Finding[]): Promise<(SetupEffect | null)[]> {
  const weigh = makeWeigher(ground, input.windows, input.winds);
  const effects: (SetupEffect | null)[] = [];
  for (const finding of findings) {
    await setImmediate();
    effects.push(weigh(finding));
  }
  return effects;
}

async function checked(scope: ClubScope, loaded: LoadedSetup): Promise<Checked> {
  const key = `${scope.club.id} ${scope.club.units}`;
  const mark = markOf(loaded);
  const known = kept.get(key);
  if (known?.mark === mark) return known;
  await setImmediate();
  const fresh: Checked = { mark, findings: checkSetup(loaded.input), effects: null };
  kept.delete(key);
  kept.set(key, fresh);
  for (const oldest of kept.keys()) {
    if (kept.size <= MOST_KEPT) break;
    kept.delete(oldest);
  }
  return fresh;
}

/**
 * A club's findings, kept in the process for as long as all they rest on is the same. A memo only: another process works
 * out the same.
 */
export async function checkClub(scope: ClubScope, now: number): Promise<{ loaded: LoadedSetup; findings: Finding[] }> {
  const loaded = await loadSetup(scope, now);
  return { loaded, findings: (await checked(scope, loaded)).findings };
}

/** The same with what mending each would gain. */
export async function weighClub(scope: ClubScope, now: number) {
  const loaded = await loadSetup(scope, now);
  const known = await checked(scope, loaded);
  known.effects ??= weighAll(loaded, known.findings);
  return { loaded, findings: known.findings, effects: await known.effects };
}
