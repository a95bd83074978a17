import type { ScoredFeature, ScoredStand } from '../ground-types';
import { away, featureFacts, makeFinding, standFacts } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import {
  canShoot,
  carries,
  isAttraction,
  isMade,
  isMovable,
  type Shot,
  shotOf,
  windowsHunted,
  windsHunted,
  workOn,
} from './shot-of';
import { UNHUNTABLE_WORDS } from './words/attractions';
import { PART_WORDS } from './words/parts';

interface InShot {
  stand: ScoredStand;
  shot: Shot;
}

function huntable({ stand, shot }: InShot, scentDeg: number): boolean {
  if (shot.metres < 5) return true;
  return windowsHunted(stand).some((window) =>
    windsHunted(stand, window).some((point) => !carries(point * 22.5, shot.bearing, scentDeg)),
  );
}

function tell(feature: ScoredFeature, nearest: InShot, shots: InShot[], input: SetupInput): Finding {
  const { stand, shot } = nearest;
  const far = away(shot.metres, shot.bearing, input.units);
  const reached = shots.length > 0;
  const names = shots.map((s) => s.stand.name);
  return makeFinding(
    {
      code: 'unhuntable',
      subject: { of: 'feature', id: feature.id, name: feature.name },
      stand: { id: stand.id, name: stand.name },
      at: shot.nearest,
      distanceM: shot.metres,
      bearingDeg: shot.bearing,
      text: reached
        ? UNHUNTABLE_WORDS.noWind(feature.name, names)
        : UNHUNTABLE_WORDS.noStand(feature.name, stand.name, far),
      why: reached ? UNHUNTABLE_WORDS.whyNoWind : UNHUNTABLE_WORDS.whyNoStand,
      acts: [
        { act: 'move_seat', text: UNHUNTABLE_WORDS.hangSeat(feature.name), work: 'cutting' },
        ...(isMovable(feature)
          ? [{ act: 'take_away' as const, text: PART_WORDS.takeAway(feature.name), work: workOn(feature) }]
          : []),
      ],
      trial: reached ? { change: 'without_features', standId: stand.id, featureIds: [feature.id], window: null } : null,
    },
    [featureFacts(feature), ...(reached ? shots : [nearest]).map((s) => standFacts(s.stand))],
  );
}

/** Attractions in shot of stands on none of their winds, and what a club made that is in shot of no stand at all. */
export function findUnhuntable(input: SetupInput): Finding[] {
  const { stands, settings } = input;
  const hunted = stands.filter((stand) => windowsHunted(stand).length > 0);
  if (hunted.length === 0) return [];
  return input.features.filter(isAttraction).flatMap((feature) => {
    const all = hunted
      .map((stand) => ({ stand, shot: shotOf(stand, feature.shape, input) }))
      .sort((a, b) => a.shot.metres - b.shot.metres || a.stand.id.localeCompare(b.stand.id));
    const shots = all.filter(({ shot }) => canShoot(shot));
    if (shots.some((one) => huntable(one, settings.scentDeg))) return [];
    if (shots.length === 0 && !isMade(feature)) return [];
    const nearest = shots[0] ?? all[0];
    return nearest ? [tell(feature, nearest, shots, input)] : [];
  });
}
