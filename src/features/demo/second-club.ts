import { DEFAULT_CLUB_RULES } from '@/core/booking/rules';
import type { MadeClub } from './build-club';
import { buildClub, type UserRow } from './build-club';
import { type StandRow, standRow } from './build-ground';
import { type DemoDay, momentOf } from './demo-day';
import { latLonOf } from './demo-place';
import { SECOND_CLUB_MEMBERS } from './people';
import { CLOSE, type DemoStand, good, OPEN_WOOD } from './stand-types';

export const SECOND_CLUB_NAME = 'Quill Hollow';
const DAYS_OLD = 300;
const PLACE = { lat: 41.006, lon: -77.522, zone: 'America/New_York' };

const STANDS: readonly DemoStand[] = [
  {
    key: 'knob',
    name: 'Knob Ladder',
    kind: 'ladder',
    at: [-140, 60],
    seatHeightFt: 15,
    facingDeg: 200,
    shotSide: 'either',
    shotRangeM: OPEN_WOOD,
    shelter: 'open_wood',
    seats: 1,
    arcs: [good(200, 300)],
    morning: 'prime',
    evening: 'usable',
    notes: 'The trail comes up from the hollow.',
  },
  {
    key: 'spring',
    name: 'Spring Hang-On',
    kind: 'hang_on',
    at: [210, -90],
    seatHeightFt: 18,
    facingDeg: 20,
    shotSide: 'left',
    shotRangeM: CLOSE,
    shelter: 'dense_wood',
    seats: 1,
    arcs: [good(330, 45)],
    morning: 'usable',
    evening: 'prime',
    notes: '',
  },
];

/** Family land of two people, one of whom also belongs to the first club. */
export function buildSecondClub(day: DemoDay, users: readonly UserRow[]): MadeClub & { stands: StandRow[] } {
  const club = buildClub(
    day,
    { slug: 'quill-hollow', name: SECOND_CLUB_NAME, ...PLACE, rules: DEFAULT_CLUB_RULES, daysOld: DAYS_OLD },
    SECOND_CLUB_MEMBERS,
    users,
  );
  const createdAt = momentOf(day, -DAYS_OLD, '20:00');
  const stands = STANDS.map((stand) => standRow(day, club, stand, latLonOf(stand.at, PLACE), createdAt));
  return { ...club, stands };
}
