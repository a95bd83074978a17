import { checkSetup } from '@/core/setup-check/check-setup';
import { DEFAULT_SETUP } from '@/core/setup-check/setup-settings';
import type { FindingCode } from '@/core/setup-check/setup-types';
import { type SetupRows, setupInput } from '@/features/setup/setup-input';
import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import { SADDLE_CAMERA_CHORE } from './build-upkeep';
import { type DemoDay, momentOf } from './demo-day';
import { DEMO_PLACE } from './demo-place';
import type { DemoRows } from './demo-rows';

interface DemoAnswer {
  codes: FindingCode[];
  subject: string;
  by: string;
  /** Days from today. */
  on: number;
  reason: string;
  /** Title of the chore that was made of it. */
  chore?: string;
}

const ANSWERS: readonly DemoAnswer[] = [
  {
    codes: ['approach_upwind', 'approach_crosses'],
    subject: 'Down off the ridge',
    by: 'abel',
    on: -96,
    reason: 'It is drawn so that nobody takes it for a short cut.',
  },
  {
    codes: ['approach_upwind', 'approach_crosses'],
    subject: 'Over the oaks',
    by: 'abel',
    on: -96,
    reason: 'Nobody walks it. It stays on the map as a warning.',
  },
  {
    codes: ['seat_sun'],
    subject: 'Kiln Ground Blind',
    by: 'ione',
    on: -95,
    reason: 'The oaks take the sun by four, and a first sit may do worse.',
  },
  { codes: ['camera_sun'], subject: 'Saddle camera', by: 'ione', on: -12, reason: '', chore: SADDLE_CAMERA_CHORE },
];

/** What the stewards have answered to findings of the set-up check. */
export function buildSetupAnswers(
  day: DemoDay,
  club: MadeClub,
  ground: MadeGround,
  { mapItems, chores }: Pick<DemoRows, 'mapItems' | 'chores'>,
): DemoRows['setupAnswers'] {
  const rows = { ground, items: mapItems } as SetupRows;
  const place = { ...DEMO_PLACE, rules: club.row.rules, units: club.row.units };
  const { input } = setupInput(place, rows, { today: day.today, winds: null, settings: DEFAULT_SETUP });
  const findings = checkSetup(input);
  return ANSWERS.flatMap(({ codes, subject, by, on, reason, chore }) => {
    const finding = findings.find((f) => codes.includes(f.code) && f.subject.name === subject);
    const member = club.members.find(({ key }) => key === by);
    if (!finding || !member) return [];
    const { key: findingKey, print, text } = finding;
    const at = momentOf(day, on, '19:30');
    const answer = chore ? ('chore' as const) : ('dismissed' as const);
    const choreId = chores.find(({ title }) => title === chore)?.id ?? null;
    return [{ clubId: club.row.id, findingKey, print, text, answer, reason, choreId, byMemberId: member.id, at }];
  });
}
