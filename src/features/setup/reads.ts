import { dayOf, formatDay } from '@/core/day-time';
import { fromLocal, type LatLon } from '@/core/geometry';
import { GROUND_WORKS } from '@/core/ground-work';
import { sectorName } from '@/core/sectors';
import type { Finding, FindingCode, SetupEffect } from '@/core/setup-check/setup-types';
import type { ClubScope } from '@/server/scope';
import { weighClub } from './check-club';
import type { LoadedSetup } from './load-setup';
import { listSetupAnswers } from './setup-data';
import { FINDING_WORDS as W } from './words/findings';
import { type WorkNote, workNote, workText } from './work-rules';

export interface FindingView {
  key: string;
  print: string;
  code: FindingCode;
  text: string;
  why: string;
  /** "Without it, quiet 58 → 71 on NW mornings", and the same in short. */
  effect: string | null;
  effectShort: string | null;
  /** Points it gains; 0: none, or not known. */
  gain: number;
  evidence: string;
  /** What could be done, each with what the club has written down of such work; empty where it is limited by nobody. */
  acts: { text: string; rule: string }[];
  rules: WorkNote[];
  stand: { id: string; name: string } | null;
  also: Finding['also'];
  subject: Finding['subject'];
  at: LatLon;
  answer: { kind: 'chore' | 'dismissed'; reason: string; choreId: string | null; by: string; on: string } | null;
}

export interface SetupView {
  open: FindingView[];
  answered: FindingView[];
  windsFrom: string | null;
  ownSettings: number;
  counts: { stands: number; features: number; cameras: number; camerasBlind: number };
}

function effectOf({ trial }: Finding, effect: SetupEffect | null) {
  const [before, after] = effect ? [Math.round(effect.before), Math.round(effect.after)] : [0, 0];
  if (!trial || !effect || after <= before) return { effect: null, effectShort: null, gain: 0 };
  const when = W.when(sectorName(effect.windFromDeg), effect.window);
  return {
    effect: W.effect(trial.change, effect, before, after, when),
    effectShort: W.gain(effect.measure, before, after),
    gain: after - before,
  };
}

/** What a club's ground gives away, what each fault costs, and what was answered; an answer holds until the ground changes. */
export async function readSetup(scope: ClubScope, now: number): Promise<SetupView> {
  const { loaded, findings, effects } = await weighClub(scope, now);
  const answers = await listSetupAnswers(scope);
  const { club } = scope;
  const views = findings.map((finding, i): FindingView => {
    const row = answers.get(finding.key);
    const answer = row && row.print === finding.print ? row : null;
    const works = new Set(finding.acts.map(({ work }) => work));
    return {
      key: finding.key,
      print: finding.print,
      code: finding.code,
      text: finding.text,
      why: finding.why,
      ...effectOf(finding, effects[i] ?? null),
      evidence: finding.evidence,
      acts: finding.acts.map(({ text, work }) => ({ text, rule: workText(club.rules, work) })),
      rules: GROUND_WORKS.filter((work) => works.has(work)).map((work) => workNote(club.rules, work)),
      stand: finding.stand,
      also: finding.also,
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
  return {
    open: views.filter((view) => !view.answer),
    answered: views.filter((view) => view.answer),
    windsFrom: loaded.windsFrom,
    ownSettings: loaded.ownSettings,
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
