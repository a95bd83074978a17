import { buildWalkGround, circleOf, type FeatureCircle, type WalkGround } from './approach/walk-ground';
import { type WalkPlumes, walkPlumes } from './approach/walk-scent';
import { distanceM } from './geometry';
import type { ScoredApproach, ScoredFeature, ScoredStand } from './ground-types';
import { type NearEvent, nearEvents } from './pressure';
import { featuresInRange, type InRange } from './promise/in-range';
import { clubRate, shrunkRate, sightingsFactor } from './promise/sightings';
import type { GroundInput } from './rank-input';
import { type SourceGeometry, scentGround, sourceGeometry } from './scent/scent-ground';
import { thinCrowded, usesOf, type WhereaboutsSettings } from './whereabouts';

/** A stand with all about it that does not depend on the hour. */
export interface StandFrame {
  stand: ScoredStand;
  inRange: InRange[];
  near: NearEvent[];
  sightings: { factor: number; ratePerHour: number };
  waysIn: WalkGround[];
  waysOut: WalkGround[];
  seat: SourceGeometry;
}

/** A club's ground prepared for scoring; good for as long as the input it was made from. */
export interface GroundFrame {
  input: GroundInput;
  clubRatePerHour: number;
  stands: StandFrame[];
  plumes: WalkPlumes;
  /** Uses of every feature in a month by time of day, thinned where features crowd. */
  usesIn: (month: number) => number[][];
}

/** For each feature the features within so many metres of it, centre to centre, itself among them. */
function neighbours(circles: FeatureCircle[], withinM: number): Int32Array[] {
  return circles.map((a) => {
    const near: number[] = [];
    circles.forEach((b, i) => {
      if (distanceM(a.centre, b.centre) <= withinM) near.push(i);
    });
    return Int32Array.from(near);
  });
}

function usesByMonth(features: ScoredFeature[], circles: FeatureCircle[], s: WhereaboutsSettings) {
  const near = neighbours(circles, s.crowdM);
  const kept = new Map<number, number[][]>();
  return (month: number): number[][] => {
    let known = kept.get(month);
    if (!known) {
      known = thinCrowded(
        features.map((f) => usesOf(f, month, s)),
        near,
        s,
      );
      kept.set(month, known);
    }
    return known;
  };
}

function byStand<T extends { standId: string }>(rows: T[]): Map<string, T[]> {
  const map = new Map<string, T[]>();
  for (const row of rows) {
    const list = map.get(row.standId);
    if (list) list.push(row);
    else map.set(row.standId, [row]);
  }
  return map;
}

export function frameGround(input: GroundInput): GroundFrame {
  const { settings, features } = input;
  const scent = scentGround(features, settings.scent);
  const circles = features.map(circleOf);
  const approaches = byStand(input.approaches);
  const logs = new Map(input.sightings.map((row) => [row.standId, row]));
  const clubRatePerHour = clubRate(input.sightings, settings.promise);
  const walkOf = (a: ScoredApproach) => buildWalkGround(a, features, circles, settings.approach);
  const stands = input.stands.map((stand): StandFrame => {
    const log = logs.get(stand.id) ?? null;
    const walks = (approaches.get(stand.id) ?? []).filter((a) => a.points.length > 0).map(walkOf);
    const waysIn = walks.filter((w) => w.approach.direction !== 'out');
    const waysOut = walks.filter((w) => w.approach.direction !== 'in');
    return {
      stand,
      inRange: featuresInRange(stand, features, input.weapon, settings.promise),
      near: nearEvents(stand.at, input.events, settings.pressure),
      sightings: {
        factor: sightingsFactor(log, clubRatePerHour, settings.promise),
        ratePerHour: shrunkRate(log, clubRatePerHour, settings.promise.sightingsPriorHours),
      },
      waysIn,
      waysOut,
      seat: sourceGeometry(scent, stand.at, stand.seatHeightM),
    };
  });
  return {
    input,
    clubRatePerHour,
    stands,
    plumes: walkPlumes(settings.scent, settings.approach),
    usesIn: usesByMonth(features, circles, settings.whereabouts),
  };
}
