import { monthOf } from '../day-time';
import { bearingDeg, distanceM, distanceToShapeM, nearestOnShape } from '../geometry';
import { type ScoredFeature, TIMES_OF_DAY, type TimeOfDay, type WindowName } from '../types';
import { formatDistance } from '../units';
import { usesOf } from '../whereabouts';
import { approachFacts, away, featureFacts, makeFinding } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { footPath, isAttraction, standOf, windowsHunted } from './shot-of';

/** When a way is walked for each window: in, then out. */
const WALKED: Record<WindowName, { in: TimeOfDay[]; out: TimeOfDay[] }> = {
  morning: { in: ['night', 'dawn'], out: ['midday'] },
  evening: { in: ['afternoon'], out: ['dusk', 'night'] },
};
const SPOKEN: Record<TimeOfDay, string> = {
  night: 'in the dark',
  dawn: 'at first light',
  morning: 'in the morning',
  midday: 'at midday',
  afternoon: 'in the afternoon',
  dusk: 'at last light',
};

interface Worst {
  window: WindowName;
  leg: 'in' | 'out';
  time: TimeOfDay;
  use: number;
}

function worstTime(feature: ScoredFeature, windows: WindowName[], direction: string, input: SetupInput): Worst | null {
  let worst: Worst | null = null;
  for (const month of new Set(input.days.map(monthOf))) {
    const uses = usesOf(feature, month, input.scoring.whereabouts);
    for (const window of windows) {
      for (const leg of ['in', 'out'] as const) {
        if (direction !== 'both' && direction !== leg) continue;
        for (const time of WALKED[window][leg]) {
          const use = uses[TIMES_OF_DAY.indexOf(time)] ?? 0;
          if (!worst || use > worst.use) worst = { window, leg, time, use };
        }
      }
    }
  }
  return worst;
}

/** Attractions beside a walk at a time when deer are at them. The last of the walk is left out: it must come near what the seat is for. */
export function findBesideApproach(input: SetupInput): Finding[] {
  const { settings, units } = input;
  return input.approaches.flatMap((approach) => {
    const stand = standOf(input, approach.standId);
    const windows = stand ? windowsHunted(stand) : [];
    const path = footPath(approach, settings.seatMarginM);
    if (!stand || windows.length === 0 || path.length === 0) return [];
    return input.features.filter(isAttraction).flatMap((feature) => {
      const gaps = path.map((p) => distanceToShapeM(p, feature.shape));
      const least = Math.min(...gaps);
      if (least > settings.besideM) return [];
      const worst = worstTime(feature, windows, approach.direction, input);
      if (!worst || worst.use < settings.leastUse) return [];
      const at = nearestOnShape(path[gaps.indexOf(least)] ?? stand.at, feature.shape);
      const [metres, bearing] = [distanceM(stand.at, at), bearingDeg(stand.at, at)];
      const movable = feature.kind === 'scrape' || feature.kind === 'water';
      return [
        makeFinding(
          {
            code: 'beside_approach',
            subject: { of: 'feature', id: feature.id, name: feature.name },
            stand: { id: stand.id, name: stand.name },
            at,
            distanceM: metres,
            bearingDeg: bearing,
            text: `${feature.name} lies ${least < 1 ? 'on' : `${formatDistance(least, units)} from`} the walk ${worst.leg} by ${approach.name} to ${stand.name}, ${away(metres, bearing, units)} of the seat`,
            why: `The walk ${worst.leg} for the ${worst.window} passes it ${SPOKEN[worst.time]}, when deer are there ${Math.round(worst.use * 100)} times in a hundred.`,
            acts: [
              { act: 'new_way', text: `Lay ${approach.name} round ${feature.name}` },
              ...(movable ? [{ act: 'move' as const, text: `Move ${feature.name} off ${approach.name}` }] : []),
              { act: 'block', text: `Screen ${approach.name} from ${feature.name}` },
            ],
            trial: {
              change: 'without_features',
              standId: stand.id,
              featureIds: [feature.id],
              window: worst.window,
            },
          },
          [featureFacts(feature), approachFacts(approach), stand.suitability],
        ),
      ];
    });
  });
}
