import { dayOf } from '@/core/day-time';
import type { GroundInput } from '@/core/rank-input';
import { completeSetup } from '@/core/setup-check/setup-settings';
import type { SetupInput } from '@/core/setup-check/setup-types';
import { loadSeasonHours } from '@/features/coverage/load-season-hours';
import { usualWinds } from '@/features/coverage/usual-winds';
import { listMapItems, loadGround } from '@/features/ground/data';
import type { ClubScope } from '@/server/scope';
import { getSetupSettings } from './settings-data';
import { setupInput } from './setup-input';
import { SETUP_WORDS } from './words/findings';

export interface LoadedSetup {
  input: SetupInput;
  ground: GroundInput;
  /** Whose hours the usual winds are; null: every wind counts the same. */
  windsFrom: string | null;
  /** How many settings of the check the club has of its own. */
  ownSettings: number;
}

/** A club's ground and usual winds as the check takes them. */
export async function loadSetup(scope: ClubScope, now: number): Promise<LoadedSetup> {
  const { club } = scope;
  const [ground, items, season, { own }] = await Promise.all([
    loadGround(scope),
    listMapItems(scope),
    loadSeasonHours(scope, now),
    getSetupSettings(scope),
  ]);
  const winds = usualWinds(season, club);
  const asked = { today: dayOf(now, club.zone), winds, settings: completeSetup(own) };
  return {
    ...setupInput(club, { ground, items }, asked),
    ownSettings: Object.keys(own).length,
    windsFrom: winds ? SETUP_WORDS.windsOf(season.source, season.fromDay ?? '', season.toDay ?? '') : null,
  };
}
