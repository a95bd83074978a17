import { clearShare } from './promise/sun-in-eyes';
import type { SitFrame } from './sit-frame';
import type { TimelineStep } from './types';
import type { SitSums } from './verdict';
import { directionShares } from './wind/histogram';

/** Glare from which the sun counts as in the eyes. */
const GLARE = 0.25;

function noteOf(step: Pick<TimelineStep, 'windedChance' | 'arcHold'>, drift: string, thunder: boolean): string | null {
  if (thunder) return 'Thunder';
  if (drift === 'down') return 'Cold air drains down the slope';
  if (drift === 'up') return 'Warm air draws up the slope';
  if (drift === 'turning') return 'Slope air is turning';
  if (step.arcHold !== null && step.arcHold < 0.5) return 'More likely out of its good winds than in';
  return null;
}

/** The sit by half hours: wind, hold, scent, sun and weather. Nulls where the forecast does not reach. */
export function timelineOf(frame: SitFrame, sums: SitSums): TimelineStep[] {
  const { features, settings } = frame.ground.input;
  const seat = frame.air?.seatOf(sums.stand.stand) ?? null;
  const directions = seat?.steps ?? null;
  return frame.window.stepAts.map((at, t) => {
    const air = seat?.air[t];
    const scent = sums.scent?.byStep[t];
    const featureIndex = scent?.featureIndex ?? null;
    const clear = clearShare(air?.cloudPercent ?? null, settings.promise);
    const arcHold = sums.arcs.hold?.byStep[t] ?? null;
    const windedChance = scent?.chance ?? null;
    return {
      at,
      arcHold,
      directionShares: seat ? directionShares(seat.set, t) : null,
      meanFromDeg: directions?.[t]?.meanFromDeg ?? null,
      windSpeedMps: air?.speedMps ?? null,
      gustMps: air?.gustMps ?? null,
      windedChance,
      windedFeatureId: featureIndex === null ? null : (features[featureIndex]?.id ?? null),
      sunInEyes: (sums.glare.byStep[t] as number) * clear >= GLARE,
      precipMm: air?.precipMm ?? null,
      tempC: air?.tempC ?? null,
      note: noteOf({ windedChance, arcHold }, air?.driftPhase ?? 'none', air?.thunder ?? false),
    };
  });
}
