import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import { type DemoDay, daysFrom, momentOf } from './demo-day';
import type { DemoRows } from './demo-rows';

interface DemoClosure {
  /** Left out: the whole ground. */
  stand?: string;
  from: number;
  /** Left out: until opened again. */
  to?: number;
  reason: string;
  by: string;
  /** Days from today on which it was written. */
  made: number;
}

const CLOSURES: readonly DemoClosure[] = [
  { from: -44, to: -44, reason: 'Work day', by: 'nora', made: -60 },
  { stand: 'clover', from: -33, to: -30, reason: 'Clover overseeded', by: 'abel', made: -34 },
  { from: -19, to: -19, reason: 'Family on the land', by: 'edith', made: -27 },
  { stand: 'cutover', from: -6, reason: 'A guy wire has let go; do not climb', by: 'ione', made: -6 },
  { stand: 'alder', from: 4, to: 5, reason: 'Culvert work on the lane', by: 'abel', made: -2 },
  { from: 9, to: 10, reason: 'Firewood is cut along the creek', by: 'edith', made: -3 },
];

export function buildClosures(day: DemoDay, club: MadeClub, ground: MadeGround): DemoRows['closures'] {
  return CLOSURES.map(({ stand, from, to, reason, by, made }) => ({
    id: day.dice.id('closure'),
    clubId: club.row.id,
    standId: stand === undefined ? null : (ground.standIds.get(stand) ?? null),
    fromDay: daysFrom(day, from),
    toDay: to === undefined ? null : daysFrom(day, to),
    reason,
    byMemberId: club.members.find(({ key }) => key === by)?.id ?? '',
    createdAt: momentOf(day, made, '12:40'),
  }));
}
