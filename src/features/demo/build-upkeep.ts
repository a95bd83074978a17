import {
  type InspectionAnswers,
  type InspectionItem,
  type InspectionResult,
  itemsFor,
  usualNextDue,
} from '@/core/upkeep/inspection';
import type { MadeClub } from './build-club';
import type { MadeGround } from './build-ground';
import { type DemoDay, daysFrom, momentOf } from './demo-day';
import type { DemoRows } from './demo-rows';

type Upkeep = Pick<DemoRows, 'chores' | 'inspections' | 'workDays' | 'workDayMembers'>;

interface DemoInspection {
  stand: string;
  /** Days from today. */
  on: number;
  by: string;
  result: InspectionResult;
  found?: Partial<Record<InspectionItem, 'fix' | 'unsafe'>>;
  notes?: string;
  /** Days from today on which the main strap was fitted, and its maker's years. */
  strap?: number;
  years?: number;
}

const INSPECTIONS: readonly DemoInspection[] = [
  { stand: 'saddle', on: -80, by: 'abel', result: 'pass', strap: -80, years: 1 },
  { stand: 'kiln', on: -80, by: 'abel', result: 'pass', strap: -448, years: 2.5 },
  { stand: 'cedar', on: -79, by: 'ione', result: 'pass', strap: -718 },
  { stand: 'draw', on: -79, by: 'ione', result: 'pass', strap: -80 },
  { stand: 'bench', on: -352, by: 'abel', result: 'pass', strap: -790 },
  { stand: 'lower-ford', on: -69, by: 'abel', result: 'pass', strap: -69, years: 1 },
  { stand: 'pool', on: -66, by: 'ione', result: 'pass', strap: -430 },
  { stand: 'hourglass', on: -44, by: 'nora', result: 'pass' },
  {
    stand: 'hay',
    on: -44,
    by: 'ione',
    result: 'fix_first',
    found: { noise: 'fix', lanes: 'fix' },
    notes: 'Door hinge squeals; one lane has grown in.',
  },
  {
    stand: 'cutover',
    on: -6,
    by: 'ione',
    result: 'closed',
    found: { bolts: 'unsafe', platform: 'fix' },
    notes: 'A guy wire has let go; do not climb.',
  },
];

interface DemoChore {
  title: string;
  notes?: string;
  stand?: string;
  who?: string;
  /** Days from today. */
  due?: number;
  done?: number;
  hours?: number;
}

/** Made of a finding of the set-up check. */
export const SADDLE_CAMERA_CHORE = 'Turn the saddle camera out of the low sun';

const CHORES: readonly DemoChore[] = [
  { title: 'Oil the blind door and clear the west lane', stand: 'hay', due: 9 },
  { title: 'New guy wires, then a second look', stand: 'cutover', who: 'abel', due: -1 },
  { title: 'Bring the mower back to the barn', who: 'odalys', due: 4, notes: 'The trailer is at the south gate.' },
  { title: 'New strap at the bench stand', stand: 'bench', who: 'ione', due: 16 },
  { title: SADDLE_CAMERA_CHORE, who: 'hollis', due: 6 },
  { title: 'Paint names on the parking signs' },
  { title: 'Mow the walk to the orchard', who: 'odalys', due: -30, done: -31, hours: 2.5 },
  { title: 'Haul brush from the creek gate', who: 'hollis', due: -20, done: -22, hours: 3 },
  { title: 'Charge and set out the camera batteries', who: 'juno', done: -13, hours: 1.5 },
];

interface DemoWorkDay {
  on: number;
  meet: string;
  notes: string;
  /** Hours credited by member; null: said to come. */
  people: Record<string, number | null>;
}

const WORK_DAYS: readonly DemoWorkDay[] = [
  {
    on: -44,
    meet: 'the barn',
    notes: 'Blinds brushed in, south fence mown.',
    people: { nora: 5, silas: 4.5, abel: 6, rufus: 4, lenore: 4 },
  },
  {
    on: 17,
    meet: 'the barn',
    notes: 'Firewood off the lane, then the new guy wires. Bring gloves.',
    people: { abel: null, odalys: null, dell: null },
  },
];

export function buildUpkeep(day: DemoDay, club: MadeClub, ground: MadeGround, closures: DemoRows['closures']): Upkeep {
  const clubId = club.row.id;
  const memberOf = (key: string) => club.members.find((member) => member.key === key)?.id ?? '';
  const standOf = (key: string) => {
    const stand = ground.stands.find(({ id }) => id === ground.standIds.get(key));
    if (!stand) throw new Error(`The demo has no stand called ${key}.`);
    return stand;
  };
  const inspections = INSPECTIONS.map((one) => {
    const stand = standOf(one.stand);
    const answers: InspectionAnswers = {};
    for (const item of itemsFor(stand.kind)) answers[item] = one.found?.[item] ?? 'good';
    return {
      id: day.dice.id('inspection'),
      clubId,
      standId: stand.id,
      byMemberId: memberOf(one.by),
      day: daysFrom(day, one.on),
      result: one.result,
      answers,
      notes: one.notes ?? '',
      strapFittedOn: one.strap === undefined ? null : daysFrom(day, one.strap),
      strapYears: one.years ?? null,
      nextDueOn: usualNextDue(daysFrom(day, one.on)),
      closureId:
        one.result === 'closed'
          ? (closures.find(({ standId, toDay }) => standId === stand.id && toDay === null)?.id ?? null)
          : null,
      createdAt: momentOf(day, one.on, '12:30'),
    };
  });
  const chores = CHORES.map((one) => {
    const stand = one.stand === undefined ? null : standOf(one.stand);
    return {
      id: day.dice.id('chore'),
      clubId,
      title: one.title,
      notes: one.notes ?? '',
      assigneeId: one.who === undefined ? null : memberOf(one.who),
      place: stand ? `stand:${stand.id}` : '',
      placeName: stand?.name ?? '',
      lat: stand?.lat ?? null,
      lon: stand?.lon ?? null,
      dueOn: one.due === undefined ? null : daysFrom(day, one.due),
      createdBy: memberOf('abel'),
      createdAt: momentOf(day, Math.min(-3, (one.done ?? 0) - 12), '19:10'),
      doneOn: one.done === undefined ? null : daysFrom(day, one.done),
      doneBy: one.done === undefined || one.who === undefined ? null : memberOf(one.who),
      hours: one.hours ?? null,
    };
  });
  const workDays = WORK_DAYS.map(({ on, meet, notes }) => {
    const createdAt = momentOf(day, on - 60, '19:20');
    return {
      id: day.dice.id('workDay'),
      clubId,
      title: 'Work day',
      day: daysFrom(day, on),
      startAt: momentOf(day, on, '08:00'),
      endAt: momentOf(day, on, '13:00'),
      meet,
      notes,
      createdAt,
      updatedAt: createdAt,
    };
  });
  const workDayMembers = WORK_DAYS.flatMap(({ on, people }, index) =>
    Object.entries(people).map(([key, hours]) => ({
      clubId,
      workDayId: workDays[index]?.id ?? '',
      memberId: memberOf(key),
      hours,
      at: momentOf(day, Math.min(on, -1), '20:00'),
    })),
  );
  return { chores, inspections, workDays, workDayMembers };
}
