import type { StandKind } from './ground-types';
import { cToF, formatSpeed, mphToMps, mpsToMph, type Units } from './units';
import type { Caution } from './verdict-types';
import { windChillF } from './wind-chill';
import { CAUTION_WORDS } from './words/sit';

const MIN = 60_000;
const RAISED: ReadonlySet<StandKind> = new Set(['ladder', 'hang_on', 'climber', 'tripod', 'box_blind']);

/** What the air does in a half hour, as far as safety goes. Wind is the open wind at 10 m, m/s. */
export interface CautionStep {
  at: number;
  speedMps: number | null;
  gustMps: number | null;
  tempC: number | null;
  thunder: boolean;
}

export interface CautionInput {
  kind: StandKind;
  seatHeightM: number;
  steps: CautionStep[];
  /** null: no forecast. */
  forecastAgeHours: number | null;
  staleHours: number;
  /** The club's own orange rule in its own words. */
  orangeRule: string | null;
  units: Units;
  clock: (at: number) => string;
}

function most(values: (number | null)[]): number | null {
  const given = values.filter((v): v is number => v !== null);
  return given.length > 0 ? Math.max(...given) : null;
}

function windCaution(input: CautionInput): Caution | null {
  const speed = most(input.steps.map((s) => s.speedMps)) ?? 0;
  const gust = most(input.steps.map((s) => s.gustMps)) ?? 0;
  // Design values set under OSHA's "high wind" of 40 mph and its 20 mph for lifting people; no limit for tree stands exists.
  const stop = speed >= mphToMps(30) - 1e-9 || gust >= mphToMps(40) - 1e-9;
  const care = speed >= mphToMps(20) - 1e-9 || gust >= mphToMps(30) - 1e-9;
  if (!care) return null;
  const wind = formatSpeed(speed, input.units);
  const gusts = formatSpeed(Math.max(gust, speed), input.units);
  return stop
    ? { code: 'wind_stay_down', level: 'stop', text: CAUTION_WORDS.stayDown(wind, gusts) }
    : { code: 'wind_raised', level: 'caution', text: CAUTION_WORDS.raisedSeat(wind, gusts) };
}

/** From the first thunder to 30 minutes after the last hour with thunder (US National Weather Service). */
function thunderCaution(input: CautionInput): Caution | null {
  const heard = input.steps.filter((s) => s.thunder);
  const first = heard[0];
  const last = heard.at(-1);
  if (!first || !last) return null;
  const until = input.clock(last.at + 60 * MIN);
  return {
    code: 'thunder',
    level: 'stop',
    text: CAUTION_WORDS.thunder(input.clock(first.at), until),
  };
}

/** Frostbite within 30 minutes from a wind chill of about -18 F (NWS chart); from 10 F on it is said. */
function coldCaution(input: CautionInput): Caution | null {
  let least = Number.POSITIVE_INFINITY;
  for (const step of input.steps) {
    if (step.tempC === null) continue;
    const f = cToF(step.tempC);
    least = Math.min(least, windChillF(f, mpsToMph(step.speedMps ?? 0)) ?? f);
  }
  if (least > 10) return null;
  const felt = input.units === 'us' ? `${Math.round(least)} °F` : `${Math.round(((least - 32) * 5) / 9)} °C`;
  return least <= -18
    ? { code: 'cold', level: 'caution', text: CAUTION_WORDS.frostbite(felt) }
    : { code: 'cold', level: 'note', text: CAUTION_WORDS.cold(felt) };
}

/** Cautions for a sit, the gravest first; the same for every rank of stand. */
export function cautionsFor(input: CautionInput): Caution[] {
  const raised = RAISED.has(input.kind) && input.seatHeightM > 1;
  const found: Caution[] = [];
  const thunder = thunderCaution(input);
  if (thunder) found.push(thunder);
  const wind = raised ? windCaution(input) : null;
  if (wind) found.push(wind);
  const cold = coldCaution(input);
  if (cold) found.push(cold);
  if (input.forecastAgeHours === null) {
    found.push({
      code: 'no_forecast',
      level: 'caution',
      text: CAUTION_WORDS.noForecast,
    });
  } else if (input.forecastAgeHours > input.staleHours) {
    const hours = Math.round(input.forecastAgeHours);
    found.push({
      code: 'stale_forecast',
      level: 'caution',
      text: CAUTION_WORDS.staleForecast(hours),
    });
  }
  if (raised) found.push({ code: 'harness', level: 'note', text: CAUTION_WORDS.harness });
  if (input.orangeRule) found.push({ code: 'orange', level: 'note', text: input.orangeRule });
  const order = { stop: 0, caution: 1, note: 2 };
  return found.sort((a, b) => order[a.level] - order[b.level]);
}
