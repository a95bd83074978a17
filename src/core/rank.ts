import { frameGround, type GroundFrame } from './ground-frame';
import type { ScoredStand } from './ground-types';
import type { GroundInput, RankInput } from './rank-input';
import { frameSits } from './sit-frame';
import { judgeSit } from './verdict';
import type { Verdict } from './verdict-types';

/** A club's ground made ready once for many rankings; see rankSits. Holds while the input it was made from is unchanged. */
export function prepareGround(input: GroundInput): GroundFrame {
  return frameGround(input);
}

/** Open before blocked, then by score, then by name and id, so that the order is always the same. */
export function compareVerdicts(names: ReadonlyMap<string, string>): (a: Verdict, b: Verdict) => number {
  return (a, b) => {
    if (a.status !== b.status) return a.status === 'open' ? -1 : 1;
    if (a.score !== b.score) return b.score - a.score;
    const [x, y] = [names.get(a.standId) ?? '', names.get(b.standId) ?? ''];
    if (x !== y) return x < y ? -1 : 1;
    return a.standId < b.standId ? -1 : a.standId > b.standId ? 1 : 0;
  };
}

export function namesOf(stands: ScoredStand[]): Map<string, string> {
  return new Map(stands.map((s) => [s.id, s.name]));
}

/**
 * Every stand in one window, best first, blocked ones last. `prepared` (from prepareGround on the same ground) saves the work
 * that does not depend on the hour. Never throws.
 */
export function rankSits(input: RankInput, prepared: GroundFrame = frameGround(input)): Verdict[] {
  const frame = frameSits(prepared, input.window, input.forecast, input.now, input.detail ?? 'full');
  return prepared.stands
    .map((stand) => judgeSit(frame, stand, input.gatesByStand.get(stand.stand.id) ?? []))
    .sort(compareVerdicts(namesOf(input.stands)));
}
