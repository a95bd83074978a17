import { dayOf, formatDay } from '@/core/day-time';
import { fromLocal, type LatLon } from '@/core/geometry';
import { sectorName } from '@/core/sectors';
import { checkSetup } from '@/core/setup-check/check-setup';
import type { Finding, FindingCode, SetupEffect } from '@/core/setup-check/setup-types';
import { makeWeigher } from '@/core/setup-check/weigh-finding';
import type { ClubScope } from '@/server/scope';
import { type LoadedSetup, loadSetup } from './load-setup';
import { listSetupAnswers } from './setup-data';

export interface FindingView {
  key: string;
  print: string;
  code: FindingCode;
  text: string;
  why: string;
  /** "Without it, quiet 58 -> 71 on NW mornings". */
  effect: string | null;
  /** Points it gains; 0: none, or not known. */
  gain: number;
  evidence: string;
  acts: string[];
  stand: { id: string; name: string } | null;
  subject: Finding['subject'];
  at: LatLon;
  answer: { kind: 'chore' | 'dismissed'; reason: string; choreId: string | null; by: string; on: string } | null;
}

export interface SetupView {
  open: FindingView[];
  answered: FindingView[];
  windsFrom: string | null;
  counts: { stands: number; features: number; cameras: number; camerasBlind: number };
}

const CHANGED = {
  without_features: 'Without it',
  without_approach: 'By its other ways',
  facing: 'Turned',
} as const;

export function effectText(finding: Pick<Finding, 'trial'>, effect: SetupEffect): string | null {
  const [before, after] = [Math.round(effect.before), Math.round(effect.after)];
  if (!finding.trial || after <= before) return null;
  const when = `${sectorName(effect.windFromDeg)} ${effect.window}s`;
  return `${CHANGED[finding.trial.change]}, ${effect.measure} ${before} → ${after} on ${when}`;
}

/** What a club's ground gives away, what each fault costs, and what was answered; an answer holds until the ground changes. */
export async function readSetup(scope: ClubScope, now: number): Promise<SetupView> {
  const loaded = await loadSetup(scope, now);
  const answers = await listSetupAnswers(scope);
  const { club } = scope;
  const weigh = makeWeigher(loaded.ground, loaded.input.windows, loaded.input.winds);
  const views = checkSetup(loaded.input).map((finding): FindingView => {
    const effect = weigh(finding);
    const row = answers.get(finding.key);
    const answer = row && row.print === finding.print ? row : null;
    return {
      key: finding.key,
      print: finding.print,
      code: finding.code,
      text: finding.text,
      why: finding.why,
      effect: effect && effectText(finding, effect),
      gain: effect ? Math.max(0, Math.round(effect.after) - Math.round(effect.before)) : 0,
      evidence: finding.evidence,
      acts: finding.acts.map(({ text }) => text),
      stand: finding.stand,
      subject: finding.subject,
      at: fromLocal(club, finding.at),
      answer: answer && {
        kind: answer.answer,
        reason: answer.reason,
        choreId: answer.choreId,
        by: answer.byName,
        on: formatDay(dayOf(answer.at, club.zone)),
      },
    };
  });
  // What costs most stands first; what costs alike keeps the order of the rules.
  views.sort((a, b) => b.gain - a.gain);
  return {
    open: views.filter((view) => !view.answer),
    answered: views.filter((view) => view.answer),
    windsFrom: loaded.windsFrom,
    counts: countsOf(loaded),
  };
}

function countsOf({ input }: LoadedSetup): SetupView['counts'] {
  return {
    stands: input.stands.length,
    features: new Set(input.features.map(({ id }) => id)).size,
    cameras: input.cameras.length,
    camerasBlind: input.cameras.filter(({ facingDeg }) => facingDeg === null).length,
  };
}
