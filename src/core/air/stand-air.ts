import { toRad, windFromVector } from '../angles';
import type { ScoredStand } from '../ground-types';
import type { AirSettings } from '../settings';
import type { PlaceStep } from './place-air';
import { heightShare } from './power-law';
import { shelterShare } from './shelter';
import { type SlopeDrift, slopeDrift } from './slope-drift';

/** A step at one stand. `fromDeg` and `speedMps` stay the open 10 m wind. */
export interface AirStep extends PlaceStep {
  /** Seat wind as a share of open 10 m wind: height and shelter. */
  seatShare: number;
  /** Wind at the seat from the general wind and drift together, m/s; null when missing. */
  seatSpeedMps: number | null;
  /** Direction at the seat, drift added; null when it cannot be told. */
  seatFromDeg: number | null;
  driftPhase: SlopeDrift['phase'];
  driftFromDeg: number | null;
  driftSpeedMps: number;
  /** Share of the drift that is added, 0-1. */
  driftWeight: number;
}

/** What of a stand decides its air. */
export type AirStand = Pick<ScoredStand, 'seatHeightM' | 'shelter' | 'drainBearingDeg' | 'slopePercent'>;

const seatHeight = (m: number): number => (Number.isFinite(m) ? Math.max(1.5, Math.min(20, m)) : 5);

/**
 * Air at a stand's seat, step by step: power law and shelter on the open wind, slope drift added as a vector with its weight.
 * A seat on the ground counts as 1.5 m (a sitting person's height). In woods this is an index, not a measurement.
 */
export function standAir(stand: AirStand, steps: PlaceStep[], s: AirSettings): AirStep[] {
  const shelter = shelterShare(stand.shelter, s);
  const height = seatHeight(stand.seatHeightM);
  return steps.map((step) => {
    const seatShare = Math.min(1, shelter * heightShare(step.stability, height));
    const drift = slopeDrift(
      {
        drainBearingDeg: stand.drainBearingDeg,
        slopePercent: stand.slopePercent,
        sunAltitudeDeg: step.sunAltitudeDeg,
        sunAzimuthDeg: step.sunAzimuthDeg,
        cloudPercent: step.cloudPercent ?? s.cloudWhenUnknownPercent,
        generalSpeedMps: step.speedMps ?? 0,
      },
      s.drift,
    );
    const air = {
      seatShare,
      driftPhase: drift.phase,
      driftFromDeg: drift.fromDeg,
      driftSpeedMps: drift.speedMps,
      driftWeight: step.kind === 'missing' ? 0 : drift.weight,
    };
    if (step.speedMps === null) return { ...step, ...air, seatSpeedMps: null, seatFromDeg: null };
    const seat = addDrift(step.fromDeg, step.speedMps * seatShare, air);
    return { ...step, ...air, seatSpeedMps: seat.speedMps, seatFromDeg: seat.fromDeg };
  });
}

export interface DriftPart {
  driftFromDeg: number | null;
  driftSpeedMps: number;
  driftWeight: number;
}

/** Seat wind plus weighted drift. A wind of no direction is outweighed by a drift stronger than it, else stays without one. */
export function addDrift(
  fromDeg: number | null,
  speedMps: number,
  drift: DriftPart,
): { fromDeg: number | null; speedMps: number } {
  const added = drift.driftSpeedMps * drift.driftWeight;
  if (drift.driftFromDeg === null || !(added > 0)) return { fromDeg, speedMps };
  if (fromDeg === null)
    return added > speedMps ? { fromDeg: drift.driftFromDeg, speedMps: added } : { fromDeg, speedMps };
  const [wind, slope] = [toRad(fromDeg), toRad(drift.driftFromDeg)];
  const east = -speedMps * Math.sin(wind) - added * Math.sin(slope);
  const sum = windFromVector(east, -speedMps * Math.cos(wind) - added * Math.cos(slope));
  return { fromDeg: sum.fromDeg, speedMps: sum.speed };
}
