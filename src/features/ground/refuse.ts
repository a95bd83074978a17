import { formatDay } from '@/core/day-time';
import { SIT_WINDOW_WORDS } from '@/core/words/windows';
import type { ReadFrom } from '@/db/client';
import { AppError } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { type BookedSit, lastChangedBy } from './people-data';
import { GROUND_ERRORS, namesAndMore } from './words/errors';

/** Somebody saved the same thing after it was opened: says who. */
export async function changedSince(
  scope: ClubScope,
  thing: { id: string; name: string },
  from: ReadFrom,
): Promise<AppError> {
  const who = (await lastChangedBy(scope, thing.id, from)) ?? GROUND_ERRORS.somebody;
  return new AppError('conflict', GROUND_ERRORS.changedSince(who, thing.name, thing.name));
}

/** Names are one of a kind in a club, whatever their case. */
export function refuseTakenName(
  kept: { id: string; name: string }[],
  name: string,
  refusal: (name: string) => string,
  ownId?: string,
): void {
  const taken = kept.find((row) => row.id !== ownId && row.name.toLowerCase() === name.toLowerCase());
  if (!taken) return;
  const message = refusal(taken.name);
  throw new AppError('conflict', message, { fields: { name: message } });
}

const MOST_NAMED = 5;

/** 'Sat 7 Nov morning (Dale)', at most five and how many more. */
export function namedSits(sits: BookedSit[]): string {
  const named = sits
    .slice(0, MOST_NAMED)
    .map((s) => `${formatDay(s.day)} ${SIT_WINDOW_WORDS[s.windows]} (${s.memberName})`);
  return namesAndMore(named, sits.length - named.length);
}

/** The fields that differ, before and after, for the audit log. */
export function changes(before: object, after: object): Record<string, unknown> {
  const old = new Map(Object.entries(before));
  const changed = Object.entries(after).filter(
    ([key, value]) => JSON.stringify(old.get(key)) !== JSON.stringify(value),
  );
  return {
    before: Object.fromEntries(changed.map(([key]) => [key, old.get(key) ?? null])),
    after: Object.fromEntries(changed),
  };
}
