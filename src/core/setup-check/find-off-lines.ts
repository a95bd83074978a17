import { bearingDeg, distanceM, nearestOnShape } from '../geometry';
import { formatDistance } from '../units';
import { featureFacts, makeFinding } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { gapM, isAttraction, isLine } from './shot-of';

/** Attractions that lie off every line of movement, on a ground that has lines drawn. */
export function findOffLines(input: SetupInput): Finding[] {
  const { settings, units } = input;
  const lines = input.features.filter(isLine);
  if (lines.length === 0) return [];
  return input.features.filter(isAttraction).flatMap((feature) => {
    const near = lines.map((line) => ({ line, gap: gapM(feature.shape, line.shape) })).sort((a, b) => a.gap - b.gap)[0];
    if (!near || near.gap <= settings.offLinesM) return [];
    const origin = near.line.shape.type === 'point' ? near.line.shape.at : { eastM: 0, northM: 0 };
    const at = nearestOnShape(origin, feature.shape);
    const seat = [...input.stands].sort((a, b) => distanceM(a.at, at) - distanceM(b.at, at))[0];
    return [
      makeFinding(
        {
          code: 'off_lines',
          subject: { of: 'feature', id: feature.id, name: feature.name },
          stand: seat ? { id: seat.id, name: seat.name } : null,
          at,
          distanceM: seat ? distanceM(seat.at, at) : null,
          bearingDeg: seat ? bearingDeg(seat.at, at) : null,
          text: `${feature.name} is off every line of movement: the nearest, ${near.line.name}, is ${formatDistance(near.gap, units)} away`,
          why: 'Deer leave the line they should travel to reach it, by a way nobody has drawn or sits on.',
          acts: [
            { act: 'move', text: `Move ${feature.name} to ${near.line.name}, or draw the line deer take to it` },
            ...(feature.kind === 'scrape' ? [{ act: 'take_away' as const, text: `Take away ${feature.name}` }] : []),
          ],
          trial: null,
        },
        [featureFacts(feature), featureFacts(near.line)],
      ),
    ];
  });
}
