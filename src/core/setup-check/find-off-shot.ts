import type { ScoredFeature, ScoredStand } from '../ground-types';
import { sectorName } from '../sectors';
import { formatDistance } from '../units';
import { away, featureFacts, makeFinding, standFacts } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { canShoot, isAttraction, isMovable, type Shot, shotOf, windowsHunted, workOn } from './shot-of';
import { OFF_SHOT_WORDS } from './words/attractions';
import { PART_WORDS } from './words/parts';

function actsOf(feature: ScoredFeature, stand: ScoredStand, shot: Shot): Finding['acts'] {
  const first: Finding['acts'][number] = isMovable(feature)
    ? { act: 'take_away', text: PART_WORDS.takeAway(feature.name), work: workOn(feature) }
    : { act: 'block', text: OFF_SHOT_WORDS.block(feature.name, stand.name), work: 'cutting' };
  const lane: Finding['acts'] =
    shot.inRange && shot.side === 'off'
      ? [{ act: 'trim', text: OFF_SHOT_WORDS.trim(stand.name, feature.name), work: 'cutting' }]
      : [];
  const seat = OFF_SHOT_WORDS.moveSeat(stand.name, feature.name);
  return [first, ...lane, { act: 'move_seat', text: seat, work: 'cutting' }];
}

/**
 * Attractions near a seat at which no shot can be had from it: they draw deer past it or round behind it. What cannot be moved
 * counts only behind the seat or off its shot side, and only where no other stand has it in shot.
 */
export function findOffShot(input: SetupInput): Finding[] {
  const { stands, features, settings, units } = input;
  const hunted = stands.filter((stand) => windowsHunted(stand).length > 0);
  const attractions = features.filter(isAttraction);
  return hunted.flatMap((stand) =>
    attractions.flatMap((feature) => {
      const shot = shotOf(stand, feature.shape, input);
      if (shot.metres > settings.pullWithinM || canShoot(shot)) return [];
      const others = hunted.filter((s) => s.id !== stand.id && canShoot(shotOf(s, feature.shape, input)));
      if (!isMovable(feature) && (shot.side === 'fine' || others.length > 0)) return [];
      const otherNames = others.map((s) => s.name);
      return [
        makeFinding(
          {
            code: 'off_shot',
            subject: { of: 'feature', id: feature.id, name: feature.name },
            stand: { id: stand.id, name: stand.name },
            at: shot.nearest,
            distanceM: shot.metres,
            bearingDeg: shot.bearing,
            text: OFF_SHOT_WORDS.text(
              feature.name,
              OFF_SHOT_WORDS.side[shot.side],
              stand.name,
              away(shot.metres, shot.bearing, units),
            ),
            why: OFF_SHOT_WORDS.why(formatDistance(settings.pullWithinM, units), sectorName(shot.bearing), otherNames),
            acts: actsOf(feature, stand, shot),
            trial: { change: 'without_features', standId: stand.id, featureIds: [feature.id], window: null },
          },
          [featureFacts(feature), standFacts(stand)],
        ),
      ];
    }),
  );
}
