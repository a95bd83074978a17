import { type ClubRules, completeRules } from '@/core/booking/rules';
import { type Tx, write } from '@/db/client';
import { AppError, notFound } from '@/server/errors';
import type { ClubScope } from '@/server/scope';
import { auditClub } from './audit-club';
import type { ChangePlaceInput } from './club-schema';
import { getClub, lastClubChange, updateClub } from './data';
import { CLUB_AUDIT } from './words/audit';
import { CLUB_ERRORS } from './words/errors';
import { placeLines, type RuleLine } from './words/place';
import { type ChangedLine, changedLines, describeRules } from './words/rules';

type Club = NonNullable<Awaited<ReturnType<typeof getClub>>>;

interface Save {
  version: number;
  set: Parameters<typeof updateClub>[3];
  action: 'club.rules_changed' | 'club.place_changed';
  /** Begins the summary: 'changed the rules'. */
  did: 'rulesChanged' | 'placeChanged';
  lines: (club: Club) => RuleLine[];
}

/** Two officers may have the page open: the second is told who was first, and overwrites nothing. */
async function saveClub(scope: ClubScope, tx: Tx, save: Save, now: number): Promise<ChangedLine[]> {
  const before = await getClub(scope, tx);
  if (!before) throw notFound();
  if (before.version !== save.version) {
    const who = (await lastClubChange(scope, tx)) ?? CLUB_ERRORS.somebody;
    throw new AppError('conflict', CLUB_ERRORS.changedSince(who));
  }
  const after = { ...before, ...save.set };
  const changed = changedLines(save.lines(before), save.lines(after));
  if (changed.length === 0) return [];
  if (!(await updateClub(scope, tx, save.version, save.set))) throw new Error('The club changed inside a write.');
  await auditClub(
    tx,
    scope,
    {
      action: save.action,
      subjectType: 'club',
      subjectId: scope.club.id,
      summary: CLUB_AUDIT[save.did](scope.actor.name, changed.map((line) => line.label).join(', ')),
      detail: { version: save.version + 1, changed },
    },
    now,
  );
  return changed;
}

export interface SavedClub {
  /** Labels of what differs now; empty: nothing was different. */
  changed: string[];
}

export async function saveRules(
  scope: ClubScope,
  input: { version: number; rules: ClubRules },
  now: number,
): Promise<SavedClub> {
  const { version, rules } = input;
  const changed = await write((tx) =>
    saveClub(
      scope,
      tx,
      {
        version,
        set: { rules },
        action: 'club.rules_changed',
        did: 'rulesChanged',
        lines: (club) => describeRules(completeRules(club.rules), club.units).flatMap((group) => group.lines),
      },
      now,
    ),
  );
  return { changed: changed.map((line) => line.label) };
}

export async function savePlace(scope: ClubScope, input: ChangePlaceInput, now: number): Promise<SavedClub> {
  const { version, name, lat, lon, zone, units } = input;
  const changed = await write((tx) =>
    saveClub(
      scope,
      tx,
      {
        version,
        set: { name, lat, lon, zone, units },
        action: 'club.place_changed',
        did: 'placeChanged',
        lines: placeLines,
      },
      now,
    ),
  );
  return { changed: changed.map((line) => line.label) };
}
