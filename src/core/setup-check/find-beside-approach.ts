import type { WindowName } from '../condition-types';
import { monthOf } from '../day-time';
import { bearingDeg, distanceM, distanceToShapeM, nearestOnShape } from '../geometry';
import {
  type Point,
  type ScoredApproach,
  type ScoredFeature,
  type ScoredStand,
  TIMES_OF_DAY,
  type TimeOfDay,
} from '../ground-types';
import { formatDistance } from '../units';
import { usesOf } from '../whereabouts';
import { approachFacts, away, featureFacts, makeFinding } from './make-finding';
import type { Finding, SetupInput } from './setup-types';
import { footPath, isAttraction, isMovable, nearness, standOf, windowsHunted, workOn } from './shot-of';
import { PART_WORDS } from './words/parts';
import { BESIDE_WORDS } from './words/walks';

type Leg = 'in' | 'out';

/** When a way is walked for each window, and the later time at which it may be walked in instead. */
const WALKED: Record<WindowName, { in: TimeOfDay[]; out: TimeOfDay[]; later: TimeOfDay }> = {
  morning: { in: ['night', 'dawn'], out: ['midday'], later: 'morning' },
  evening: { in: ['afternoon'], out: ['dusk', 'night'], later: 'midday' },
};

/** A way that passes a place at a time when deer are at it. */
interface Pass {
  approach: ScoredApproach;
  stand: ScoredStand;
  feature: ScoredFeature;
  gapM: number;
  at: Point;
  window: WindowName;
  leg: Leg;
  time: TimeOfDay;
  use: number;
}

const goes = ({ direction }: ScoredApproach, leg: Leg) => direction === 'both' || direction === leg;

/** The most deer use a place at a time of day, over the months hunted; 0-1. */
function mostUse(feature: ScoredFeature, time: TimeOfDay, { days, scoring }: SetupInput): number {
  const months = [...new Set(days.map(monthOf))];
  return Math.max(
    0,
    ...months.map((month) => usesOf(feature, month, scoring.whereabouts)[TIMES_OF_DAY.indexOf(time)] ?? 0),
  );
}

interface Walk {
  approach: ScoredApproach;
  stand: ScoredStand;
  path: Point[];
  mayPass: ReturnType<typeof nearness>;
}

function passesOf({ approach, stand, path, mayPass }: Walk, feature: ScoredFeature, input: SetupInput): Pass[] {
  const { besideM, leastUse } = input.settings;
  if (!mayPass(feature.shape, besideM)) return [];
  const gaps = path.map((p) => distanceToShapeM(p, feature.shape));
  const gapM = Math.min(Number.POSITIVE_INFINITY, ...gaps);
  if (gapM > besideM) return [];
  const at = nearestOnShape(path[gaps.indexOf(gapM)] ?? stand.at, feature.shape);
  return windowsHunted(stand).flatMap((window) =>
    (['in', 'out'] as const)
      .filter((leg) => goes(approach, leg))
      .flatMap((leg) =>
        WALKED[window][leg]
          .map((time) => ({
            approach,
            stand,
            feature,
            gapM,
            at,
            window,
            leg,
            time,
            use: mostUse(feature, time, input),
          }))
          .filter(({ use }) => use >= leastUse),
      ),
  );
}

/** Another way of the stand, walked for the same, that passes nothing deer are at then. */
function otherWay({ approach, stand, window, leg }: Pass, passes: Pass[], input: SetupInput): ScoredApproach | null {
  const busy = (a: ScoredApproach) =>
    passes.some((p) => p.approach.id === a.id && p.window === window && p.leg === leg);
  return (
    input.approaches.find((a) => a.standId === stand.id && a.id !== approach.id && goes(a, leg) && !busy(a)) ?? null
  );
}

function mayWait({ feature, window, leg }: Pass, input: SetupInput): boolean {
  return leg === 'in' && mostUse(feature, WALKED[window].later, input) < input.settings.leastUse;
}

