import { STABILITY_CLASSES } from '../../src/core/air/stability-types';
import { apartDeg, normalizeDeg } from '../../src/core/angles';
import { seenFalloff, senseFactor } from '../../src/core/approach/seen-heard';
import { circleOf, type Sight, sightOf, sourcesAlong } from '../../src/core/approach/walk-ground';
import { routeLengths } from '../../src/core/approach/walk-times';
import type { ScoredApproach, ScoredFeature } from '../../src/core/ground-types';
import { sweptPlume } from '../../src/core/scent/plume';
import { referenceStrength, windedChanceOf } from '../../src/core/scent/saturate';
import type { ScoringSettings } from '../../src/core/settings';
import type { ScenarioSet } from '../../src/core/wind/scenario-types';

export interface PlainWalk {
  approach: ScoredApproach;
  features: ScoredFeature[];
  /** Chance of deer at each feature, and darkness, at the middle of the walk. */
  shares: ArrayLike<number>;
  dark: number;
  /** The wind of the walk's step. */
  set: ScenarioSet;
  step: number;
  stability: number;
  openSpeedMps: number;
  settings: ScoringSettings;
}

function strengthFrom(sight: Sight, fromDeg: number, w: PlainWalk): number {
  const { approach: s, scent } = w.settings;
  if (sight.metres > s.scentReachM) return 0;
  const past = normalizeDeg(fromDeg + 180 - sight.fromDeg);
  const ends = [sight.fromDeg, sight.fromDeg + sight.widthDeg];
  const inside = past <= sight.widthDeg;
  const off = inside ? 0 : Math.min(...ends.map((end) => apartDeg(end, fromDeg + 180)));
  const receiver = { distanceM: sight.metres, offDeg: off, zM: scent.noseHeightM };
  const strength = sweptPlume(STABILITY_CLASSES[w.stability] ?? 'D', receiver, s.sourceHeightM, s.sweepDeg);
  return strength * (sight.driven ? s.vehicleScentFactor : 1);
}

function scentChance(sights: Sight[], w: PlainWalk, reference: number): number {
  const { approach: s, scent } = w.settings;
  const chanceFrom = (fromDeg: number, speed: number) => {
    const most = Math.max(...sights.map((sight) => strengthFrom(sight, fromDeg, w)));
    return windedChanceOf(most / reference / speed, s.passingMinutes, scent);
  };
  let sum = 0;
  for (const { weight, steps } of w.set.scenarios) {
    const wind = steps[w.step];
    if (!wind) continue;
    const speed = Math.max(scent.leastSpeedMps, wind.speedMps * s.groundWindShare);
    if (wind.fromDeg !== null) sum += weight * chanceFrom(wind.fromDeg, speed);
    else for (let deg = 0; deg < 360; deg += 3) sum += (weight / 120) * chanceFrom(deg, speed);
  }
  return sum;
}

/** The chance that a walk alerts deer, straight from the formulas for every point, feature and scenario. */
export function plainWalkChance(w: PlainWalk): number {
  const s = w.settings.approach;
  const sources = sourcesAlong(w.approach, s.spacingM);
  const reference = referenceStrength(w.settings.scent);
  const sense = s.seenNearChance * senseFactor(w.dark, w.openSpeedMps, s);
  let unnoticed = (1 - s.unmappedPer100M) ** (routeLengths(w.approach).walkedM / 100);
  w.features.forEach((feature, f) => {
    const share = w.shares[f] ?? 0;
    if (share < 0.005) return;
    const circle = circleOf(feature);
    const sights = sources.map((source) => sightOf(source, feature, circle));
    const seen = Math.max(...sights.map((x) => seenFalloff(x.metres, s) * (x.driven ? s.vehicleSeenFactor : 1)));
    const scent = scentChance(sights, w, reference);
    unnoticed *= 1 - share * (1 - (1 - scent) * (1 - sense * Math.min(1, seen)));
  });
  return 1 - unnoticed;
}
