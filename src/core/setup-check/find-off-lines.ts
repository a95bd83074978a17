import { bearingDeg, distanceM, nearestOnShape } from '../geometry';
import { formatDistance } from '../units';
import { featureFacts, makeFinding } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { gapM, isAttraction, isLine, isMovable, workOn } from './shot-of';
import { OFF_LINES_WORDS } from './words/attractions';
import { PART_WORDS } from './words/parts';

/** Attractions off every line of movement, themselves and all in their opening, on a ground that has lines drawn. */
export function findOffLines(input: SetupInput): Finding[] {
  const { settings, units } = input;
  const lines = input.features.filter(isLine);
  if (lines.length === 0) return [];
  const attractions = input.features.filter(isAttraction);
  const onLine = attractions.filter((f) => lines.some((line) => gapM(f.shape, line.shape) <= settings.offLinesM));
  return attractions.flatMap((feature) => {
    if (onLine.some((f) => gapM(feature.shape, f.shape) <= settings.openingM)) return [];
    const near = lines.map((line) => ({ line, gap: gapM(feature.shape, line.shape) })).sort((a, b) => a.gap - b.gap)[0];
    if (!near) return [];
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
          text: OFF_LINES_WORDS.text(feature.name, near.line.name, formatDistance(near.gap, units)),
          why: OFF_LINES_WORDS.why,
          acts: [
            ...(isMovable(feature)
              ? [
                  {
                    act: 'move' as const,
                    text: OFF_LINES_WORDS.move(feature.name, near.line.name),
                    work: workOn(feature),
                  },
                ]
              : []),
            { act: 'draw_line', text: OFF_LINES_WORDS.drawLine(feature.name), work: null },
            ...(isMovable(feature)
              ? [{ act: 'take_away' as const, text: PART_WORDS.takeAway(feature.name), work: workOn(feature) }]
              : []),
          ],
          trial: null,
        },
        [featureFacts(feature), featureFacts(near.line)],
      ),
    ];
  });
}
