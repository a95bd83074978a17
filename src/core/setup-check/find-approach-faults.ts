import { bearingDeg, distanceM, nearestOnShape } from '../geometry';
import type { Point, ScoredApproach, ScoredFeature, ScoredStand } from '../types';
import { approachFacts, away, featureFacts, makeFinding, standFacts } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { carries, footPath, isBed, isLine, standOf, windowsHunted, windsHunted } from './shot-of';

/** Where two segments meet; null when they do not. */
function meet(a: Point, b: Point, c: Point, d: Point): Point | null {
  const [rx, ry] = [b.eastM - a.eastM, b.northM - a.northM];
  const [sx, sy] = [d.eastM - c.eastM, d.northM - c.northM];
  const cross = rx * sy - ry * sx;
  if (cross === 0) return null;
  const t = ((c.eastM - a.eastM) * sy - (c.northM - a.northM) * sx) / cross;
  const u = ((c.eastM - a.eastM) * ry - (c.northM - a.northM) * rx) / cross;
  return t >= 0 && t <= 1 && u >= 0 && u <= 1 ? { eastM: a.eastM + t * rx, northM: a.northM + t * ry } : null;
}

function crossing(path: Point[], line: Point[]): Point | null {
  for (let i = 1; i < path.length; i++) {
    for (let k = 1; k < line.length; k++) {
      const at = meet(path[i - 1] as Point, path[i] as Point, line[k - 1] as Point, line[k] as Point);
      if (at) return at;
    }
  }
  return null;
}

type Fault = Pick<Finding, 'code' | 'at' | 'text' | 'why' | 'acts'>;

function tell(approach: ScoredApproach, stand: ScoredStand, feature: ScoredFeature, fault: Fault): Finding {
  const found = makeFinding(
    {
      ...fault,
      subject: { of: 'approach', id: approach.id, name: approach.name },
      stand: { id: stand.id, name: stand.name },
      distanceM: distanceM(stand.at, fault.at),
      bearingDeg: bearingDeg(stand.at, fault.at),
      trial: { change: 'without_approach', standId: stand.id, approachId: approach.id, window: null },
    },
    [featureFacts(feature), approachFacts(approach), standFacts(stand)],
  );
  return { ...found, key: `${found.key}:${feature.id}` };
}

/** Ways on foot that cross a line deer travel. */
export function findCrossings(input: SetupInput): Finding[] {
  return input.approaches.flatMap((approach) => {
    const stand = standOf(input, approach.standId);
    if (!stand || windowsHunted(stand).length === 0) return [];
    const path = approach.points.slice(approach.vehicleToIndex);
    return input.features.filter(isLine).flatMap((line) => {
      const at = line.shape.type === 'line' ? crossing(path, line.shape.points) : null;
      if (!at) return [];
      const far = away(distanceM(stand.at, at), bearingDeg(stand.at, at), input.units);
      return [
        tell(approach, stand, line, {
          code: 'approach_crosses',
          at,
          text: `${approach.name} crosses ${line.name} ${far} of ${stand.name}`,
          why: 'Ground scent stays where a person crosses: deer that come along the line later stop at it or turn.',
          acts: [
            { act: 'new_way', text: `Lay ${approach.name} so that it does not cross ${line.name}` },
            { act: 'move', text: `Lead ${line.name} round ${approach.name} with brush or a fence gap` },
          ],
        }),
      ];
    });
  });
}

/** Share of the winds a stand is hunted on, as usual as they are, that carry a walk's scent to a bed, and where most. */
function upwindShare(stand: ScoredStand, path: Point[], bed: ScoredFeature, input: SetupInput) {
  const { settings, winds } = input;
  const near = path
    .map((p) => ({ p, to: nearestOnShape(p, bed.shape) }))
    .map(({ p, to }) => ({ p, metres: distanceM(p, to), bearing: bearingDeg(p, to) }))
    .filter(({ metres }) => metres <= settings.bedsWithinM);
  let [hunted, carried] = [0, 0];
  for (const window of windowsHunted(stand)) {
    for (const point of windsHunted(stand, window)) {
      const weight = winds ? (winds[window][point] ?? 0) : 1 / 16;
      hunted += weight;
      if (near.some((n) => n.metres < 1 || carries(point * 22.5, n.bearing, settings.scentDeg))) carried += weight;
    }
  }
  const at = [...near].sort((a, b) => a.metres - b.metres)[0]?.p ?? null;
  return { share: hunted > 0 ? carried / hunted : 0, at };
}

/** Ways on foot that run upwind of bedding on most of the winds their stand is hunted on. */
export function findUpwindWays(input: SetupInput): Finding[] {
  return input.approaches.flatMap((approach) => {
    const stand = standOf(input, approach.standId);
    if (!stand || windowsHunted(stand).length === 0) return [];
    const path = footPath(approach, 0);
    return input.features.filter(isBed).flatMap((bed) => {
      const { share, at } = upwindShare(stand, path, bed, input);
      if (!at || share < input.settings.upwindShare) return [];
      return [
        tell(approach, stand, bed, {
          code: 'approach_upwind',
          at,
          text: `${approach.name} runs upwind of ${bed.name} on ${Math.round(share * 100)} % of the winds ${stand.name} is hunted on`,
          why: 'Scent of the walk goes into the beds before the sit begins, whatever the seat itself does.',
          acts: [
            { act: 'new_way', text: `Lay ${approach.name} downwind of ${bed.name}` },
            { act: 'move_seat', text: `Hunt ${stand.name} only on winds that keep the walk off ${bed.name}` },
          ],
        }),
      ];
    });
  });
}