function actsOf(pass: Pass, passes: Pass[], input: SetupInput): Finding['acts'] {
  const { approach, feature, stand, window } = pass;
  const other = otherWay(pass, passes, input);
  const acts: Finding['acts'] = [];
  if (other) {
    acts.push({ act: 'new_way', text: BESIDE_WORDS.otherWay(pass.leg, stand.name, other.name), work: null });
  }
  if (mayWait(pass, input)) {
    acts.push({ act: 'other_time', text: BESIDE_WORDS.walkLater(feature.name, window), work: null });
  }
  if (isMovable(feature)) {
    acts.push({ act: 'move', text: BESIDE_WORDS.move(feature.name, approach.name), work: workOn(feature) });
  }
  acts.push({ act: 'new_way', text: BESIDE_WORDS.layRound(approach.name, feature.name), work: 'cutting' });
  acts.push({ act: 'block', text: BESIDE_WORDS.screen(approach.name, feature.name), work: 'planting' });
  return acts;
}

function tell(feature: ScoredFeature, all: Pass[], passes: Pass[], input: SetupInput): Finding {
  const { units } = input;
  const ranked = [...all].sort(
    (a, b) => b.use - a.use || a.gapM - b.gapM || a.approach.id.localeCompare(b.approach.id),
  );
  const worst = ranked[0] as Pass;
  const { stand, approach, gapM, leg, window, use, time } = worst;
  const ways = [...new Map(ranked.map((p) => [p.approach.id, p])).values()];
  const [metres, bearing] = [distanceM(stand.at, worst.at), bearingDeg(stand.at, worst.at)];
  const others = ways.slice(1).map((w) => PART_WORDS.wayTo(w.approach.name, w.stand.name));
  const also = [...new Map(ways.map((w) => [w.stand.id, { id: w.stand.id, name: w.stand.name }])).values()];
  const other = otherWay(worst, passes, input);
  const found = makeFinding(
    {
      code: 'beside_approach',
      subject: { of: 'feature', id: feature.id, name: feature.name },
      stand: { id: stand.id, name: stand.name },
      also: also.filter(({ id }) => id !== stand.id),
      at: worst.at,
      distanceM: metres,
      bearingDeg: bearing,
      text: BESIDE_WORDS.text({
        feature: feature.name,
        gap: gapM < 1 ? null : formatDistance(gapM, units),
        leg,
        way: approach.name,
        stand: stand.name,
        away: away(metres, bearing, units),
      }),
      why: BESIDE_WORDS.why({ leg, window, time, inHundred: Math.round(use * 100), others }),
      acts: actsOf(worst, passes, input),
      trial:
        other && !isMovable(feature)
          ? { change: 'without_approach', standId: stand.id, approachId: approach.id, window }
          : { change: 'without_features', standId: stand.id, featureIds: [feature.id], window },
    },
    [featureFacts(feature), ...ways.map((w) => [approachFacts(w.approach), w.stand.suitability])],
  );
  return { ...found, key: `beside_approach:${feature.id}` };
}

/**
 * Attractions beside walks at a time when deer are at them, each told once with all its walks. The last of a walk is left out: it
 * must come near what the seat is for. What cannot be moved counts only where another way or another time would pass it by; ways
 * told for a graver fault (`toldWays`) are not told again for it.
 */
export function findBesideApproach(input: SetupInput, toldWays: ReadonlySet<string> = new Set()): Finding[] {
  const attractions = input.features.filter(isAttraction);
  const passes = input.approaches.flatMap((approach) => {
    const stand = standOf(input, approach.standId);
    if (!stand) return [];
    const path = footPath(approach, input.settings.seatMarginM);
    const walk = { approach, stand, path, mayPass: nearness(path) };
    return attractions.flatMap((feature) => passesOf(walk, feature, input));
  });
  return attractions.flatMap((feature) => {
    const counted = passes.filter(
      (pass) =>
        pass.feature.id === feature.id &&
        (isMovable(feature) ||
          (!toldWays.has(pass.approach.id) && (otherWay(pass, passes, input) !== null || mayWait(pass, input)))),
    );
    return counted.length > 0 ? [tell(feature, counted, passes, input)] : [];
  });
}
