import { clearShare } from './promise/sun-in-eyes';
import type { SitFrame } from './sit-frame';
import type { SitSums } from './verdict';
import type { TimelineStep } from './verdict-types';
import { directionShares } from './wind/histogram';
import { STEP_WORDS } from './words/sit';

/** Glare from which the sun counts as in the eyes. */
const GLARE = 0.25;

function noteOf(step: Pick<TimelineStep, 'windedChance' | 'arcHold'>, drift: string, thunder: boolean): string | null {
  if (thunder) return STEP_WORDS.thunder;
  if (drift === 'down') return STEP_WORDS.drains;
  if (drift === 'up') return STEP_WORDS.rises;
  if (drift === 'turning') return STEP_WORDS.turning;
  if (step.arcHold !== null && step.arcHold < 0.5) return STEP_WORDS.outOfArcs;
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
