import { addDays } from '@/core/day-time';
import { FILE_REMARKS, THING_PROBLEMS } from '@/features/exchange/words/files';
import type { MadeClub } from './build-club';
import type { DemoDay } from './demo-day';
import { positionOf } from './demo-place';
import type { DemoRows } from './demo-rows';

const at = (...spot: [number, number]) => positionOf(spot);

/** A file off the steward's receiver that waits to be looked over. */
export function buildImports(day: DemoDay, club: MadeClub): DemoRows['imports'] {
  const waypoint = (name: string, told: string, east: number, north: number, notes = '') => ({
    name,
    notes,
    told,
    geometry: { type: 'Point' as const, coordinates: at(east, north) },
    problem: null,
    remarks: [],
  });
  const steward = club.memberships.find(({ role }) => role === 'steward') ?? club.memberships[0];
  return [
    {
      id: day.dice.id('import'),
      clubId: club.row.id,
      memberId: steward?.id ?? '',
      fileName: 'october-walk.gpx',
      format: 'gpx',
      state: 'read',
      things: [
        waypoint('Scrape under the beech', 'Scrape', 210, -140, 'Three more along the same bench'),
        waypoint('Rub on cedar', 'Rub', 260, -95),
        waypoint('WPT 014', 'Flag, blue', -180, 120),
        {
          name: 'Trail along the bench',
          notes: '',
          told: 'trail',
          geometry: { type: 'LineString', coordinates: [at(150, -200), at(210, -150), at(270, -90), at(330, -60)] },
          problem: null,
          remarks: [],
        },
        {
          name: 'Track 7',
          notes: '',
          told: '',
          geometry: null,
          problem: THING_PROBLEMS.badPoint(412, '', ''),
          remarks: [],
        },
      ],
      remarks: [FILE_REMARKS.heights],
      createdAt: Date.parse(`${addDays(day.today, -2)}T21:10:00Z`),
    },
  ];
}
