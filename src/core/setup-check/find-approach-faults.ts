import { monthOf } from '../day-time';
import { bearingDeg, distanceM, distanceToShapeM, nearestOnShape } from '../geometry';
import { type Point, type ScoredApproach, type ScoredFeature, type ScoredStand, TIMES_OF_DAY } from '../ground-types';
import { usesOf } from '../whereabouts';
import { approachFacts, away, featureFacts, makeFinding, standFacts } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { carries, footPath, isBed, isLine, nearness, standOf, windowsHunted, windsHunted } from './shot-of';
import { PART_WORDS } from './words/parts';
import { WAY_WORDS } from './words/walks';

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

function meetings(path: Point[], line: Point[]): Point[] {
  return path.slice(1).flatMap((to, i) =>
    line.slice(1).flatMap((end, k) => {
      const at = meet(path[i] as Point, to, line[k] as Point, end);
      return at ? [at] : [];
    }),
  );
}

interface Crossing {
  line: ScoredFeature;
  at: Point;
}
interface Windward {
  bed: ScoredFeature;
  share: number;
  at: Point;
}
interface WayFaults {
  approach: ScoredApproach;
  stand: ScoredStand;
  crossings: Crossing[];
  beds: Windward[];
  /** Beds in reach of the walk, whatever the wind. */
  near: ScoredFeature[];
}

/** Whether deer come along a line, in a window the stand is hunted in, often enough that a track across it matters. */
function isTravelled(line: ScoredFeature, stand: ScoredStand, { days, scoring, settings }: SetupInput): boolean {
  const times = windowsHunted(stand).flatMap((w) =>
    w === 'morning' ? (['dawn', 'morning'] as const) : (['afternoon', 'dusk'] as const),
  );
  return days.some((day) => {
    const uses = usesOf(line, monthOf(day), scoring.whereabouts);
    return times.some((time) => (uses[TIMES_OF_DAY.indexOf(time)] ?? 0) >= settings.leastUse);
  });
}

/** The first dry place at which a way on foot crosses each line deer travel. */
function crossingsOf(approach: ScoredApproach, stand: ScoredStand, input: SetupInput): Crossing[] {
  const path = approach.points.slice(approach.vehicleToIndex);
  const mayMeet = nearness(path);
  const waters = input.features.filter(({ kind }) => kind === 'water');
  const isWet = (p: Point) => waters.some((water) => distanceToShapeM(p, water.shape) <= input.settings.wadeM);
  return input.features.filter(isLine).flatMap((line) => {
    if (line.shape.type !== 'line' || !mayMeet(line.shape, 0) || !isTravelled(line, stand, input)) return [];
    const at = meetings(path, line.shape.points).find((p) => !isWet(p));
    return at ? [{ line, at }] : [];
  });
}

/** Share of the winds a stand is hunted on, as usual as they are, that carry a walk's scent to a bed, and where it is nearest. */
function windward(stand: ScoredStand, path: Point[], bed: ScoredFeature, input: SetupInput): Windward[] {
  const { settings, winds } = input;
  const near = path
    .map((p) => ({ p, to: nearestOnShape(p, bed.shape) }))
    .map(({ p, to }) => ({ p, metres: distanceM(p, to), bearing: bearingDeg(p, to) }))
    .filter(({ metres }) => metres <= settings.bedsWithinM);
  const nearest = [...near].sort((a, b) => a.metres - b.metres)[0];
  if (!nearest) return [];
  let [hunted, carried] = [0, 0];
  for (const window of windowsHunted(stand)) {
    for (const point of windsHunted(stand, window)) {
      const weight = winds ? (winds[window][point] ?? 0) : 1 / 16;
      hunted += weight;
      if (near.some((n) => n.metres < 1 || carries(point * 22.5, n.bearing, settings.scentDeg))) carried += weight;
    }
  }
  const share = hunted > 0 ? carried / hunted : 0;
  return share >= settings.upwindShare ? [{ bed, share, at: nearest.p }] : [];
}

function actsOf({ approach, stand, crossings, beds }: WayFaults, input: SetupInput): Finding['acts'] {
  const others = input.approaches.filter((a) => a.standId === stand.id && a.id !== approach.id);
  const bed = beds[0]?.bed;
  const line = crossings[0]?.line.name ?? WAY_WORDS.theLine;
  return [
    ...others.map((other): Finding['acts'][number] => ({
      act: 'other_time',
      text: WAY_WORDS.otherWay(approach.name, stand.name, other.name),
      work: null,
    })),
    {
      act: 'new_way',
      text: bed ? WAY_WORDS.layDownwind(approach.name, bed.name) : WAY_WORDS.layClear(approach.name, line),
      work: 'cutting',
    },
    bed
      ? { act: 'move_seat', text: WAY_WORDS.pickWinds(stand.name, bed.name), work: null }
      : { act: 'move', text: WAY_WORDS.leadRound(line, approach.name), work: 'cutting' },
  ];
}

