import { sectorName } from '../sectors';
import { mToYd } from '../units';
import { away, featureFacts, makeFinding, standFacts } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { canShoot, isAttraction, type Shot, shotOf, windowsHunted } from './shot-of';

function how(shot: Shot): string {
  if (shot.side === 'behind') return 'behind the seat';
  return shot.side === 'off' ? 'off the shot side' : 'out of range';
}

/** Attractions near a seat at which no shot can be had from it: they draw deer past it or round behind it. */
export function findOffShot(input: SetupInput): Finding[] {
  const { stands, features, settings, units } = input;
  return stands
    .filter((stand) => windowsHunted(stand).length > 0)
    .flatMap((stand) =>
      features.filter(isAttraction).flatMap((feature) => {
        const shot = shotOf(stand, feature.shape, input);
        if (shot.metres > settings.pullWithinM || canShoot(shot)) return [];
        const others = stands.filter((s) => s.id !== stand.id && canShoot(shotOf(s, feature.shape, input)));
        const hunted = others.length > 0 ? ` It is in shot from ${others.map((s) => s.name).join(', ')}.` : '';
        const movable = feature.kind === 'scrape' || feature.kind === 'water';
        const acts: Finding['acts'] = [
          ...(movable
            ? [{ act: 'take_away' as const, text: `Take away ${feature.name}` }]
            : [{ act: 'block' as const, text: `Block the way from ${feature.name} past ${stand.name}` }]),
          { act: 'move_seat', text: `Move or turn ${stand.name} so that ${feature.name} is in shot` },
        ];
        return [
          makeFinding(
            {
              code: 'off_shot',
              subject: { of: 'feature', id: feature.id, name: feature.name },
              stand: { id: stand.id, name: stand.name },
              at: shot.nearest,
              distanceM: shot.metres,
              bearingDeg: shot.bearing,
              text: `${feature.name} lies ${how(shot)} of ${stand.name}, ${away(shot.metres, shot.bearing, units)} of it`,
              why: `What draws deer within ${Math.round(mToYd(settings.pullWithinM))} yd of a seat and gives no shot pulls them ${sectorName(shot.bearing)} of it, where they look back at it and wind it.${hunted}`,
              acts,
              trial: { change: 'without_features', standId: stand.id, featureIds: [feature.id], window: null },
            },
            [featureFacts(feature), standFacts(stand)],
          ),
        ];
      }),
    );
}
