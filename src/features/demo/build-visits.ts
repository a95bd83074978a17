import type { PressureKind } from '@/core/condition-types';
import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import { type DemoDay, momentOf } from './demo-day';
import { latLonOf, type Spot } from './demo-place';
import type { DemoRows } from './demo-rows';

interface DemoVisit {
  /** Days from today. */
  on: number;
  clock: string;
  kind: PressureKind;
  at: Spot;
  stand?: string;
  by: string;
  bumped?: number;
  notes: string;
}

const CAMERAS: readonly Spot[] = [
  [-219, 90],
  [136, -18],
  [-382, 556],
  [600, -160],
];

/** Every camera about once in nine days, at midday. */
function cameraChecks(): DemoVisit[] {
  const rounds = [-67, -58, -49, -40, -31, -22, -13, -4];
  return rounds.flatMap((on, round) =>
    CAMERAS.filter((_, i) => (i + round) % 2 === 0).map((at, i) => ({
      on,
      clock: i === 0 ? '11:40' : '12:25',
      kind: 'camera_check' as const,
      at,
      by: round % 2 === 0 ? 'abel' : 'ione',
      notes: 'Card changed.',
    })),
  );
}

const WORK: readonly DemoVisit[] = [
  {
    on: -69,
    clock: '10:30',
    kind: 'work',
    at: [284, -232],
    stand: 'lower-ford',
    by: 'abel',
    notes: 'New strap and hanger.',
  },
  {
    on: -66,
    clock: '11:00',
    kind: 'work',
    at: [302, -66],
    stand: 'pool',
    by: 'ione',
    notes: 'Trimmed one lane to the pool.',
  },
  {
    on: -44,
    clock: '10:00',
    kind: 'work',
    at: [140, -92],
    stand: 'hourglass',
    by: 'nora',
    notes: 'Work day: windows felted.',
  },
  {
    on: -44,
    clock: '11:15',
    kind: 'work',
    at: [-148, -345],
    stand: 'hay',
    by: 'silas',
    notes: 'Work day: blind brushed in.',
  },
  { on: -44, clock: '13:00', kind: 'drive', at: [60, -580], by: 'abel', notes: 'Mower along the south fence.' },
  {
    on: -33,
    clock: '12:30',
    kind: 'work',
    at: [-252, 80],
    stand: 'clover',
    by: 'abel',
    notes: 'Overseeded the clover.',
  },
  { on: -21, clock: '13:10', kind: 'walk_through', at: [232, -185], by: 'hollis', notes: 'Looked for an arrow.' },
  {
    on: -10,
    clock: '14:05',
    kind: 'walk_through',
    at: [110, 240],
    by: 'silas',
    bumped: 2,
    notes: 'Tracked to the edge of the hemlocks.',
  },
  {
    on: -6,
    clock: '12:15',
    kind: 'work',
    at: [252, 572],
    stand: 'cutover',
    by: 'ione',
    notes: 'Found the guy wire loose. Closed.',
  },
  {
    on: -2,
    clock: '15:20',
    kind: 'bump',
    at: [-440, -210],
    by: 'dell',
    bumped: 3,
    notes: 'Three does out of the alders on the way to the truck.',
  },
  { on: -1, clock: '12:10', kind: 'drive', at: [330, -590], by: 'abel', notes: 'Hauled a load of posts.' },
];

export function buildVisits(day: DemoDay, club: MadeClub, ground: MadeGround): DemoRows['visits'] {
  return [...cameraChecks(), ...WORK].map(({ on, clock, kind, at, stand, by, bumped = 0, notes }) => ({
    id: day.dice.id('visit'),
    clubId: club.row.id,
    kind,
    at: momentOf(day, on, clock),
    ...latLonOf(at),
    standId: stand === undefined ? null : (ground.standIds.get(stand) ?? null),
    memberId: club.members.find(({ key }) => key === by)?.id ?? '',
    bumped,
    notes,
    createdAt: momentOf(day, on, clock) + 3_600_000,
  }));
}
