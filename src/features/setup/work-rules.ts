import type { ClubRules } from '@/core/booking/rules';
import { formatDay } from '@/core/day-time';
import type { GroundWork } from '@/core/ground-work';
import { WORK_WORDS } from '@/features/clubs/words/ground-work';
import { WORK_NOTE_WORDS as W } from './words/findings';

export interface WorkNote {
  work: GroundWork;
  text: string;
  isWritten: boolean;
}

/** What a club has written down of a kind of work, with its source and day; or that it has nothing. */
export function workNote({ workRules }: Pick<ClubRules, 'workRules'>, work: GroundWork): WorkNote {
  const rule = workRules[work];
  const name = WORK_WORDS[work];
  const text = rule ? W.rule(name, rule.text, rule.source, formatDay(rule.statedOn, true)) : W.none(name);
  return { work, text, isWritten: rule !== null };
}

/** The same in one sentence for what is kept elsewhere, as on a chore; empty for work nobody limits. */
export function workText(rules: Pick<ClubRules, 'workRules'>, work: GroundWork | null): string {
  return work === null ? '' : `${workNote(rules, work).text} ${W.decide}`;
}