/** Ways that cross the same lines at one place are told together, in the name of the stand nearest to it. */
function tell(group: WayFaults[], input: SetupInput): Finding {
  const first = group[0] as WayFaults;
  const { approach, stand, crossings, beds } = first;
  const worst = [...beds].sort((a, b) => b.share - a.share)[0];
  const at = worst?.at ?? (crossings[0] as Crossing).at;
  const [metres, bearing] = [distanceM(stand.at, at), bearingDeg(stand.at, at)];
  const lines = crossings.map(({ line }) => line.name);
  const others = group.slice(1).map((w) => PART_WORDS.wayTo(w.approach.name, w.stand.name));
  const why = [
    worst && WAY_WORDS.whyUpwind,
    lines.length > 0 && WAY_WORDS.whyCrosses,
    others.length > 0 && WAY_WORDS.soDoOthers(others),
  ];
  const found = makeFinding(
    {
      code: worst ? 'approach_upwind' : 'approach_crosses',
      subject: { of: 'approach', id: approach.id, name: approach.name },
      stand: { id: stand.id, name: stand.name },
      also: group.slice(1).flatMap((w) => (w.stand.id === stand.id ? [] : [{ id: w.stand.id, name: w.stand.name }])),
      at,
      distanceM: metres,
      bearingDeg: bearing,
      text: worst
        ? WAY_WORDS.upwind({
            way: approach.name,
            beds: beds.map(({ bed }) => bed.name),
            share: Math.round(worst.share * 100),
            stand: stand.name,
            lines,
          })
        : WAY_WORDS.crosses(approach.name, lines, away(metres, bearing, input.units), stand.name),
      why: why.filter(Boolean).join(' '),
      acts: actsOf(first, input),
      trial: { change: 'without_approach', standId: stand.id, approachId: approach.id, window: null },
    },
    group.map((w) => [
      approachFacts(w.approach),
      standFacts(w.stand),
      w.crossings.map(({ line }) => featureFacts(line)),
      w.near.map(featureFacts),
    ]),
  );
  // Neither key nor print may hang on the season's winds: an answer holds until the ground changes.
  return { ...found, key: `way:${group.map((w) => w.approach.id).join(':')}` };
}

function isSamePlace(a: WayFaults, b: WayFaults, withinM: number): boolean {
  if (a.beds.length > 0 || b.beds.length > 0 || a.crossings.length !== b.crossings.length) return false;
  return a.crossings.every((c) => b.crossings.some((d) => d.line.id === c.line.id && distanceM(c.at, d.at) <= withinM));
}

/**
 * Ways on foot that cross lines while deer travel them, but in water, or that run upwind of bedding on most of the winds their stand
 * is hunted on: one finding a way, or one for all that cross at one place.
 */
export function findApproachFaults(input: SetupInput): Finding[] {
  const faults = input.approaches.flatMap((approach): WayFaults[] => {
    const stand = standOf(input, approach.standId);
    if (!stand || windowsHunted(stand).length === 0) return [];
    const path = footPath(approach, 0);
    const mayReach = nearness(path);
    const { bedsWithinM } = input.settings;
    const near = input.features.filter(
      (f) =>
        isBed(f) && mayReach(f.shape, bedsWithinM) && path.some((p) => distanceToShapeM(p, f.shape) <= bedsWithinM),
    );
    const beds = near.flatMap((bed) => windward(stand, path, bed, input));
    const crossings = crossingsOf(approach, stand, input);
    return beds.length + crossings.length > 0 ? [{ approach, stand, crossings, beds, near }] : [];
  });
  const far = ({ stand, crossings }: WayFaults) => distanceM(stand.at, crossings[0]?.at ?? stand.at);
  const left = faults.sort((a, b) => far(a) - far(b) || a.approach.id.localeCompare(b.approach.id));
  const groups: WayFaults[][] = [];
  for (const one of left) {
    const group = groups.find((g) => isSamePlace(g[0] as WayFaults, one, input.settings.besideM));
    if (group) group.push(one);
    else groups.push([one]);
  }
  return groups.map((group) => tell(group, input));
}
