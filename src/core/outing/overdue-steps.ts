import type { ClubRules } from '../booking/rules';
import { overdueAt } from './board-state';

export type OverdueStep = 'member' | 'officers' | 'contact';

/** When each is told, in order, UTC ms: minutes by the club's rule after the person counts as overdue. */
export function overdueStepTimes(
  backBy: number,
  rules: Pick<ClubRules, 'backByMinutes' | 'overdueSteps'>,
): { step: OverdueStep; at: number }[] {
  const from = overdueAt(backBy, rules.backByMinutes);
  const { memberMinutes, officersMinutes, contactMinutes } = rules.overdueSteps;
  return [
    { step: 'member', at: from + memberMinutes * 60_000 },
    { step: 'officers', at: from + officersMinutes * 60_000 },
    { step: 'contact', at: from + contactMinutes * 60_000 },
  ];
}

/** The steps whose time has come. */
export function dueSteps(
  backBy: number,
  rules: Pick<ClubRules, 'backByMinutes' | 'overdueSteps'>,
  now: number,
): OverdueStep[] {
  return overdueStepTimes(backBy, rules)
    .filter(({ at }) => at <= now)
    .map(({ step }) => step);
}
